/** What the maker's sheet of an averaging pitot says: nothing of it can be computed from the shape of the bar. */
import { MeterTextField } from '../field/MeterTextField.tsx';
import { QuantityField } from '../field/QuantityField.tsx';
import { Fold } from './Fold.tsx';

/** The figures that the flow is computed with. */
export function BarFields() {
  return (
    <>
      <QuantityField path="element.width" label="Bar width, w" />
      <QuantityField path="element.coefficientUncertainty" label="K, ±" />
    </>
  );
}

/** The figures that its use is judged by. */
export function MakersSheet() {
  return (
    <Fold title="More of the maker’s sheet">
      <MeterTextField path="element.expansion" label="Expansion, a" decimal />
      <MeterTextField path="element.reynoldsMin" label="Least Re (pipe)" decimal />
      <MeterTextField path="element.reynoldsMax" label="Greatest Re (pipe)" decimal />
      <QuantityField path="element.velocityMax" label="Greatest velocity" />
      <QuantityField path="element.straightBefore" label="Straight needed before" />
      <QuantityField path="element.straightAfter" label="Straight needed after" />
      <QuantityField path="element.loss" label="Loss of Δp" />
    </Fold>
  );
}
