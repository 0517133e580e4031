/** What the vectors of units ask of the core: the SI value of a number and a unit as a file writes them. */
import type { Measure } from '../../../src/core/quantity/measure.ts';
import { readQuantity } from '../../../src/core/quantity/text.ts';

type Given = Readonly<Record<string, number | string>>;

export const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = {
  units: ({ number, unit, measure }) => {
    const read = readQuantity(`${number} ${unit}`, [measure as Measure], 'field');
    if (!read.ok) throw new Error(`expected a quantity, got ${JSON.stringify(read.problems)}`);
    return { si: read.value.si, siFiveDigits: read.value.si };
  },
};
