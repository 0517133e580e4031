/** A gas by its composition, or one gas by its name. */
import { saturationWords as words } from '../../words/fluid-forms.ts';
import { basisChoices, equationChoices, gasPhaseChoices } from '../../words/fluids.ts';
import { isOther } from '../../words/gases.ts';
import { useWritten } from '../hand.tsx';
import { useMeterText } from '../meter.ts';
import { Fold } from '../station/Fold.tsx';
import { CheckField } from './CheckField.tsx';
import { Composition } from './Composition.tsx';
import { GasName } from './GasName.tsx';
import { UsualChoice } from './UsualChoice.tsx';

export function GasFields() {
  const phase = useMeterText('fluid.phase');
  const name = useMeterText('fluid.name');
  const equation = useMeterText('fluid.equation');
  const composed = useWritten('fluid.composition') !== undefined;
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
      <Fold title={words.side} open={`${phase}${equation}` !== ''}>
        {(!isOther(name) || equation !== '') && <UsualChoice path="fluid.equation" choices={equationChoices} />}
        <UsualChoice path="fluid.phase" label={words.phase} choices={gasPhaseChoices} />
      </Fold>
    </>
  );
}
