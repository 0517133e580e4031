/** Where the figures of air come from, and their working. */
import type { Source } from '../../quantity/source.ts';
import { type Given, named, type Working } from '../../quantity/working.ts';
import type { FluidState } from '../contract.ts';
import { GERG } from '../gas/range.ts';
import { equationDensity, equationSound } from '../gas/working.ts';
import { R } from '../gerg/mixture.ts';
import type { State } from '../model.ts';
import {
  baseGasLine,
  densityLine,
  exponentLine,
  factor,
  factorLine,
  gasConstant,
  type Molar,
  molar,
  p1,
  rho1,
  sound,
  T1,
} from '../working.ts';
import { waterMolarMass } from './cipm.table.ts';
import { molarMassOfDryAir } from './cipm.ts';
import type { AirDensity } from './mixture.ts';
import type { Vapour } from './moisture.ts';
import { vapourWorking } from './moisture-working.ts';

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
const dryBasis: Source = { clause: 'base volume of the dry air alone: ρ_b / (1 - w_v)', seen: 'derived' };

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

const molarR = gasConstant(R);

/** The working of each figure, the water in the air first. */
export function airWorking(
  figures: AirFigures,
  by: AirDensity['by'],
  vapour: Vapour | undefined,
  viscosity: Source,
  atBase: BaseAir | undefined,
  base: State,
): readonly Working[] {
  const at = { p: p1(figures.pressure), T: T1(figures.temperature), M: molar(figures.molarMass), R: molarR };
  const rho = rho1(figures.density);
  const w = sound(figures.speedOfSound);
  return [
    ...(vapour === undefined ? [] : vapourWorking(vapour, at.p, at.T)),
    ...(by === 'cipm' ? byFormula(figures, vapour, at) : byMixture(figures, at, rho)),
    {
      id: 'viscosity',
      symbol: 'μ_1',
      given: [rho, at.T],
      value: figures.viscosity,
      unit: 'Pa.s',
      source: viscosity,
      remark: vapour === undefined ? 'viscosity-of-air' : 'viscosity-of-moist-air',
    },
    equationSound([at.p, at.T], w.value, GERG),
    exponentLine(w, rho, at.p, figures.isentropicExponent, exponent),
    ...(atBase === undefined ? [] : [baseWorking(atBase, base, vapour)]),
  ];
}

/** Density by the formula of metrology: molar mass, compressibility factor, density. */
function byFormula(figures: AirFigures, vapour: Vapour | undefined, at: Molar): readonly Working[] {
  const { density, compressibility } = figures;
  const xv = vapour === undefined ? [] : [named('x_v', vapour.fraction, '', 'water-fraction')];
  return [
    ...xv.map((fraction) => molarMassWorking(figures, fraction)),
    {
      id: 'compressibility',
      symbol: 'Z',
      given: [at.p, at.T, ...xv],
      value: compressibility,
      unit: '',
      source: cipmFactor,
      remark: 'air-compressibility',
    },
    densityLine(at, factor(compressibility), density, cipm),
  ];
}

const molarMassWorking = ({ molarMass }: AirFigures, xv: Given): Working => ({
  id: 'molar-mass',
  symbol: 'M',
  formula: 'M_a * (1 - x_v * (1 - M_v / M_a))',
  given: [
    named('M_a', molarMassOfDryAir(), 'kg/mol', 'molar-mass-dry-air'),
    xv,
    named('M_v', waterMolarMass, 'kg/mol', 'molar-mass-water'),
  ],
  value: molarMass,
  unit: 'kg/mol',
  source: cipm,
});

/** Density of the mixture, and the compressibility factor that it means. */
const byMixture = ({ density, compressibility }: AirFigures, at: Molar, rho: Given): readonly Working[] => [
  equationDensity(at, density, GERG),
  factorLine(at, rho, compressibility, realGas),
];

function baseWorking(atBase: BaseAir, base: State, vapour: Vapour | undefined): Working {
  const { density, compressibility, molarMass, basis, water } = atBase;
  const whole = baseGasLine(molar(molarMass), molarR, compressibility, base, density, baseSource(atBase));
  if (vapour === undefined) return whole;
  const remark = `air-base-${basis}`;
  if (basis === 'wet') return { ...whole, remark };
  const given = [...whole.given, named('w_v', water, '', 'water-mass-fraction')];
  return { ...whole, formula: `${whole.formula} / (1 - w_v)`, given, remark };
}
