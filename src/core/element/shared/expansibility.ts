/**
 * Expansibility factors, prepared for one diameter ratio and isentropic exponent.
 * Both hold for 0 <= x < 1 with x = dp/p1 and kappa > 0; the standard uses them for p2/p1 >= 0.75.
 */
import type { Source } from '../../quantity/source.ts';
import type { Given, Working } from '../../quantity/working.ts';
import type { Expansibility } from '../contract.ts';

/**
 * Orifice plates: 1 - (0.351 + 0.256 beta^4 + 0.93 beta^8) (1 - tau^(1/kappa)), tau = 1 - x.
 * Source: ISO 5167-2:2022, Formula (5). Throws a defect for x outside [0, 1).
 */
export const orificeExpansibility = (ratio: number, isentropicExponent: number): Expansibility => {
  const b2 = ratio * ratio; // products, since a power costs as much as all the rest
  const b4 = b2 * b2;
  const slope = 0.351 + 0.256 * b4 + 0.93 * b4 * b4; // ISO 5167-2, Formula (5)
  return (expansion) => 1 + slope * Math.expm1(logTau(expansion) / isentropicExponent);
};

/**
 * Nozzles, Venturi nozzles and Venturi tubes: one-dimensional isentropic flow,
 * eps^2 = [kappa tau^(2/kappa)/(kappa-1)] [(1-beta^4)/(1-beta^4 tau^(2/kappa))] [(1-tau^((kappa-1)/kappa))/(1-tau)].
 * Written with expm1 and log1p, so that it keeps every digit at small x and passes kappa = 1 and x = 0 smoothly.
 * Source: ISO 5167-3:2022, 5.1.6.3, and ISO 5167-4:2003, 5.6. Throws a defect for x outside [0, 1).
 */
export const nozzleExpansibility = (ratio: number, isentropicExponent: number): Expansibility => {
  const b2 = ratio * ratio;
  const b4 = b2 * b2;
  const n = (isentropicExponent - 1) / isentropicExponent;
  return (x) => {
    const l = logTau(x); // ln tau
    // ISO 5167-3, 5.1.6.3, factor by factor
    const jet = Math.exp((2 * l) / isentropicExponent); // tau^(2/kappa)
    const area = (1 - b4) / (1 - b4 * jet);
    const work = x === 0 ? 1 : (-l / x) * relativeExpm1(n * l); // kappa/(kappa-1) (1-tau^((kappa-1)/kappa))/(1-tau)
    return Math.sqrt(jet * area * work);
  };
};

/** The exponent of a fluid that expands; one without it is a defect of the fluid's model. */
export const exponentOf = ({ isentropicExponent }: { readonly isentropicExponent?: number }): number => {
  if (isentropicExponent !== undefined) return isentropicExponent;
  throw new Error('expansibility: expected an isentropic exponent for a fluid that expands, got none');
};

/** The working of the orifice form. */
export const orificeExpansibilityWorking = (ratio: number, kappa: number, x: number, source: Source): Working => ({
  id: 'epsilon',
  symbol: 'ε',
  formula: '1 - (0.351 + 0.256 * β^4 + 0.93 * β^8) * (1 - τ^(1 / κ))', // ISO 5167-2, Formula (5)
  given: expansionGiven(ratio, kappa, x),
  value: orificeExpansibility(ratio, kappa)(x),
  unit: '',
  source,
});

/** The working of the nozzle form; the limit of kappa = 1 and x = 0 has a formula of its own. */
export const nozzleExpansibilityWorking = (ratio: number, kappa: number, x: number, source: Source): Working => ({
  id: 'epsilon',
  symbol: 'ε',
  formula: nozzleFormula(kappa, x),
  given: expansionGiven(ratio, kappa, x),
  value: nozzleExpansibility(ratio, kappa)(x),
  unit: '',
  source,
  remark: 'expansibility-isentropic',
});

const nozzleFormula = (kappa: number, x: number): string => {
  if (x === 0) return '1';
  const area = '(1 - β^4) / (1 - β^4 * τ^(2 / κ))';
  if (kappa === 1) return `sqrt(τ^2 * ${area} * ln(1 / τ) / (1 - τ))`;
  return `sqrt(κ * τ^(2 / κ) / (κ - 1) * ${area} * (1 - τ^((κ - 1) / κ)) / (1 - τ))`;
};

const expansionGiven = (ratio: number, kappa: number, x: number): readonly Given[] => [
  { symbol: 'β', value: ratio, unit: '', words: 'diameter-ratio' },
  { symbol: 'κ', value: kappa, unit: '', words: 'isentropic-exponent' },
  { symbol: 'τ', value: 1 - x, unit: '', words: 'pressure-ratio' },
];

const logTau = (x: number): number => {
  if (!(x >= 0 && x < 1)) throw new RangeError(`expansibility: expected 0 <= dp/p1 < 1, got ${x}`);
  return Math.log1p(-x);
};

/** (e^t - 1)/t, 1 at t = 0. */
const relativeExpm1 = (t: number): number => (t === 0 ? 1 : Math.expm1(t) / t);
