/** The units of a list, those of one measure together. */
import type { Measure } from '../../../core/quantity/units.ts';
import { unitMenu } from './split.ts';

export const UnitOptions = ({ measures }: { readonly measures: readonly Measure[] }) =>
  unitMenu(measures).map(({ measure, units }) => (
    <optgroup key={measure} label={measure}>
      {units.map(({ symbol, print }) => (
        <option key={symbol} value={symbol}>
          {print}
        </option>
      ))}
    </optgroup>
  ));
