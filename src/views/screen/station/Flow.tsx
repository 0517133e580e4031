/** Station 2: the flows to be measured and the differential they shall make. */
import { QuantityField } from '../field/QuantityField.tsx';
import { quantityKind } from '../field/quantities.ts';
import { split } from '../field/split.ts';
import { BaseState } from '../fluid/BaseState.tsx';
import { useMeterText } from '../meter.ts';
import { Station } from './Station.tsx';
import { Unknown } from './Unknown.tsx';

export function Flow() {
  const maximum = useMeterText('duty.maximum');
  const normal = useMeterText('duty.normal');
  const minimum = useMeterText('duty.minimum');
  const atBase = [maximum, normal, minimum].some(isAtBase);
  return (
    <Station number={2} title="Flow to be measured">
      <Unknown unknown="flow" label="Maximum" name="maximum flow" />
      <QuantityField path="duty.normal" label="Normal" />
      <QuantityField path="duty.minimum" label="Minimum" />
      {atBase && <BaseState />}
      <Unknown unknown="differential" label="Differential" name="differential" />
    </Station>
  );
}

const isAtBase = (text: string): boolean =>
  split(text, quantityKind('duty.maximum').measures).unit?.measure === 'base volume flow';
