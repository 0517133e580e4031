/**
 * Inclined tube: as a well, with the tube laid over so that a small difference moves the meniscus far. The reading is
 * along the tube; without a well its other side is taken to be so wide that its level stays.
 */
import { readHigh, readInclination, readWell } from '../input/instrument.ts';
import { asked } from './asked.ts';
import { readColumn, readColumnFields } from './column.ts';
import type { Instrument } from './contract.ts';
import { tubeLevels, wellOf } from './tube.ts';

export const inclined: Instrument = {
  kind: 'inclined',
  settle(form) {
    const fields = readColumnFields(form);
    const angle = readInclination(form);
    const bores = readWell(form, false);
    const corrected = form.choice('instrument.scale', ['plain', 'corrected'] as const) === 'corrected';
    const towards = readHigh(form, 'downstream') === 'downstream' ? 1 : -1;
    if (fields === undefined || angle === undefined) return undefined;
    const tube = { sine: angle === Math.PI / 2 ? 1 : Math.sin(angle), angle, ...wellOf(bores), corrected };
    return {
      kind: 'inclined',
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
