/** Exact decimal arithmetic for unit factors: a factor is a fraction of two decimals, divided once at the end. */
import { Decimal } from 'decimal.js';
import { FACTORS } from './factors.table.ts';

/**
 * Decimals of 160 digits: a number of up to 100 digits times a factor keeps every digit, so the one division is the
 * only rounding before the double. ROUND_HALF_UP of decimal.js is half away from zero.
 */
export const Exact = Decimal.clone({ precision: 160, rounding: Decimal.ROUND_HALF_UP, defaults: true });

export interface Fraction {
  readonly numerator: Decimal;
  readonly denominator: Decimal;
}

const known = new Map<string, Fraction>();

/** Value of a factor: decimal texts and names of factors.table.ts joined by ` * ` and ` / `, from left to right. */
export function fractionOf(factor: string): Fraction {
  const seen = known.get(factor);
  if (seen) return seen;
  let numerator = new Exact(1);
  let denominator = new Exact(1);
  let divide = false;
  for (const part of factor.split(' ')) {
    if (part === '*' || part === '/') {
      divide = part === '/';
      continue;
    }
    const value = partOf(part);
    numerator = numerator.times(divide ? value.denominator : value.numerator);
    denominator = denominator.times(divide ? value.numerator : value.denominator);
  }
  const fraction = { numerator, denominator };
  known.set(factor, fraction);
  return fraction;
}

function partOf(part: string): Fraction {
  if (/^\d+(\.\d+)?$/.test(part)) return { numerator: new Exact(part), denominator: new Exact(1) };
  const row = FACTORS.get(part);
  if (!row) throw new Error(`expected a factor of factors.table.ts, got ${part}`);
  return fractionOf(row.value);
}

/** The double nearest to a decimal, never minus zero; infinity beyond the range of a double. */
export function nearestDouble(value: Decimal): number {
  const double = Number(value.toString());
  return double === 0 ? 0 : double;
}
