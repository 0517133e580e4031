/** A gas by its composition, or one gas by its name. */
import { saturationWords as words } from '../../words/fluid-forms.ts';
import { basisChoices, gasPhaseChoices } from '../../words/fluids.ts';
import { useWorkbench } from '../binding.tsx';
import { useMeterText } from '../meter.ts';
import { Fold } from '../station/Fold.tsx';
import { valueAt } from '../text.ts';
import { CheckField } from './CheckField.tsx';
import { Composition } from './Composition.tsx';
import { GasName } from './GasName.tsx';
import { UsualChoice } from './UsualChoice.tsx';

export function GasFields() {
  const phase = useMeterText('fluid.phase');
  const name = useMeterText('fluid.name');
  const composed = useWorkbench(
    (state) => valueAt(state.project.meters[state.selected], 'fluid.composition') !== undefined,
  );
  return (
    <>
      <GasName />
      {(name === '' || composed) && (
        <>
          <UsualChoice path="fluid.basis" choices={basisChoices} />
          <Composition />
          <CheckField path="fluid.normalise" />
        </>
      )}
      <Fold title={words.side} open={phase !== ''}>
        <UsualChoice path="fluid.phase" label={words.phase} choices={gasPhaseChoices} />
      </Fold>
    </>
  );
}
