/** Station 1: the pipe before the element and what flows in it. */
import { fluidChoices, phaseChoices } from '../../words/fluids.ts';
import { materialChoices } from '../../words/materials.ts';
import { ChoiceField } from '../field/ChoiceField.tsx';
import { MeterTextField } from '../field/MeterTextField.tsx';
import { PipeSizeField } from '../field/PipeSizeField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useMeterText } from '../meter.ts';
import { Fold } from './Fold.tsx';
import { Station } from './Station.tsx';

export function Upstream() {
  const kind = useMeterText('fluid.kind');
  return (
    <Station number={1} title="Upstream pipe and fluid">
      <PipeSizeField />
      <QuantityField path="pipe.bore" />
      <ChoiceField path="fluid.kind" choices={fluidChoices} />
      {kind === 'stated' && <StatedFluid />}
      <QuantityField path="upstream.pressure" label="Pressure" />
      <QuantityField path="upstream.temperature" label="Temperature" />
      <ChoiceField path="pipe.material" label="Material" choices={materialChoices} open="not stated" />
      <Fold title="Roughness and more">
        <QuantityField path="pipe.roughness" label="Roughness Ra" />
        {kind === 'water' && <ChoiceField path="fluid.phase" choices={phaseChoices} open="by its state" />}
        <QuantityField path="pipe.measuredAt" label="Bore measured at" />
      </Fold>
    </Station>
  );
}

function StatedFluid() {
  const gas = useMeterText('fluid.isentropicExponent') !== '';
  return (
    <>
      <QuantityField path="fluid.density" />
      <QuantityField path="fluid.viscosity" label="Viscosity" />
      <MeterTextField path="fluid.isentropicExponent" decimal />
      {gas ? (
        <Fold title="Molar mass, compressibility, base density">
          <QuantityField path="fluid.molarMass" />
          <MeterTextField path="fluid.compressibility" label="Compressibility" decimal />
          <QuantityField path="fluid.baseDensity" label="Base density" />
        </Fold>
      ) : (
        <QuantityField path="fluid.vapourPressure" />
      )}
    </>
  );
}
