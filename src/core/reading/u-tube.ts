/**
 * U-tube: two upright limbs, a gauge liquid heavier than what stands on it. The reading is the difference of the two
 * levels; the liquid stands higher in the limb of the lower pressure.
 */
import { readHigh } from '../input/instrument.ts';
import { asked } from './asked.ts';
import { readColumn, readColumnFields } from './column.ts';
import type { Instrument } from './contract.ts';
import { scaleWorking, trueLength } from './scale.ts';

export const uTube: Instrument = {
  kind: 'u-tube',
  settle(form) {
    const fields = readColumnFields(form);
    const high = readHigh(form, 'downstream');
    if (fields === undefined) return undefined;
    const { scale, gauge } = fields;
    return {
      kind: 'u-tube',
      asks: { shows: ['length'] },
      read({ value }, at) {
        const read = asked(value, 'a value').si;
        const length = trueLength(read, scale, gauge.temperature);
        const h = high === 'downstream' ? length : -length;
        const working = scaleWorking(read, scale, gauge.temperature);
        const levels = { upstream: -h / 2, downstream: h / 2, working, perReading: 1, menisci: 2 } as const;
        return readColumn(fields, levels, at);
      },
    };
  },
};
