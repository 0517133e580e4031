/**
 * Orifice plate, square-edged with corner, flange or D and D/2 tappings.
 * Standard: ISO 5167-2:2022, clauses: geometry 5.1, discharge 5.3.2.1, expansibility 5.3.2.2, uncertainty 5.3.3, limits 5.3.1.
 * Symbols: clause 3 of the standard, SI.
 * Departs: 6.2: tabled lengths and roughness are interpolated in β, because the tables leave it open.
 */
import { inch } from '../quantity/constants.ts';
import type { Given, Working } from '../quantity/working.ts';
import type { Condition, Dimension, Discharge, Element, Geometry, Limit, Part, Primary } from './contract.ts';
import { cite } from './shared/cite.ts';
import { dimensionsOf, within } from './shared/dimension.ts';
import { exponentOf, orificeExpansibility, orificeExpansibilityWorking } from './shared/expansibility.ts';
import { jetLossShare, jetLossWorking } from './shared/loss.ts';
import { orificeRoughness } from './shared/roughness.ts';
import { straightLengths } from './shared/straight.ts';
import { orificeLengths } from './shared/straight-orifice.table.ts';

const iso = cite('ISO 5167-2:2022');
const iso2003 = cite('ISO 5167-2:2003');
const smallPipe = 0.07112; // m; below it the small-pipe term applies, Formula (4)

/** Constants of Formula (4), apart from beta and Re_D. */
const mega03 = 1e6 ** 0.3; // Formula (4)
const mega07 = 1e6 ** 0.7; // Formula (4)
const a08 = 19000 ** 0.8; // Formula (4)

type Tappings = 'corner' | 'flange' | 'D-D/2';
const choices: readonly Tappings[] = ['corner', 'flange', 'D-D/2'];

/** L1 and L'2, the distances of the tappings over D: 5.3.2.1. */
const distances: Record<Tappings, (D: number) => readonly [L1: number, L2: number]> = {
  corner: () => [0, 0],
  flange: (D) => [inch / D, inch / D],
  'D-D/2': () => [1, 0.47],
};

/** The terms of Formula (4) that one geometry settles; A = (19000 b/Re)^0.8 is left to the flow. */
const terms = (tappings: Tappings, at: Geometry) => {
  const [L1, L2] = distances[tappings](at.pipe);
  const b = at.ratio;
  const b2 = b * b; // products, since a power costs as much as all the rest
  const b4 = b2 * b2;
  const tenth = b ** 0.1; // b^0.7, b^0.8 and b^1.3 are products of it
  const tenth3 = tenth * tenth * tenth;
  const M2 = (2 * L2) / (1 - b); // M'2 of Formula (4)
  return {
    limiting: 0.5961 + 0.0261 * b2 - 0.216 * b4 * b4, // Formula (4), C at Re = infinity, corner tappings
    upstream: ((0.043 + 0.08 * Math.exp(-10 * L1) - 0.123 * Math.exp(-7 * L1)) * b4) / (1 - b4), // Formula (4)
    downstream: M2 === 0 ? 0 : -0.031 * (M2 - 0.8 * M2 ** 1.1) * b * tenth3, // Formula (4), b^1.3
    small: at.pipe < smallPipe ? 0.011 * (0.75 - b) * (2.8 - at.pipe / inch) : 0, // Formula (4), D < 71.12 mm
    turbulent: 0.000521 * mega07 * tenth3 * tenth3 * tenth, // Formula (4), of 0.000521 (1e6 b/Re)^0.7
    slope: b * b2 * Math.sqrt(b) * mega03, // Formula (4), of b^3.5 (1e6/Re)^0.3
    a: a08 * tenth3 * tenth3 * tenth * tenth, // Formula (4), of A = (19000 b/Re)^0.8
  };
};

/**
 * C of Reader-Harris/Gallagher (1998), Formula (4), for any Re_D > 0; with y = Re_D^-0.1 each of its Reynolds terms is a
 * whole power of y, so one power serves them all.
 */
