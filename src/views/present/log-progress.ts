/** How far the conversion of a log is, in words. */
import { progressText } from '../words/logs.ts';
import { spelled } from './numbers.ts';
import { duration } from './stamps.ts';

export interface Progress {
  readonly bytes: number;
  readonly ofBytes: number;
  readonly rows: number;
  readonly rowsPerSecond: number;
  readonly secondsLeft?: number;
}

const WHOLE = { decimals: 0 } as const;
const RATE = { significant: 2, plainTo: 1e9, trim: true } as const;

/** The share that is done, and the rest as text; the rate and the time left once they are known. */
export function presentProgress({ bytes, ofBytes, rows, rowsPerSecond, secondsLeft }: Progress): {
  readonly share: number;
  readonly text: string;
} {
  const rate = rowsPerSecond > 0 ? spelled(rowsPerSecond, RATE, true) : '';
  const left = secondsLeft === undefined ? '' : duration(Number(spelled(secondsLeft, WHOLE, false))).text;
  return { share: ofBytes > 0 ? bytes / ofBytes : 0, text: progressText(spelled(rows, WHOLE, true), rate, left) };
}
