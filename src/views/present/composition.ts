/** A composition as it is being written: what it adds up to, and what is missing to a whole. */
import { readQuantity } from '../../core/quantity/text.ts';
import { unitOf } from '../../core/quantity/units.ts';
import type { Value } from './model.ts';
import { show } from './numbers.ts';
import type { Rounding } from './rounding.ts';

export interface CompositionSum {
  readonly sum: Value;
  /** What is missing to a whole, or stands above it; absent where both are alike as printed. */
  readonly missing?: Value;
  readonly above?: Value;
  /** How many shares can be read and are not empty. */
  readonly count: number;
}

/** Ten-thousandths of a per cent are finer than any analysis. */
const ROUNDING: Rounding = { decimals: 4, trim: true };

/** @param shares texts as the document has them: '94 %', '0.94'; what cannot be read counts as nothing */
export function compositionSum(shares: readonly string[]): CompositionSum {
  const read = shares.flatMap((text) => shareOf(text) ?? []);
  const sum = show(
    read.reduce((total, share) => total + share, 0),
    percent,
    ROUNDING,
  );
  const off = show(1 - sum.si, percent, ROUNDING);
  const amount = show(sum.si - 1, percent, ROUNDING);
  const whole = Number(off.plain.split(' ')[0]) === 0;
  return {
    sum,
    count: read.length,
    ...(whole ? {} : sum.si < 1 ? { missing: off } : { above: amount }),
  };
}

const percent = unitOf('%', ['share']);

/** The share of 1 that a text stands for; a plain number stands for itself. */
function shareOf(text: string): number | undefined {
  if (text.trim() === '') return undefined;
  const plain = Number(text);
  if (Number.isFinite(plain)) return plain;
  const read = readQuantity(text, ['share'], '');
  return read.ok ? read.value.si : undefined;
}
