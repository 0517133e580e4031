/** Lines of working that several fluids share: the figures they start from, and what follows from them the same way. */
import type { Source } from '../quantity/source.ts';
import { type Given, named, type Working } from '../quantity/working.ts';
import type { State } from './model.ts';

/** Where a stated figure comes from. */
export const byUser: Source = { clause: 'stated by the user', seen: 'practice' };

/** A figure that the user stated, without a formula. */
export const statedLine = (id: string, symbol: string, value: number, unit: string): Working => ({
  id,
  symbol,
  given: [],
  value,
  unit,
  source: byUser,
  remark: 'stated',
});

/** Pressure, temperature and density at the upstream tapping; SI. */
export const p1 = (pressure: number): Given => named('p_1', pressure, 'Pa(a)', 'pressure-upstream');
export const T1 = (temperature: number): Given => named('T_1', temperature, 'K', 'temperature-upstream');
export const rho1 = (density: number): Given => named('ρ_1', density, 'kg/m3', 'density');
/** Pressure and temperature of the project's base state; SI. */
export const atBase = ({ pressure, temperature }: State): readonly [p: Given, T: Given] => [
  named('p_b', pressure, 'Pa(a)', 'pressure-base'),
  named('T_b', temperature, 'K', 'temperature-base'),
];
/** Molar mass, kg/mol; molar gas constant of an equation, J/(mol.K); compressibility factor; speed of sound, m/s. */
export const molar = (M: number): Given => named('M', M, 'kg/mol', 'molar-mass');
export const gasConstant = (R: number): Given => named('R', R, 'J/(mol.K)', 'molar-gas-constant');
export const factor = (Z: number): Given => named('Z', Z, '', 'compressibility');
export const sound = (w: number): Given => named('w', w, 'm/s', 'speed-of-sound');

/** κ = w² ρ / p, from the speed of sound. */
export const exponentLine = (w: Given, rho: Given, p: Given, value: number, source: Source): Working => ({
  id: 'isentropicExponent',
  symbol: 'κ',
  formula: 'w^2 * ρ_1 / p_1',
  given: [w, rho, p],
  value,
  unit: '',
  source,
});

/** w = √(κ p / ρ), from the isentropic exponent, m/s. */
export const soundLine = (kappa: number, p: Given, rho: Given, value: number, source: Source): Working => ({
  id: 'speedOfSound',
  symbol: 'w',
  formula: 'sqrt(κ * p_1 / ρ_1)',
  given: [named('κ', kappa, '', 'isentropic-exponent'), p, rho],
  value,
  unit: 'm/s',
  source,
});

/** What ties pressure, temperature and density of a gas. */
export interface Molar {
  readonly p: Given;
  readonly T: Given;
  readonly M: Given;
  readonly R: Given;
}

/** Z = p M / (ρ R T), from the density. */
export const factorLine = ({ p, T, M, R }: Molar, rho: Given, value: number, source: Source): Working => ({
  id: 'compressibility',
  symbol: 'Z',
  formula: 'p_1 * M / (ρ_1 * R * T_1)',
  given: [p, M, rho, R, T],
  value,
  unit: '',
  source,
});

/** ρ = p M / (Z R T), from the compressibility factor, kg/m3. */
export const densityLine = ({ p, T, M, R }: Molar, Z: Given, value: number, source: Source): Working => ({
  id: 'density',
  symbol: 'ρ_1',
  formula: 'p_1 * M / (Z * R * T_1)',
  given: [p, M, Z, R, T],
  value,
  unit: 'kg/m3',
  source,
});

/** A line of the density at the base state, kg/m3, whatever it follows from. */
export const baseLine = (given: readonly Given[], value: number, source: Source): Working => ({
  id: 'baseDensity',
  symbol: 'ρ_b',
  given,
  value,
  unit: 'kg/m3',
  source,
});

/** ρ_b = p_b M / (Z_b R T_b), from the compressibility factor at the base state. */
export function baseGasLine(M: Given, R: Given, Zb: number, base: State, value: number, source: Source) {
  const [p, T] = atBase(base);
  const given = [p, M, named('Z_b', Zb, '', 'compressibility-base'), R, T];
  return { ...baseLine(given, value, source), formula: 'p_b * M / (Z_b * R * T_b)' };
}
