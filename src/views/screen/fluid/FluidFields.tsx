/** What a kind of fluid asks for beside its pressure and temperature. */
import { useMeterText } from '../meter.ts';
import { AirFields } from './AirFields.tsx';
import { GasFields } from './GasFields.tsx';
import { LiquidFields } from './LiquidFields.tsx';
import { StatedFields } from './StatedFields.tsx';
import { WaterFields } from './WaterFields.tsx';

const FIELDS: Readonly<Record<string, () => React.ReactNode>> = {
  water: WaterFields,
  gas: GasFields,
  air: AirFields,
  liquid: LiquidFields,
  stated: StatedFields,
};

export function FluidFields() {
  const kind = useMeterText('fluid.kind');
  const Fields = Object.hasOwn(FIELDS, kind) ? FIELDS[kind] : undefined;
  return Fields === undefined ? null : <Fields />;
}
