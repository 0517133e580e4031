/** A gas by its composition, or one gas by its name. */
import { basisChoices, gasPhaseChoices } from '../../words/fluids.ts';
import { useWorkbench } from '../binding.tsx';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { useMeterText } from '../meter.ts';
import { valueAt } from '../text.ts';
import { CheckField } from './CheckField.tsx';
import { Composition } from './Composition.tsx';
import { GasName } from './GasName.tsx';

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
          <ChoiceField path="fluid.basis" choices={basisChoices} open="Mole fractions, as usual" />
          <Composition />
          <CheckField path="fluid.normalise" />
        </>
      )}
      {phase !== '' && <ChoiceField path="fluid.phase" choices={gasPhaseChoices} open="Gas, as usual" />}
    </>
  );
}
