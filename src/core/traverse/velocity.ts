/**
 * The velocity at the head of a pitot-static or S-type tube from the difference it reads.
 * Standard: ISO 3966, clause 8 (whose series in x is that of the isentropic law used here); 40 CFR 60 App. A, Method 2.
 * Symbols: Δp the reading, p the static pressure, ρ the density at p, x = Δp/p, κ the isentropic exponent, K the
 * coefficient; SI.
 */

import type { FluidState } from '../fluid/contract.ts';
import { gaugeWaterDensity, mercuryDensity } from '../fluid/gauge-liquid.ts';
import type { Manometer, Probe, ProbeKind } from '../input/traverse-probe.ts';
import type { Acceleration, Density, Length, PressureDifference, Velocity } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';

/** What a probe is taken for where neither coefficient nor calibration is stated. */
export const USUAL_COEFFICIENT: Readonly<Record<ProbeKind, { readonly value: number; readonly source: Source }>> = {
  'pitot-static': { value: 1, source: { clause: 'ISO 3966, tubes of the standard', seen: 'memory' } },
  's-type': { value: 0.84, source: { clause: '40 CFR 60 App. A, Method 2, S-type', seen: 'memory' } },
};

/**
 * The share of 2 Δp/ρ that is the square of the velocity in a gas that is brought to rest without loss; 1 at Δp = 0.
 * The series in x begins 1 - x/(2 κ) + (κ + 1) x^2/(6 κ^2).
 */
export function impactShare(x: number, kappa: number): number {
  if (x === 0) return 1;
  const m = (kappa - 1) / kappa;
  const L = Math.log1p(x); // ln(p_0/p)
  return (Math.abs(m) < 1e-9 ? L : Math.expm1(m * L) / m) / x; // v^2 = 2 p/ρ ((1 + x)^m - 1)/m
}

/** Mach number at which a gas comes to rest at this x. */
export function machOf(x: number, kappa: number): number {
  return Math.sqrt((2 * x * impactShare(x, kappa)) / kappa); // M^2 = v^2 ρ/(κ p)
}

/** Indicated velocity, that of a probe with K = 1; a reading of zero or less has none. m/s. */
export function indicatedVelocity(differential: PressureDifference, state: FluidState): Velocity {
  if (differential <= 0) return 0 as Velocity;
  const incompressible = (2 * differential) / state.density; // Bernoulli
  const kappa = state.expands ? state.isentropicExponent : undefined;
  const share = kappa === undefined ? 1 : impactShare(differential / state.pressure, kappa);
  return Math.sqrt(incompressible * share) as Velocity;
}

/**
 * Velocity from the indicated one. The coefficient of a calibration is linear in the velocity between its rows and held
 * beyond them; the indicated velocity rises from row to row, so that there is one answer.
 */
export function pointVelocity(indicated: Velocity, { kind, coefficient, calibration }: Probe): Velocity {
  const stated = coefficient ?? USUAL_COEFFICIENT[kind].value;
  if (calibration.length === 0) return (stated * indicated) as Velocity;
  const after = calibration.findIndex((row) => row.velocity / row.coefficient >= indicated);
  const held = after === 0 ? calibration[0] : after === -1 ? calibration.at(-1) : undefined;
  if (held !== undefined) return (held.coefficient * indicated) as Velocity;
  const [low, high] = [calibration[after - 1], calibration[after]];
  if (low === undefined || high === undefined) throw new Error('pointVelocity: expected two rows around, got one');
  const slope = (high.coefficient - low.coefficient) / (high.velocity - low.velocity);
  const constant = low.coefficient - slope * low.velocity;
  return ((constant * indicated) / (1 - slope * indicated)) as Velocity; // v = (constant + slope v) indicated
}

/** Pressure difference over a column of manometer liquid under the fluid of the duct: Δp = (ρ_m - ρ) g h. */
export const columnDifference = (h: number, liquid: Density, above: Density, g: Acceleration): PressureDifference =>
  ((liquid - above) * g * h) as PressureDifference;

/** Pressure difference of a length read along the tube of a manometer. */
export function manometerDifference(
  read: Length,
  { sine, ...manometer }: Manometer,
  above: Density,
  g: Acceleration,
): PressureDifference {
  return columnDifference(read * sine, liquidDensity(manometer), above, g);
}

/** Density of the liquid in the manometer. */
export function liquidDensity({ liquid, temperature }: Pick<Manometer, 'liquid' | 'temperature'>): Density {
  if (liquid === 'mercury') return mercuryDensity(temperature);
  return liquid === 'water' ? gaugeWaterDensity(temperature) : liquid;
}
