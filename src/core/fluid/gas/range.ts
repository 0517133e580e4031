/**
 * What every gas is asked whatever its equation: is it evaluated at all, would a second phase form, would water condense.
 * And where GERG-2008 holds and how well; the range of DETAIL stands in detail/range.ts.
 * Standard: ISO 20765-2:2015 (GERG-2008), range of validity. SI.
 */
import { type Bounds, isInside } from '../../numeric/bounds.ts';
import type { Temperature } from '../../quantity/kinds.ts';
import { fail, type Outcome } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import type { Caution, FigureRange, StatedUncertainty } from '../contract.ts';
import { critical } from '../cubic/critical.table.ts';
import { splits, trialSum } from '../cubic/stability.ts';
import { componentNames } from '../helmholtz/components.ts';
import { criticalTemperature, saturationPressure } from '../if97/saturation.ts';
import type { Conditions } from '../model.ts';

/** The equation that a gas is computed by where nothing else is said. */
export const GERG: Source = { clause: 'ISO 20765-2:2015 (GERG-2008)', seen: 'second-hand' };

const normal = { temperature: { min: 90, max: 450 }, pressure: { max: 35e6 } } as const; // K, Pa
const best = { temperature: { min: 250, max: 450 }, pressure: { max: 35e6 } } as const; // K, Pa
const extended = { temperature: { min: 60, max: 700 }, pressure: { max: 70e6 } } as const; // K, Pa
const normalRange: Source = { clause: `${GERG.clause}, normal range`, seen: 'second-hand' };
const extendedRange: Source = { clause: `${GERG.clause}, extended range`, seen: 'memory' };
const cubicTest: Source = {
  clause: 'tangent-plane test (Michelsen 1982) with the equation of Peng and Robinson (1976), k_ij = 0',
  seen: 'derived',
};
const waterTest: Source = { clause: 'x p of the water against IAPWS R7-97(2012), Eq. 30', seen: 'derived' };

/** Beyond these no equation is evaluated at all (practice). K, Pa. */
const evaluated = { temperature: { min: 20, max: 3000 }, pressure: { max: 200e6 } } as const;

/** Which of pressure, Pa, and temperature, K, is beyond those bounds; undefined where both are inside. */
export function outsideBy(p: number, T: number): 'pressure' | 'temperature' | undefined {
  if (!(T >= evaluated.temperature.min && T <= evaluated.temperature.max)) return 'temperature';
  return p > 0 && p <= evaluated.pressure.max ? undefined : 'pressure';
}

/** The refusal of a state beyond those bounds. */
export function refusedOutside({ pressure, temperature, paths }: Conditions): Outcome<never> {
  return fail('gas-out-of-range', paths[outsideBy(pressure, temperature) ?? 'temperature'], {
    pressure,
    temperature,
    lowestTemperature: evaluated.temperature.min,
    highestTemperature: evaluated.temperature.max,
    highestPressure: evaluated.pressure.max,
  });
}

const waterPlace = componentNames.indexOf('water');
const triplePoint = 273.16 as Temperature; // K

/** The components of the phase test; water is left out of it, as k_ij = 0 is poor for it. */
const cubicComponents = critical.map(([, Tc, pc, omega]) => ({ Tc, pc: pc * 1e6, omega }));

/** Does a second phase form beside a gas or a liquid, by the cubic equation? Its sum is above 1 then. */
export function phaseSum(x: readonly number[], p: number, T: number, phase: 'gas' | 'liquid' = 'gas'): number {
  const dry = x.map((xi, i) => (i === waterPlace ? 0 : xi));
  return trialSum(cubicComponents, dry, T, p, phase);
}

/**
 * Partial pressure of the water and its saturation pressure, Pa; undefined without water or above its critical point.
 * Below the triple point its pressure is the limit: condensing is then told late, above it rather early (a gas under
 * pressure holds more water than x p says).
 */
function waterPressures(x: readonly number[], p: number, T: number): { at: number; saturated: number } | undefined {
  const water = x[waterPlace] ?? 0;
  if (water === 0 || T > criticalTemperature) return undefined;
  return { at: water * p, saturated: saturationPressure(Math.max(T, triplePoint) as Temperature) };
}