const discharge = (tappings: Tappings, at: Geometry): Discharge => {
  const { limiting, upstream, downstream, small, turbulent, slope, a } = terms(tappings, at);
  const c0 = limiting + upstream + downstream + small;
  const c3 = 0.0188 * slope; // Formula (4)
  const c7 = turbulent; // Formula (4)
  const c8 = -0.11 * upstream * a; // Formula (4), factor 1 - 0.11 A of the upstream tapping term
  const c11 = 0.0063 * a * slope; // Formula (4), 0.0063 A b^3.5 (1e6/Re)^0.3
  return (reynolds) => {
    const y = Math.exp(-0.1 * Math.log(reynolds)); // Re_D^-0.1, at a third of the cost of a power
    const y3 = y * y * y;
    const y7 = y3 * y3 * y;
    return c0 + c3 * y3 + y7 * (c7 + y * (c8 + c11 * y3));
  };
};

const formula = (tappings: Tappings, D: number): string => {
  const core = '0.5961 + 0.0261 * β^2 - 0.216 * β^8 + 0.000521 * (1e6 * β / Re_D)^0.7'; // Formula (4)
  const reynolds = ' + (0.0188 + 0.0063 * A) * β^3.5 * (1e6 / Re_D)^0.3'; // Formula (4)
  const tapping = // zero with corner tappings
    ' + (0.043 + 0.08 * exp(-10 * L_1) - 0.123 * exp(-7 * L_1)) * (1 - 0.11 * A) * β^4 / (1 - β^4)' + // Formula (4)
    ' - 0.031 * (M_2 - 0.8 * M_2^1.1) * β^1.3'; // Formula (4)
  const small = ' + 0.011 * (0.75 - β) * (2.8 - D / 25.4)'; // Formula (4)
  return core + reynolds + (tappings === 'corner' ? '' : tapping) + (D < smallPipe ? small : '');
};

const coefficientWorking = (tappings: Tappings, at: Geometry, reynolds: number): Working => {
  const [L1, L2] = distances[tappings](at.pipe);
  const given: Given[] = [
    { symbol: 'β', value: at.ratio, unit: '', words: 'diameter-ratio' },
    { symbol: 'Re_D', value: reynolds, unit: '', words: 'reynolds-pipe' },
    { symbol: 'A', value: ((19000 * at.ratio) / reynolds) ** 0.8, unit: '', words: 'reynolds-term' }, // Formula (4)
  ];
  if (tappings !== 'corner') {
    given.push({ symbol: 'L_1', value: L1, unit: '', words: 'tapping-distance-upstream' });
    given.push({ symbol: 'M_2', value: (2 * L2) / (1 - at.ratio), unit: '', words: 'dam-height-downstream' });
  }
  if (at.pipe < smallPipe) given.push({ symbol: 'D', value: at.pipe * 1000, unit: 'mm', words: 'pipe-bore' });
  return {
    id: 'C',
    symbol: 'C',
    formula: formula(tappings, at.pipe),
    given,
    value: discharge(tappings, at)(reynolds),
    unit: '',
    source: iso('5.3.2.1, Formula (4)', 'second-hand'),
  };
};

/** Least pipe Reynolds number of 5.3.1. */
const leastReynolds = (tappings: Tappings, { ratio, pipe }: Geometry): number => {
  if (tappings === 'flange') return Math.max(5000, 170 * ratio ** 2 * pipe * 1000); // 5.3.1, D in mm
  return ratio <= 0.56 ? 5000 : 16000 * ratio ** 2; // 5.3.1
};

const limits = (tappings: Tappings, at: Geometry, reynolds: number): readonly Limit[] => [
  { id: 'pipe-bore', min: 0.05, max: 1, source: iso('5.3.1', 'read') },
  { id: 'element-bore', min: 0.0125, source: iso('5.3.1', 'second-hand') }, // 5.3.1
  { id: 'diameter-ratio', min: 0.1, max: 0.75, source: iso('5.3.1', 'second-hand') },
  { id: 'reynolds-pipe', min: leastReynolds(tappings, at), source: iso('5.3.1', 'second-hand') },
  { id: 'pressure-ratio', min: 0.75, source: iso('5.3.2.2', 'second-hand') },
  orificeRoughness(at.pipe, at.ratio, reynolds),
];

