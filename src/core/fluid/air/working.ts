/** Where the figures of air come from, and their working. */
import type { Source } from '../../quantity/source.ts';
import type { Given, Working } from '../../quantity/working.ts';
import type { FluidState } from '../contract.ts';
import { GERG } from '../gas/range.ts';
import { R } from '../gerg/mixture.ts';
import type { State } from '../model.ts';
import { waterMolarMass } from './cipm.table.ts';
import { molarMassOfDryAir } from './cipm.ts';
import type { AirDensity } from './mixture.ts';
import type { Vapour } from './moisture.ts';
import { named, vapourWorking } from './moisture-working.ts';

/** The figures of a state that have a source and a working. */
export type AirFigures = Pick<FluidState, 'pressure' | 'temperature' | 'density' | 'viscosity'> &
  Required<Pick<FluidState, 'molarMass' | 'isentropicExponent' | 'compressibility' | 'speedOfSound'>>;

/** What a base volume of moist air counts: all of it as a gas, or its dry air alone. */
export type BaseBasis = 'wet' | 'dry';

/** Air at the base state; the density is that which turns the mass flow into the base volume of the basis. */
export interface BaseAir extends AirDensity {
  readonly basis: BaseBasis;
  /** Mass fraction of the water. */
  readonly water: number;
}

const cipm: Source = { clause: 'CIPM-2007, Metrologia 45 (2008) 149, Eq. 1', seen: 'second-hand' };
const cipmFactor: Source = { clause: 'CIPM-2007, Metrologia 45 (2008) 149, Eq. A1.4', seen: 'second-hand' };
const densityBy = { cipm, gerg: GERG } as const;
const realGas: Source = { clause: 'Z = p M / (ρ R T) with the density of GERG-2008', seen: 'derived' };
const exponent: Source = { clause: 'κ = w² ρ / p with the speed of sound of GERG-2008', seen: 'derived' };
const dryBasis: Source = { clause: 'base volume of the dry air alone: ρ_b / (1 - w)', seen: 'derived' };

const baseSource = ({ by, basis }: BaseAir): Source => (basis === 'dry' ? dryBasis : densityBy[by]);

/** The formulation of each figure that the state has. */
export function airSources(by: AirDensity['by'], viscosity: Source, base?: BaseAir): FluidState['sources'] {
  return {
    density: densityBy[by],
    viscosity,
    isentropicExponent: exponent,
    ...(base === undefined ? {} : { baseDensity: baseSource(base) }),
  };
}

const gasConstant = named('R', R, 'J/(mol.K)', 'molar-gas-constant');

/** The working of each figure, the water in the air first. */
export function airWorking(
  figures: AirFigures,
  by: AirDensity['by'],
  vapour: Vapour | undefined,
  viscosity: Source,
  atBase: BaseAir | undefined,
  base: State,
): readonly Working[] {
  const p = named('p_1', figures.pressure, 'Pa(a)', 'pressure-upstream');
  const T = named('T_1', figures.temperature, 'K', 'temperature-upstream');
  const rho = named('ρ_1', figures.density, 'kg/m3', 'density');
  const w = named('w', figures.speedOfSound, 'm/s', 'speed-of-sound');
  return [
    ...(vapour === undefined ? [] : vapourWorking(vapour, p, T)),
    ...(by === 'cipm' ? byFormula(figures, vapour, p, T) : byMixture(figures, p, T, rho)),
    {
      id: 'viscosity',
      symbol: 'μ_1',
      given: [rho, T],
      value: figures.viscosity,
      unit: 'Pa.s',
      source: viscosity,
      remark: vapour === undefined ? 'viscosity-of-air' : 'viscosity-of-moist-air',
    },
    {
      id: 'speedOfSound',
      symbol: 'w',
      given: [p, T],
      value: w.value,
      unit: 'm/s',
      source: GERG,
      remark: 'gerg-speed-of-sound',
    },
    {
      id: 'isentropicExponent',
      symbol: 'κ',
      formula: 'w^2 * ρ_1 / p_1',
      given: [w, rho, p],
      value: figures.isentropicExponent,
      unit: '',
      source: exponent,
    },
    ...(atBase === undefined ? [] : [baseWorking(atBase, base, vapour)]),
  ];
}

/** Density by the formula of metrology: molar mass, compressibility factor, density. */
function byFormula(figures: AirFigures, vapour: Vapour | undefined, p: Given, T: Given): readonly Working[] {
  const { density, compressibility, molarMass } = figures;
  const xv = vapour === undefined ? [] : [named('x_v', vapour.fraction, '', 'water-fraction')];
  const Ma = named('M_a', molarMassOfDryAir(), 'kg/mol', 'molar-mass-dry-air');
  const Mv = named('M_v', waterMolarMass, 'kg/mol', 'molar-mass-water');
  const M = named('M', molarMass, 'kg/mol', 'molar-mass');
  const Z = named('Z', compressibility, '', 'compressibility');
  const remark = 'air-compressibility';
  return [
    ...(xv.length === 0
      ? []
      : [
          {
            id: 'molar-mass',
            symbol: 'M',
            formula: 'M_a * (1 - x_v * (1 - M_v / M_a))',
            given: [Ma, ...xv, Mv],
            value: molarMass,
            unit: 'kg/mol',
            source: cipm,
          },
        ]),
    {
      id: 'compressibility',
      symbol: 'Z',
      given: [p, T, ...xv],
      value: compressibility,
      unit: '',
      source: cipmFactor,
      remark,
    },
    {
      id: 'density',
      symbol: 'ρ_1',
      formula: 'p_1 * M / (Z * R * T_1)',
      given: [p, M, Z, gasConstant, T],
      value: density,
      unit: 'kg/m3',
      source: cipm,
    },
  ];
}

/** Density of the mixture, and the compressibility factor that it means. */
function byMixture(
  { density, compressibility, molarMass }: AirFigures,
  p: Given,
  T: Given,
  rho: Given,
): readonly Working[] {
  const M = named('M', molarMass, 'kg/mol', 'molar-mass');
  return [
    {
      id: 'density',
      symbol: 'ρ_1',
      given: [p, T, M],
      value: density,
      unit: 'kg/m3',
      source: GERG,
      remark: 'gerg-density',
    },
    {
      id: 'compressibility',
      symbol: 'Z',
      formula: 'p_1 * M / (ρ_1 * R * T_1)',
      given: [p, M, rho, gasConstant, T],
      value: compressibility,
      unit: '',
      source: realGas,
    },
  ];
}

function baseWorking(atBase: BaseAir, base: State, vapour: Vapour | undefined): Working {
  const { density, compressibility, molarMass, basis, water } = atBase;
  const dry = basis === 'dry' && vapour !== undefined;
  const given = [
    named('p_b', base.pressure, 'Pa(a)', 'pressure-base'),
    named('M', molarMass, 'kg/mol', 'molar-mass'),
    named('Z_b', compressibility, '', 'compressibility-base'),
    gasConstant,
    named('T_b', base.temperature, 'K', 'temperature-base'),
  ];
  const whole = 'p_b * M / (Z_b * R * T_b)';
  return {
    id: 'baseDensity',
    symbol: 'ρ_b',
    formula: dry ? `${whole} / (1 - w)` : whole,
    given: dry ? [...given, named('w', water, '', 'water-mass-fraction')] : given,
    value: density,
    unit: 'kg/m3',
    source: baseSource(atBase),
    ...(vapour === undefined ? {} : { remark: `air-base-${basis}` }),
  };
}
