/** A unit in its file spelling as it is printed, whether or not the table of units knows it. */
import { measuresOf, unitOf } from '../../core/quantity/units.ts';

const raised: Readonly<Record<string, string>> = { '2': '²', '3': '³', '4': '⁴' };

/** kg/m3 as kg/m³, J/(kg.K) as J/(kg·K). */
export function unitText(symbol: string): string {
  const known = unitOf(symbol, measuresOf(symbol));
  if (known !== undefined) return known.print;
  return symbol.replaceAll('.', '·').replace(/(?<=[a-z])[234]/g, (digit) => raised[digit] ?? digit);
}
