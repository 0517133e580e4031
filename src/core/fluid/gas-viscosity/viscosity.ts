/**
 * Viscosity of a gas of known composition: the reference correlation where it is one pure gas or dry air, the scheme of
 * mixtures for the rest. Standard: none; the sources of pure.ts and scheme.ts. Symbols: T in K, rho in mol/m3.
 */
import { isInside } from '../../numeric/bounds.ts';
import type { DynamicViscosity, Temperature } from '../../quantity/kinds.ts';
import type { Source } from '../../quantity/source.ts';
import type { Caution, StatedUncertainty } from '../contract.ts';
import { critical } from '../cubic/critical.table.ts';
import { components } from '../helmholtz/components.table.ts';
import { rows } from './components.table.ts';
import { referenceOf } from './pure.ts';
import { reducedDensity, type Share, schemeViscosity, type ViscousGas } from './scheme.ts';

/** How the viscosity of a state is found. */
export interface ViscosityBasis {
  readonly method: 'reference' | 'scheme';
  readonly source: Source;
  /** Expanded relative uncertainty at 95 %. */
  readonly uncertainty: number;
  /** Temperatures between which every correlation that takes part holds, K. */
  readonly temperatures: readonly [lowest: number, highest: number];
}

const scheme: Source = {
  clause: 'Wilke, J. Chem. Phys. 18 (1950) 517, with Dean and Stiel, AIChE J. 11 (1965) 526',
  seen: 'second-hand',
};

/** Gases that the scheme meets within 3 %, up to a density like that of natural gas at 12 MPa (found against vectors). */
const light = ['methane', 'nitrogen', 'oxygen', 'argon', 'hydrogen', 'helium', 'carbon-monoxide'];
const lightUncertainty = { share: 0.7, reducedDensity: 0.65, within: 0.03, beyond: 0.1 };

/** What the scheme is good for with any gas. */
export const schemeUncertainty: StatedUncertainty = { share: lightUncertainty.beyond, source: scheme };

/** What the scheme asks of each component, in the order of GERG-2008. */
const gases: readonly ViscousGas[] = components.map(({ name, M }, at) => {
  const [viscous, C, lowest, highest, Vc] = rows[at] ?? fault(name);
  const [pure, Tc, pc] = critical[at] ?? fault(name);
  return viscous === name && pure === name ? { M, C, lowest, highest, Tc, pc, Vc } : fault(name);
});

function fault(name: string): never {
  throw new Error(`expected ${name} at its place in every table, got another component`);
}

/**
 * Viscosity, Pa.s, at temperature T, K, and molar density rho, mol/m3.
 * @param fractions mole fractions of the 21 components of GERG-2008 in its order, adding up to 1
 * Always positive for positive T and a density a fluid can have; see viscosityBasis for range and uncertainty.
 */
export function gasViscosity(fractions: readonly number[], T: Temperature, rho: number): DynamicViscosity {
  const reference = referenceOf(fractions, T, rho / 1e3);
  if (reference === undefined) return schemeOf(fractions, T, rho);
  return (reference.eta(T, rho / 1e3) * 1e-6) as DynamicViscosity; // uPa.s
}

/** The scheme of mixtures for the same arguments, whatever the composition. */
export const schemeOf = (fractions: readonly number[], T: Temperature, rho: number): DynamicViscosity =>
  schemeViscosity(sharesOf(fractions), T, rho);

/** How gasViscosity finds its answer for the same arguments. */
export function viscosityBasis(fractions: readonly number[], T: Temperature, rho: number): ViscosityBasis {
  const reference = referenceOf(fractions, T, rho / 1e3);
  if (reference !== undefined) {
    const { source, uncertainty, temperatures } = reference;
    return { method: 'reference', source, uncertainty, temperatures };
  }
  const shares = sharesOf(fractions);
  const { share, within, beyond, ...dense } = lightUncertainty;
  const lightShare = light.reduce(
    (sum, gas) => sum + (fractions[components.findIndex(({ name }) => name === gas)] ?? 0),
    0,
  );
  const near = lightShare >= share && reducedDensity(shares, rho) <= dense.reducedDensity;
  return { method: 'scheme', source: scheme, uncertainty: near ? within : beyond, temperatures: overlap(shares) };
}

/** The components that are there at all. */
function sharesOf(fractions: readonly number[]): readonly Share[] {
  return gases.flatMap((gas, at) => {
    const x = fractions[at] ?? 0;
    return x > 0 ? [{ x, gas }] : [];
  });
}

/** A trace that leaves its own range moves the mixture by less than this share (practice). */
const TRACE = 0.01;

function overlap(shares: readonly Share[]): ViscosityBasis['temperatures'] {
  const counted = shares.filter(({ x }) => x >= TRACE).map(({ gas }) => gas);
  return [Math.max(...counted.map(({ lowest }) => lowest)), Math.min(...counted.map(({ highest }) => highest))];
}

/** The caution that a temperature outside the correlations asks for. */
export function viscosityCautions(
  { temperatures, source }: Pick<ViscosityBasis, 'temperatures' | 'source'>,
  T: Temperature,
): readonly Caution[] {
  const [min, max] = temperatures;
  if (isInside(T, { min, max })) return [];
  return [{ id: 'viscosity-range-temperature', verdict: 'caution', value: T, unit: 'K', limit: { min, max }, source }];
}
