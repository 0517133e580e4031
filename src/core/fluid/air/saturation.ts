/**
 * What stands over water or ice in air: the saturation pressure, and the enhancement factor by which air raises it.
 * Standard: IAPWS R7-97(2012), Eq. 30 (liquid water), IAPWS R14-08(2011), Eq. 6 (ice), CIPM-2007 (its range, and water
 * below its freezing point). Symbols: p in Pa, T in K, t in degC, e saturation pressure of pure water.
 */
import { zeroCelsius as zero } from '../../quantity/constants.ts';
import type { AbsolutePressure, Temperature } from '../../quantity/kinds.ts';
import type { Source } from '../../quantity/source.ts';
import { saturationPressure as overLiquid } from '../if97/saturation.ts';
import { enhancementFactor as cipmFactor, saturationPressure as cipmPressure, holds } from './cipm.ts';
import { overIce, overWater } from './enhancement.table.ts';

/** Water vapour that air holds at most at p and T: x_s = f p_s / p. */
export interface Saturated {
  readonly pressure: AbsolutePressure; // p_s, of pure water or ice
  readonly factor: number; // f
  readonly sources: { readonly pressure: Source; readonly factor: Source };
  /** Code of the sentence that says over what. */
  readonly remark: 'over-water' | 'over-ice' | 'over-supercooled-water';
}

const second = (clause: string): Source => ({ clause, seen: 'second-hand' });
const cipm = second('CIPM-2007, Metrologia 45 (2008) 149, Eq. A1.1');
const cipmF = second('CIPM-2007, Metrologia 45 (2008) 149, Eq. A1.2');
const if97 = second('IAPWS R7-97(2012), Eq. 30');
const ice = second('IAPWS R14-08(2011), Eq. 6');
const hardy: Source = { clause: 'Hardy 1998 (ITS-90), after Greenspan, J. Res. NBS 80A (1976) 41', seen: 'memory' };

/** Where the enhancement factor is known. Greenspan 1976: -100 degC to 100 degC, to 2 MPa. K and Pa. */
export const enhancementRange = { temperature: { min: 173.15, max: 373.15 }, pressure: { max: 2e6 } } as const;
/** Where that range comes from. */
export const enhancementSource = hardy;

/**
 * Water vapour over liquid water, or over ice below 0 degC where `frost` asks for it (a dew point read below 0 degC).
 * @param near the state of the air: inside the range of CIPM-2007 its own formulas are taken for liquid water
 * T from 173.15 K (ice) or 223.15 K (water) to 647.096 K.
 */
export function saturatedAt(T: Temperature, p: AbsolutePressure, frost: boolean, near: Temperature): Saturated {
  if (T < zero && frost) return over(sublimationPressure(T), T, p, ice, 'over-ice');
  if (T < zero) return over(cipmPressure(T), T, p, cipm, 'over-supercooled-water');
  if (!holds(p, near)) return over(overLiquid(T), T, p, if97, 'over-water');
  const sources = { pressure: cipm, factor: cipmF };
  return { pressure: cipmPressure(T), factor: cipmFactor(p, T), sources, remark: 'over-water' };
}

const over = (
  pressure: AbsolutePressure,
  T: Temperature,
  p: AbsolutePressure,
  source: Source,
  remark: Saturated['remark'],
): Saturated => ({
  pressure,
  factor: enhancementFactor(T, p, pressure),
  sources: { pressure: source, factor: hardy },
  remark,
});

/** Sublimation pressure of ice, Pa, 50 K to 273.16 K. IAPWS R14-08(2011), Eq. 6. */
export function sublimationPressure(T: Temperature): AbsolutePressure {
  const theta = T / 273.16; // K, triple point
  const terms = [
    [-0.212144006e2, 0.333333333e-2], // Table 3
    [0.273203819e2, 1.20666667], // Table 3
    [-0.61059813e1, 1.70333333], // Table 3
  ] as const;
  const sum = terms.reduce((total, [a, b]) => total + a * theta ** b, 0);
  return (611.657 * Math.exp(sum / theta)) as AbsolutePressure; // Eq. 6
}

/**
 * Enhancement factor at T over water, below 0 degC over ice, for the saturation pressure e. 1 where the vapour boils;
 * beyond 100 degC the coefficients stay those of 100 degC.
 */
export function enhancementFactor(T: Temperature, p: AbsolutePressure, e: AbsolutePressure): number {
  const { a, b } = T < zero ? overIce : overWater;
  const { min, max } = enhancementRange.temperature;
  const t = Math.min(Math.max(T, min), max) - zero;
  const alpha = a.reduceRight((sum, next) => sum * t + next, 0);
  const beta = Math.exp(b.reduceRight((sum, next) => sum * t + next, 0));
  return Math.exp(alpha * (1 - e / p) + beta * (p / e - 1)); // Greenspan 1976, form of Eq. 5
}
