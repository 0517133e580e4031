/**
 * ISA 1932 nozzle, corner tappings.
 * Standard: ISO 5167-3:2022, clauses: geometry 5.1.2, discharge 5.1.6.2, expansibility 5.1.6.3, uncertainty 5.1.7, limits 5.1.6.1.
 * Symbols: clause 3 of the standard, SI.
 * Departs: 6.2: tabled lengths and roughness are interpolated in β, because the tables leave it open.
 */
import type { Working } from '../quantity/working.ts';
import type { Condition, Dimension, Discharge, Element, Geometry, Limit, Part, Primary } from './contract.ts';
import { cite } from './shared/cite.ts';
import { dimensionsOf } from './shared/dimension.ts';
import { nozzleExpansibility, nozzleExpansibilityWorking } from './shared/expansibility.ts';
import { jetLossShare, jetLossWorking } from './shared/loss.ts';
import { nozzleRoughness } from './shared/roughness.ts';
import { straightLengths } from './shared/straight.ts';
import { nozzleLengths } from './shared/straight-nozzle.table.ts';

const iso = cite('ISO 5167-3:2022');
const iso2003 = cite('ISO 5167-3:2003');

/** C for any Re_D > 0; far below the limits it leaves every physical value. */
const discharge = ({ ratio: b }: Geometry): Discharge => {
  const limiting = 0.99 - 0.2262 * b ** 4.1; // Formula (5)
  const slope = 0.00175 * b ** 2 - 0.0033 * b ** 4.15; // Formula (5)
  return (reynolds) => limiting - slope * (1e6 / reynolds) ** 1.15; // Formula (5)
};

const coefficientWorking = (at: Geometry, reynolds: number): Working => ({
  id: 'C',
  symbol: 'C',
  formula: '0.99 - 0.2262 * β^4.1 - (0.00175 * β^2 - 0.0033 * β^4.15) * (1e6 / Re_D)^1.15', // Formula (5)
  given: [
    { symbol: 'β', value: at.ratio, unit: '', words: 'diameter-ratio' },
    { symbol: 'Re_D', value: reynolds, unit: '', words: 'reynolds-pipe' },
  ],
  value: discharge(at)(reynolds),
  unit: '',
  source: iso('5.1.6.2, Formula (5)', 'second-hand'),
});

const leastReynolds = (ratio: number): number => (ratio < 0.44 ? 7e4 : 2e4); // 5.1.6.1

const limits = ({ pipe, ratio }: Geometry): readonly Limit[] => [
  { id: 'pipe-bore', min: 0.05, max: 0.5, source: iso('5.1.6.1', 'second-hand') },
  { id: 'diameter-ratio', min: 0.3, max: 0.8, source: iso('5.1.6.1', 'second-hand') },
  { id: 'reynolds-pipe', min: leastReynolds(ratio), max: 1e7, source: iso('5.1.6.1', 'second-hand') },
  { id: 'pressure-ratio', min: 0.75, source: iso('5.1.6.3', 'second-hand') },
  nozzleRoughness(pipe, ratio),
];

const coefficientUncertainty = ({ ratio }: Geometry): readonly Part[] => [
  { id: 'base', percent: ratio <= 0.6 ? 0.8 : 2 * ratio - 0.4, source: iso2003('5.1.7.1', 'memory') }, // 5.1.7.1
];

const expansibilityUncertainty = (flow: Condition): Part => ({
  id: 'base',
  percent: flow.expands ? 2 * flow.expansion : 0, // 5.1.7.2
  source: iso2003('5.1.7.2', 'memory'),
});

/** The farthest downstream tapping of 5.1.5, from the upstream face. */
const farTapping = ({ pipe, ratio }: Geometry): number => (ratio <= 0.67 ? 0.15 : 0.2) * pipe;

/** Above beta = 2/3 the face is cut by the pipe wall and the profile is shorter: 5.1.2. */
const profileLength = ({ bore: d, ratio: b }: Geometry): number => {
  if (b <= 2 / 3) return 0.6041 * d; // 5.1.2.6
  return (0.4041 + Math.sqrt(0.75 / b - 0.25 / b ** 2 - 0.5225)) * d; // 5.1.2.6
};

const dimensions = (at: Geometry): readonly Dimension[] => {
  const { pipe: D, bore: d, ratio } = at;
  const profile = dimensionsOf(iso2003('5.1.2', 'memory'));
  const tap = dimensionsOf(iso2003('5.1.5', 'memory'));
  const play = ratio < 0.5 ? 0.1 : 0.03; // 5.1.2.3, tolerance of both radii
  const [R1, R2] = [0.2 * d, d / 3]; // 5.1.2.3
  return [
    profile.length('face-bore', 'd_f', { nominal: Math.min(1.5 * d, D) }), // 5.1.2.2
    profile.length('profile-radius-inlet', 'R_1', { min: (1 - play) * R1, nominal: R1, max: (1 + play) * R1 }),
    profile.length('profile-radius-throat', 'R_2', { min: (1 - play) * R2, nominal: R2, max: (1 + play) * R2 }),
    profile.length('profile-centre-inlet', 'z_1', { nominal: 0.2 * d }), // 5.1.2.3, behind the face; 0.75 d from the axis
    profile.length('profile-centre-throat', 'z_2', { nominal: 0.3041 * d }), // 5.1.2.4; 5/6 d from the axis
    profile.length('throat-length', 'l_t', { nominal: 0.3 * d }), // 5.1.2.5
    profile.length('profile-length', 'l', { nominal: profileLength(at) }),
    profile.length('recess-bore', 'c', { min: 1.06 * d }), // 5.1.2.5
    profile.length('recess-length', 'l_c', { max: 0.03 * d }), // 5.1.2.5
    profile.length('flange-thickness', 'H', { max: 0.1 * D }), // 5.1.3
    profile.length('throat-roughness', 'Ra', { max: 1e-4 * d }), // 5.1.2.9
    profile.ratio('bore-roundness', 'Δd/d', { max: 0.0005 }), // 5.1.2.5
    tap.length('tapping-downstream', 'l_2', { max: farTapping(at) }), // 5.1.5
  ];
};

const primary: Primary = {
  kind: 'isa-1932-nozzle',
  name: 'isa-1932-nozzle',
  standard: 'ISO 5167-3:2022',
  ratioRange: { min: 0.15, max: 0.85 },
  reynoldsFloor: () => 7e3, // a tenth of the higher limit for every ratio, so that a wider bore never passes less
  guess: 1, // ISO 5167-1:2003, Annex A
  discharge,
  expansibility: nozzleExpansibility,
  lossShare: (at, coefficient) => jetLossShare(at.ratio, coefficient),
  limits,
  coefficientUncertainty,
  expansibilityUncertainty: (_, flow) => expansibilityUncertainty(flow),
  straightLengths: (ratio, reynolds) => straightLengths(nozzleLengths, ratio, reynolds),
  dimensions,
  tappings: (at) => ({ upstream: 0, downstream: farTapping(at) }),
  recovery: 6, // 5.1.8, as for orifice plates
  working: {
    coefficient: coefficientWorking,
    expansibility: (ratio, kappa, x) => nozzleExpansibilityWorking(ratio, kappa, x, iso('5.1.6.3', 'second-hand')),
    loss: (at, coefficient, _, differential) =>
      jetLossWorking(at.ratio, coefficient, differential, iso2003('5.1.8', 'memory')),
  },
};

/** The ISA 1932 nozzle has no field of its own. */
export const isa1932Nozzle: Element = { kind: primary.kind, fields: [], primary: () => primary };
