/**
 * Pressure difference: any instrument that shows one, at the end of two legs. Legs that are not filled as the pipe is
 * leave the difference of their heads.
 */
import { ok } from '../quantity/outcome.ts';
import { named, type Working } from '../quantity/working.ts';
import { asked } from './asked.ts';
import { readCell, readCellFields } from './cell.ts';
import type { Instrument } from './contract.ts';
import { reversedCautions } from './reversed.ts';
import { combinedWorking, statedParts } from './stated.ts';

export const differential: Instrument = {
  kind: 'differential',
  settle(form) {
    const fields = readCellFields(form, false);
    const zero = form.quantity('instrument.zero', ['pressure difference'])?.si ?? 0;
    return {
      kind: 'differential',
      asks: { shows: ['pressure difference'] },
      read({ value }, at) {
        const shown = asked(value, 'a value').si;
        const { differential: across, cautions, working, picture } = readCell(shown - zero, fields, at);
        const parts = statedParts(fields.uncertainty, { span: 0, reading: Math.abs(across) });
        return ok({
          standing: 'as-shown',
          differential: across,
          cautions: [...reversedCautions(across), ...cautions],
          working: [...zeroLine(shown, zero), ...working, ...combinedWorking(parts)],
          uncertainty: parts,
          picture,
        });
      },
    };
  },
};

function zeroLine(shown: number, zero: number): readonly Working[] {
  if (zero === 0) return [];
  const given = [named('Δp_r', shown, 'Pa', 'reading'), named('Δp_0', zero, 'Pa', 'zero-of-cell')];
  const source = { clause: 'zero with both sides at one pressure', seen: 'derived' } as const;
  return [{ id: 'cell', symbol: 'Δp_c', formula: 'Δp_r - Δp_0', given, value: shown - zero, unit: 'Pa', source }];
}
