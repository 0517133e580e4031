/** A fluid whose figures the user states. */
import { MeterTextField } from '../field/MeterTextField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { useMeterText } from '../meter.ts';
import { Fold } from '../station/Fold.tsx';

export function StatedFields() {
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
