/**
 * Which compositions count as one pure gas with a reference correlation, and how far that correlation reaches.
 * Standard: none; the papers named in pure.table.ts, and IAPWS R12-08. Symbols: T in K, rho in mol/dm3.
 */
import { as } from '../../quantity/brand.ts';
import type { Source } from '../../quantity/source.ts';
import { components } from '../helmholtz/components.table.ts';
import { highestTemperature, viscosity as waterViscosity } from '../if97/viscosity.ts';
import { air, argon, nitrogen, oxygen } from './pure.table.ts';
import { type Correlation, carbonDioxide, ethane, hydrogen, propane, simpleFluid } from './reference.ts';

/** A correlation with its range and its expanded relative uncertainty for a gas (both from memory of the papers). */
export interface Reference {
  readonly eta: Correlation;
  readonly temperatures: readonly [lowest: number, highest: number];
  /** Highest molar density, mol/dm3: that of the liquid near the triple point. */
  readonly densest: number;
  readonly uncertainty: number;
  readonly source: Source;
}

/** A gas this pure follows its reference correlation (practice: commercial purity; the error is a thousandth). */
const PURE = 0.999;
/** Dry air: nitrogen, oxygen and argon as Lemmon and Jacobsen have them, each within this. */
const dryAir = { nitrogen: 0.7812, oxygen: 0.2096, argon: 0.0092 }; // mole fractions
const LIKE_AIR = 0.001;

const second = (clause: string): Source => ({ clause, seen: 'second-hand' });
const lemmon = second('Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21');
const steam: Correlation = (T, rho) =>
  1e6 * waterViscosity(as<'temperature'>(T), as<'density'>(rho * molarMassOfWater));
const molarMassOfWater = 18.015257; // g/mol, IAPWS R7-97(2012)

const row = (
  eta: Correlation,
  temperatures: Reference['temperatures'],
  densest: number,
  uncertainty: number,
  source: Source,
): Reference => ({ eta, temperatures, densest, uncertainty, source });

/** By component of GERG-2008; `air` is dry air. */
export const references = {
  nitrogen: row(simpleFluid(nitrogen), [64, 2000], 33, 0.02, lemmon),
  oxygen: row(simpleFluid(oxygen), [55, 2000], 43, 0.02, lemmon),
  argon: row(simpleFluid(argon), [84, 2000], 40, 0.02, lemmon),
  air: row(simpleFluid(air), [60, 2000], 34, 0.02, lemmon),
  'carbon-dioxide': row(
    carbonDioxide,
    [190, 2000],
    36,
    0.04,
    second('Laesecke and Muzny, J. Phys. Chem. Ref. Data 46 (2017) 013107'),
  ),
  hydrogen: row(hydrogen, [20, 1000], 42, 0.04, second('Muzny, Huber and Kazakov, J. Chem. Eng. Data 58 (2013) 969')),
  // 2.5 %: Friend, Ingham and Ely 1991, from memory
  ethane: row(ethane, [100, 625], 22, 0.025, second('Friend, Ingham and Ely, J. Phys. Chem. Ref. Data 20 (1991) 275')),
  propane: row(propane, [90, 650], 17, 0.03, second('Vogel and others, J. Phys. Chem. Ref. Data 27 (1998) 947')),
  water: row(steam, [273.15, highestTemperature], 56, 0.02, second('IAPWS R12-08, Eq. 10 to 12 with μ2 = 1')),
} satisfies Record<string, Reference>;

/** The reference correlation of a composition in the order of GERG-2008 at T and rho; undefined where none holds. */
export function referenceOf(fractions: readonly number[], T: number, rho: number): Reference | undefined {
  const name = isDryAir(fractions) ? 'air' : components.find((_, at) => (fractions[at] ?? 0) >= PURE)?.name;
  const found: Reference | undefined = (references as Readonly<Record<string, Reference>>)[name ?? ''];
  if (found === undefined) return undefined;
  const [lowest, highest] = found.temperatures;
  return T >= lowest && T <= highest && rho <= found.densest ? found : undefined;
}

function isDryAir(fractions: readonly number[]): boolean {
  const near = Object.entries(dryAir).map(([gas, x]) => {
    const at = components.findIndex(({ name }) => name === gas);
    return { x: fractions[at] ?? 0, away: Math.abs((fractions[at] ?? 0) - x) };
  });
  return near.every(({ away }) => away <= LIKE_AIR) && near.reduce((sum, { x }) => sum + x, 0) >= PURE;
}