/** Would anything condense? Answers false also where all is well only by the tests above. */
export function condenses(x: readonly number[], p: number, T: number): boolean {
  const water = waterPressures(x, p, T);
  return (water !== undefined && water.at > water.saturated) || splits(phaseSum(x, p, T));
}

/** A mixture that was called a gas and is a liquid at its pressure and temperature. */
export const liquidCaution = (p: number): Caution => ({
  id: 'fluid-liquid',
  verdict: 'caution',
  ofPhase: true,
  value: p,
  unit: 'Pa',
  limit: {},
  source: GERG,
});

/** Everything about a gas by GERG-2008 that a user must know beside its figures. */
export function gasCautions(x: readonly number[], p: number, T: number, phase: 'gas' | 'liquid'): readonly Caution[] {
  return [...gergCautions(x, p, T), ...phaseCautions(x, p, T, phase)];
}

/** In what a state leaves the range of GERG-2008. */
export function gergCautions(_: readonly number[], p: number, T: number): readonly Caution[] {
  return [
    rangeCaution('fluid-range-temperature', T, 'K', normal.temperature, extended.temperature),
    rangeCaution('fluid-range-pressure', p, 'Pa', normal.pressure, extended.pressure),
  ].filter((caution) => caution !== undefined);
}

/** A second phase beside the one claimed, and water that condenses. */
export function phaseCautions(x: readonly number[], p: number, T: number, phase: 'gas' | 'liquid'): readonly Caution[] {
  const water = waterPressures(x, p, T);
  const sum = phaseSum(x, p, T, phase);
  return [
    splits(sum)
      ? ({
          id: 'fluid-two-phase',
          verdict: 'caution',
          ofPhase: true,
          value: sum,
          unit: '1',
          limit: { max: 1 },
          source: cubicTest,
        } as const)
      : undefined,
    water !== undefined && water.at > water.saturated && phase === 'gas'
      ? ({
          id: 'water-dew-point',
          verdict: 'caution',
          ofPhase: true,
          value: water.at,
          unit: 'Pa',
          limit: { max: water.saturated },
          source: waterTest,
        } as const)
      : undefined,
  ].filter((caution) => caution !== undefined);
}

function rangeCaution(id: string, value: number, unit: string, usual: Bounds, wide: Bounds): Caution | undefined {
  if (isInside(value, usual)) return undefined;
  const known = isInside(value, wide);
  return known
    ? { id, verdict: 'caution', value, unit, limit: usual, source: normalRange }
    : { id, verdict: 'outside', value, unit, limit: wide, source: extendedRange };
}

/** Mixtures with more than this of hydrogen, water and hydrogen sulfide together are known less well (practice). */
const POORLY_KNOWN = 0.1;
const poorly = ['hydrogen', 'water', 'hydrogen-sulfide'].map((name) => componentNames.indexOf(name));

/**
 * Expanded relative uncertainty of density and of the speed of sound: 0.1 % from 250 K to 450 K to 35 MPa, else and for
 * much hydrogen, water or hydrogen sulfide 1 %; none is known outside the normal range.
 */
export function gasUncertainty(x: readonly number[], p: number, T: number): StatedUncertainty | undefined {
  if (!isInside(T, normal.temperature) || !isInside(p, normal.pressure)) return undefined;
  const source = { clause: `${GERG.clause}, uncertainty`, seen: 'memory' } as const;
  return { share: isBest(x, p, T) ? 0.001 : 0.01, source }; // GERG-2008, uncertainty
}

/** The states in which that uncertainty is smallest; else the normal range. */
export const gergRange = (x: readonly number[], p: number, T: number): FigureRange => (isBest(x, p, T) ? best : normal);

function isBest(x: readonly number[], p: number, T: number): boolean {
  const share = poorly.reduce((sum, place) => sum + (x[place] ?? 0), 0);
  const known = share <= POORLY_KNOWN || x.includes(1); // a pure gas is known well
  return known && isInside(T, best.temperature) && isInside(p, best.pressure);
}