const basePercent = (b: number): number => {
  if (b < 0.2) return 0.7 - b; // 5.3.3.1
  return b <= 0.6 ? 0.5 : 1.667 * b - 0.5; // 5.3.3.1
};

/** The first two steps of the base value are from memory, the third was read. */
const coefficientUncertainty = ({ ratio, pipe }: Geometry, flow: Condition): readonly Part[] => {
  const read = iso2003('5.3.3.1', 'read');
  const base = { id: 'base', percent: basePercent(ratio), source: ratio > 0.6 ? read : iso2003('5.3.3.1', 'memory') };
  const small = Math.max(0, 0.9 * (0.75 - ratio) * (2.8 - pipe / inch)); // 5.3.3.1, D < 71.12 mm
  const low = ratio > 0.5 && flow.reynolds < 10000; // 5.3.3.1
  return [
    base,
    ...(pipe < smallPipe && small > 0 ? [{ id: 'small-pipe', percent: small, source: read }] : []),
    ...(low ? [{ id: 'low-reynolds', percent: 0.5, source: read }] : []),
  ];
};

const expansibilityUncertainty = (flow: Condition): Part => ({
  id: 'base',
  percent: flow.expands ? (3.5 * flow.expansion) / exponentOf(flow) : 0, // 5.3.3.2
  source: iso2003('5.3.3.2', 'memory'),
});

const plateDimensions = ({ pipe: D, bore: d, ratio }: Geometry): readonly Dimension[] => {
  const edge = dimensionsOf(iso2003('5.1.7', 'memory'));
  const plate = dimensionsOf(iso2003('5.1.3 to 5.1.6', 'memory'));
  const line = dimensionsOf(iso2003('6.4.1 and 6.5', 'memory'));
  const offset = 0.0025 / (0.1 + 2.3 * ratio ** 4); // 6.5, e_cl over D
  return [
    plate.length('plate-thickness-edge', 'e', { min: 0.005 * D, max: 0.02 * D }), // 5.1.5
    plate.length('plate-thickness', 'E', { min: 0.005 * D, max: D <= 0.064 ? 0.0032 : 0.05 * D }), // 5.1.5
    plate.length('plate-thickness-variation', 'ΔE', { max: D < 0.2 ? 0.0002 : 0.001 * D }), // 5.1.5
    plate.angle('bevel-angle', 'α', within(45, 15)), // 5.1.6
    plate.ratio('face-slope', 's', { max: 0.005 }), // 5.1.3
    plate.length('face-roughness', 'Ra', { max: 1e-4 * d }), // 5.1.3
    edge.length('edge-radius', 'r', { max: 0.0004 * d }), // 5.1.7
    edge.angle('edge-angle', 'G', within(90, 0.3)), // 5.1.7
    edge.ratio('bore-roundness', 'Δd/d', { max: 0.0005 }), // 5.1.8
    line.ratio('pipe-roundness', 'ΔD/D', { max: 0.003 }), // 6.4.1
    line.length('eccentricity-along', 'e_cl', { max: offset * D }), // 6.5, parallel to the tappings
    line.length('eccentricity-across', 'e_cn', { max: 2 * offset * D }), // 6.5
  ];
};

const cornerDimensions = ({ pipe: D, ratio }: Geometry): readonly Dimension[] => {
  const tap = dimensionsOf(iso2003('5.2.3', 'memory'));
  const [min, most] = ratio <= 0.65 ? [0.005 * D, 0.03 * D] : [0.01 * D, 0.02 * D]; // 5.2.3
  return [
    tap.length('tapping-width', 'a', { min, max: D < 0.1 ? Math.max(most, 0.002) : most }), // 5.2.3
    tap.length('tapping-width-service', 'a', { min: 0.001, max: 0.01 }), // 5.2.3, clean fluid
    tap.length('ring-length', 'c', { max: 0.5 * D }), // 5.2.3
    tap.length('ring-bore', 'b', { min: D, max: 1.04 * D }), // 5.2.3
  ];
};

