/** Station 1: the pipe before the element and what flows in it. */
import { fluidChoices } from '../../words/fluids.ts';
import { materialChoices } from '../../words/materials.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { PipeSizeField } from '../field/PipeSizeField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { FluidFields } from '../fluid/FluidFields.tsx';
import { LostOverrides } from '../fluid/LostOverrides.tsx';
import { StateFields } from '../fluid/StateFields.tsx';
import { useSelectedMeter } from '../meter.ts';
import { Fold } from './Fold.tsx';
import { Station } from './Station.tsx';

export function Upstream() {
  return (
    <Station number={1} title="Upstream pipe and fluid">
      <PipeSizeField />
      <QuantityField path="pipe.bore" />
      <ChoiceField path="fluid.kind" choices={fluidChoices} />
      <FluidFields />
      <LostOverrides state={useSelectedMeter()?.sizing?.state} />
      <StateFields />
      <ChoiceField path="pipe.material" label="Material" choices={materialChoices} open="not stated" />
      <Fold title="Roughness and more">
        <QuantityField path="pipe.roughness" label="Roughness Ra" />
        <QuantityField path="pipe.measuredAt" label="Bore measured at" />
      </Fold>
    </Station>
  );
}
