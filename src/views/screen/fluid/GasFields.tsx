/** A gas by its composition. */
import { basisChoices, gasPhaseChoices } from '../../words/fluids.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { useMeterText } from '../meter.ts';
import { CheckField } from './CheckField.tsx';
import { Composition } from './Composition.tsx';

export function GasFields() {
  const phase = useMeterText('fluid.phase');
  return (
    <>
      <ChoiceField path="fluid.basis" choices={basisChoices} open="Mole fractions" />
      <Composition />
      <CheckField path="fluid.normalise" />
      {phase !== '' && <ChoiceField path="fluid.phase" choices={gasPhaseChoices} open="gas" />}
    </>
  );
}
