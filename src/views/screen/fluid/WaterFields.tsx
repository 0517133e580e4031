/** Water and steam: by its state, on the saturation line, or wet. */
import { saturationWords as words } from '../../words/fluid-forms.ts';
import { phaseChoices } from '../../words/fluids.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { useMeterText } from '../meter.ts';
import { Fold } from '../station/Fold.tsx';
import styles from './inputs.module.css';
import { ShareField } from './ShareField.tsx';

export function WaterFields() {
  const phase = useMeterText('fluid.phase');
  const quality = useMeterText('fluid.quality');
  return (
    <Fold title={words.fold} open={phase !== '' || quality !== ''}>
      <ChoiceField path="fluid.phase" label={words.phase} choices={phaseChoices} open="by its state" />
      {(phase !== 'liquid' || quality !== '') && <ShareField path="fluid.quality" label={words.quality} />}
      <p className={styles.hint}>{words.hint}</p>
    </Fold>
  );
}
