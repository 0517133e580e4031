/** An amount of bytes in the unit that keeps its figure small: '963 MB'. */
import { sizeText } from '../words/logs.ts';
import { spelled } from './numbers.ts';

const SIZES = [
  [1e9, sizeText.giga],
  [1e6, sizeText.mega],
  [1e3, sizeText.kilo],
] as const;

export function bytesText(bytes: number): string {
  const [size, unit] = SIZES.find(([least]) => bytes >= least) ?? [1, sizeText.bytes];
  return `${spelled(bytes / size, { significant: 3, trim: true }, true)}\u00a0${unit}`;
}