const holeDimensions = (tappings: Tappings, { pipe: D, ratio }: Geometry): readonly Dimension[] => {
  if (tappings === 'corner') return [];
  const tap = dimensionsOf(iso2003('5.2.2', 'memory'));
  const fine = ratio > 0.6; // 5.2.2, closer tolerances above
  const inchBand = within(inch, fine && D < 0.15 ? 0.0005 : 0.001); // 5.2.2.3
  const flange = tappings === 'flange';
  const downstream = flange ? inchBand : within(0.5 * D, (fine ? 0.01 : 0.02) * D); // 5.2.2.2
  return [
    tap.length('tapping-upstream', 'l_1', flange ? inchBand : within(D, 0.1 * D)), // 5.2.2.2, 5.2.2.3
    tap.length(flange ? 'tapping-downstream-face' : 'tapping-downstream', flange ? "l'_2" : 'l_2', downstream),
    tap.length('tapping-hole', 'a', { max: Math.min(0.13 * D, 0.013) }), // 5.2.2.7
    tap.angle('tapping-axis', 'φ', within(90, 3)), // 5.2.2.4
  ];
};

/** From the upstream face; a flange tapping stands one inch behind the downstream face, the plate left out. */
const tappingDistances = (tappings: Tappings, { pipe: D }: Geometry) => {
  if (tappings === 'flange') return { upstream: inch, downstream: inch }; // 5.2.2.3
  return tappings === 'corner' ? { upstream: 0, downstream: 0 } : { upstream: D, downstream: 0.5 * D }; // 5.2.2.2
};

const primary = (tappings: Tappings): Primary => ({
  kind: 'orifice-plate',
  name: `orifice-plate.${tappings}`,
  standard: 'ISO 5167-2:2022',
  ratioRange: { min: 0.05, max: 0.85 },
  reynoldsFloor: (at) => 0.1 * leastReynolds(tappings, at),
  guess: 0.606, // ISO 5167-1:2003, Annex A
  discharge: (at) => discharge(tappings, at),
  expansibility: orificeExpansibility,
  lossShare: (at, coefficient) => jetLossShare(at.ratio, coefficient),
  limits: (at, reynolds) => limits(tappings, at, reynolds),
  coefficientUncertainty,
  expansibilityUncertainty: (_, flow) => expansibilityUncertainty(flow),
  straightLengths: (ratio, reynolds) => straightLengths(orificeLengths, ratio, reynolds),
  dimensions: (at) => [
    ...plateDimensions(at),
    ...(tappings === 'corner' ? cornerDimensions(at) : holeDimensions(tappings, at)),
  ],
  tappings: (at) => tappingDistances(tappings, at),
  recovery: 6, // 5.4.1
  working: {
    coefficient: (at, reynolds) => coefficientWorking(tappings, at, reynolds),
    expansibility: (ratio, kappa, x) =>
      orificeExpansibilityWorking(ratio, kappa, x, iso('5.3.2.2, Formula (5)', 'second-hand')),
    loss: (at, coefficient, _, differential) =>
      jetLossWorking(at.ratio, coefficient, differential, iso2003('5.4.1, Eq (7)', 'read')),
  },
});

const isTappings = (text: string | number | undefined): text is Tappings => choices.some((choice) => choice === text);

/** The orifice plate; its own field is the kind of tappings. */
export const orificePlate: Element = {
  kind: 'orifice-plate',
  fields: [{ name: 'tappings', type: 'choice', choices, required: true }],
  primary: (fields) => {
    const { tappings } = fields;
    if (!isTappings(tappings)) throw new RangeError(`orifice plate: expected tappings ${choices}, got ${tappings}`);
    return primary(tappings);
  },
};
