/**
 * Inverted U-tube: the process liquid stands in both limbs under air or a lighter liquid. The reading is the difference
 * of the two levels; the process liquid stands higher in the limb of the higher pressure.
 */
import { readHigh } from '../input/instrument.ts';
import { asked } from './asked.ts';
import { readColumn, readColumnFields } from './column.ts';
import type { Instrument } from './contract.ts';
import { scaleWorking, trueLength } from './scale.ts';

export const invertedUTube: Instrument = {
  kind: 'inverted-u-tube',
  settle(form) {
    const fields = readColumnFields(form, true);
    const high = readHigh(form, 'upstream');
    if (fields === undefined) return undefined;
    const { scale, gauge } = fields;
    return {
      kind: 'inverted-u-tube',
      asks: { shows: ['length'] },
      read({ value }, at) {
        const read = asked(value, 'a value').si;
        const length = trueLength(read, scale, gauge.temperature);
        const h = high === 'upstream' ? length : -length;
        const working = scaleWorking(read, scale, gauge.temperature);
        const levels = { upstream: h / 2, downstream: -h / 2, working, perReading: 1, menisci: 2 } as const;
        return readColumn(fields, levels, at);
      },
    };
  },
};
