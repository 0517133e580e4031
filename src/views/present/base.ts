/** A text of the site or the base state as it is printed. */
import { readQuantity } from '../../core/quantity/text.ts';
import { asWritten } from './numbers.ts';

/** The same text where it cannot be read. */
export function asPrinted(text: string): string {
  const read = readQuantity(text, ['absolute pressure', 'temperature', 'acceleration', 'length', 'angle'], '');
  return read.ok ? asWritten(read.value).text : text;
}
