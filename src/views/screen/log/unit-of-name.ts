/** The unit that the name of a column carries: 'dp_mbar', 'Temperature [degC]', 'p / bar(g)'. */
import { type Measure, unitOf } from '../../../core/quantity/units.ts';

/** Its spelling in a file; undefined when the name carries none of these measures. */
export function unitOfName(name: string, measures: readonly Measure[]): string | undefined {
  const parts = [/\[([^\]]+)\]\s*$/, /\/\s*(\S+)\s*$/, /[\s_]\(([^)]+)\)\s*$/, /_([^_\s]+)\s*$/, /\s(\S+)\s*$/];
  for (const part of parts) {
    const spelling = part.exec(name)?.[1];
    const unit = spelling === undefined ? undefined : unitOf(spelling, measures);
    if (unit !== undefined) return unit.symbol;
  }
  return undefined;
}
