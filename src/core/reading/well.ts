/**
 * Well: an upright tube beside a wide well on the upstream side. The reading is the rise in the tube from its zero mark;
 * a corrected scale has shortened divisions and takes the fall of the well into account, a plain one does not.
 */
import { readHigh, readWell } from '../input/instrument.ts';
import { asked } from './asked.ts';
import { readColumn, readColumnFields } from './column.ts';
import type { Instrument } from './contract.ts';
import { tubeLevels, wellOf } from './tube.ts';

export const well: Instrument = {
  kind: 'well',
  settle(form) {
    const fields = readColumnFields(form);
    const scaled = form.choice('instrument.scale', ['plain', 'corrected'] as const, true);
    const bores = readWell(form, scaled === 'plain');
    const towards = readHigh(form, 'downstream') === 'downstream' ? 1 : -1;
    if (fields === undefined || scaled === undefined) return undefined;
    const tube = { sine: 1, ...wellOf(bores), corrected: scaled === 'corrected' };
    return {
      kind: 'well',
      asks: { shows: ['length'] },
      read: ({ value }, at) =>
        readColumn(
          fields,
          tubeLevels(asked(value, 'a value').si, tube, fields.scale, fields.gauge.temperature, towards),
          at,
        ),
    };
  },
};
