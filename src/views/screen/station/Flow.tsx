/** Station 2: the flows to be measured and the differential they shall make. */
import { QuantityField } from '../field/QuantityField.tsx';
import { Station } from './Station.tsx';
import { Unknown } from './Unknown.tsx';

export function Flow() {
  return (
    <Station number={2} title="Flow to be measured">
      <Unknown unknown="flow" label="Maximum" name="maximum flow" />
      <QuantityField path="duty.normal" label="Normal" />
      <QuantityField path="duty.minimum" label="Minimum" />
      <Unknown unknown="differential" label="Differential" name="differential" />
    </Station>
  );
}
