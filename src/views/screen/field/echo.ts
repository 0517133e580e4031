/** What a typed quantity was read as, in its own unit and in that of the SI. */
import { type Quantity, readQuantity } from '../../../core/quantity/text.ts';
import { type Measure, unitsFor } from '../../../core/quantity/units.ts';
import { asWritten, show } from '../../present/numbers.ts';

/** Six digits: enough to recognise the figure, the exact one stands in the field. */
const ROUNDING = { significant: 6 } as const;

function words(read: Quantity): string {
  const [si] = unitsFor(read.unit.measure);
  const own = asWritten(read).text;
  return si === undefined || si.symbol === read.unit.symbol ? own : `${own} = ${show(read.si, si, ROUNDING).text}`;
}

/** '' where the text is spelled as it was typed, or cannot be read. */
export function echoOf(typed: string, file: string, measures: readonly Measure[]): string {
  const read = readQuantity(file, measures, '');
  return !read.ok || typed.trim() === read.value.number ? '' : `read as ${words(read.value)}`;
}
