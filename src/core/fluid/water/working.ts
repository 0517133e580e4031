/** Where the figures of water and steam come from, and their working. */
import type { Source } from '../../quantity/source.ts';
import { named, type Working } from '../../quantity/working.ts';
import type { FigureRange, FluidState } from '../contract.ts';
import { bounds, type Region } from '../if97/place.ts';
import { R } from '../if97/properties.ts';
import { criticalTemperature } from '../if97/saturation.ts';
import { highestTemperature as hottestViscosity } from '../if97/viscosity.ts';
import type { State } from '../model.ts';
import { atBase, baseLine, exponentLine, p1, rho1, sound, T1 } from '../working.ts';

/** The figures of a state that have a source and a working. */
export type Figures = Pick<
  FluidState,
  'pressure' | 'temperature' | 'density' | 'viscosity' | 'vapourPressure' | 'baseDensity'
> &
  Readonly<Record<'isentropicExponent' | 'compressibility' | 'speedOfSound', number>>;

const equationOf = { 1: 'Eq. 7', 2: 'Eq. 15', 3: 'Eq. 28', 5: 'Eq. 32' } as const satisfies Record<Region, string>;
const relationsOf = { 1: 'Table 3', 2: 'Table 12', 3: 'Table 31', 5: 'Table 39' } as const satisfies Record<
  Region,
  string
>;

const read = (clause: string): Source => ({ clause, seen: 'second-hand' });
const densityBy = (region: Region) => read(`IAPWS R7-97(2012), region ${region}, ${equationOf[region]}`);
const relation = (region: Region) => read(`IAPWS R7-97(2012), region ${region}, ${relationsOf[region]}`);
const viscosityBy = (extrapolated: boolean) =>
  read(`IAPWS R12-08, Eq. 10 to 12 with μ2 = 1${extrapolated ? ', extrapolated above 1173.15 K' : ''}`);
const saturation = read('IAPWS R7-97(2012), region 4, Eq. 30');

/** The formulation of each figure that the state has. */
export function waterSources(
  region: Region,
  extrapolated: boolean,
  figures: Figures,
  base?: Source,
): FluidState['sources'] {
  return {
    density: densityBy(region),
    viscosity: viscosityBy(extrapolated),
    isentropicExponent: relation(region),
    ...(figures.vapourPressure === undefined ? {} : { vapourPressure: saturation }),
    ...(base === undefined ? {} : { baseDensity: base }),
  };
}

/** Largest uncertainties of each region and phase, from memory of the releases' figures. */
export function waterUncertainties(region: Region, expands: boolean): NonNullable<FluidState['uncertainties']> {
  const density = region === 3 ? 0.002 : expands ? 0.001 : 0.0002; // R7-97(2012), 11 and its figures
  const of = (share: number, clause: string) => ({ share, source: { clause, seen: 'memory' } }) as const;
  return {
    density: of(density, 'IAPWS R7-97(2012), estimates of uncertainty'),
    viscosity: of(expands ? 0.02 : 0.01, 'IAPWS R12-08, estimates of uncertainty'),
    speedOfSound: of(0.002, 'IAPWS R7-97(2012), estimates of uncertainty'), // up to 0.2 % in region 3
  };
}

/** Where the formulation holds: all its regions to 1073.15 K, the fifth beyond; the viscosity and the line apart. */
export function waterRanges(region: Region): NonNullable<FluidState['ranges']> {
  const { lowestTemperature: lowest, highestTemperature, highestPressure, highestPressureHot, hot } = bounds;
  const cool: FigureRange = { temperature: { min: lowest, max: hot }, pressure: { max: highestPressure } };
  const whole: FigureRange =
    region === 5 ? { temperature: { min: hot, max: highestTemperature }, pressure: { max: highestPressureHot } } : cool;
  return {
    density: whole,
    viscosity: { ...whole, temperature: { min: lowest, max: hottestViscosity } },
    isentropicExponent: whole,
    compressibility: whole,
    vapourPressure: { temperature: { min: lowest, max: criticalTemperature } },
    baseDensity: cool,
  };
}

/** The working of each figure. `heldBeyond`: the phase is held beyond the saturation line. A liquid has no use for the
 * exponent and the compressibility factor. */
export function waterWorking(
  region: Region,
  heldBeyond: boolean,
  extrapolated: boolean,
  liquid: boolean,
  figures: Figures,
  base: State,
): readonly Working[] {
  const working = [
    ...byRegion(region, heldBeyond, figures),
    viscosityWorking(extrapolated, figures),
    ...(liquid ? [] : ratios(region, figures)),
    vapourPressureWorking(figures),
    baseDensityWorking(figures, base),
  ];
  return working.filter((entry) => entry !== undefined);
}

/** What comes from the region's equation: too long for a formula. */
function byRegion(region: Region, heldBeyond: boolean, figures: Figures): readonly Working[] {
  const { density, speedOfSound } = figures;
  const given = [p1(figures.pressure), T1(figures.temperature)];
  const remark = `if97-region-${region}${heldBeyond ? '-beyond-saturation' : ''}`;
  return [
    { id: 'density', symbol: 'ρ_1', given, value: density, unit: 'kg/m3', source: densityBy(region), remark },
    { id: 'speedOfSound', symbol: 'w', given, value: speedOfSound, unit: 'm/s', source: relation(region), remark },
  ];
}

function viscosityWorking(extrapolated: boolean, figures: Figures): Working {
  const given = [rho1(figures.density), T1(figures.temperature)];
  const remark = extrapolated ? 'viscosity-extrapolated' : 'viscosity-by-release';
  const source = viscosityBy(extrapolated);
  return { id: 'viscosity', symbol: 'μ_1', given, value: figures.viscosity, unit: 'Pa.s', source, remark };
}

function ratios(region: Region, figures: Figures): readonly Working[] {
  const gas = named('R', R, 'J/(kg.K)', 'specific-gas-constant');
  const [p, T, rho] = [p1(figures.pressure), T1(figures.temperature), rho1(figures.density)];
  return [
    exponentLine(sound(figures.speedOfSound), rho, p, figures.isentropicExponent, relation(region)),
    {
      id: 'compressibility',
      symbol: 'Z',
      formula: 'p_1 / (ρ_1 * R * T_1)',
      given: [p, rho, gas, T],
      value: figures.compressibility,
      unit: '',
      source: read('IAPWS R7-97(2012), Eq. 1'),
    },
  ];
}

function vapourPressureWorking(figures: Figures): Working | undefined {
  const { vapourPressure: value } = figures;
  if (value === undefined) return undefined;
  const given = [T1(figures.temperature)];
  return {
    id: 'vapourPressure',
    symbol: 'p_v',
    given,
    value,
    unit: 'Pa(a)',
    source: saturation,
    remark: 'if97-region-4',
  };
}

function baseDensityWorking({ baseDensity: value }: Figures, base: State): Working | undefined {
  if (value === undefined) return undefined;
  return { ...baseLine(atBase(base), value, read('IAPWS R7-97(2012)')), remark: 'if97-at-base' };
}
