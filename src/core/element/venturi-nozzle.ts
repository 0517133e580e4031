/**
 * Venturi nozzle, ISA 1932 inlet with a divergent of at most 15 degrees.
 * Standard: ISO 5167-3:2022, clauses: geometry 5.4.2, discharge 5.4.4.2, expansibility 5.4.4.3, uncertainty 5.4.5, limits 5.4.4.1.
 * Symbols: clause 3 of the standard, SI.
 * Departs: 6.2: tabled lengths and roughness are interpolated in β, because the tables leave it open.
 */
import type { Working } from '../quantity/working.ts';
import type { Condition, Dimension, Discharge, Element, Geometry, Limit, Part, Primary } from './contract.ts';
import { cite } from './shared/cite.ts';
import { dimensionsOf } from './shared/dimension.ts';
import { nozzleExpansibility, nozzleExpansibilityWorking } from './shared/expansibility.ts';
import { venturiLossShare, venturiLossWorking } from './shared/loss.ts';
import { nozzleRoughness } from './shared/roughness.ts';
import { straightLengths } from './shared/straight.ts';
import { nozzleLengths } from './shared/straight-nozzle.table.ts';

const iso = cite('ISO 5167-3:2022');
const iso2003 = cite('ISO 5167-3:2003');
const leastReynolds = 1.5e5; // 5.4.4.1

/** C does not depend on the Reynolds number. */
const discharge = ({ ratio: b }: Geometry): Discharge => {
  const C = 0.9858 - 0.196 * b ** 4.5; // Formula (19)
  return () => C;
};

const coefficientWorking = (at: Geometry, reynolds: number): Working => ({
  id: 'C',
  symbol: 'C',
  formula: '0.9858 - 0.196 * β^4.5', // Formula (19)
  given: [{ symbol: 'β', value: at.ratio, unit: '', words: 'diameter-ratio' }],
  value: discharge(at)(reynolds),
  unit: '',
  source: iso('5.4.4.2, Formula (19)', 'second-hand'),
});

const limits = ({ pipe, ratio }: Geometry): readonly Limit[] => [
  { id: 'pipe-bore', min: 0.065, max: 0.5, source: iso('5.4.4.1', 'second-hand') }, // 5.4.4.1
  { id: 'element-bore', min: 0.05, source: iso('5.4.4.1', 'second-hand') },
  { id: 'diameter-ratio', min: 0.316, max: 0.775, source: iso('5.4.4.1', 'second-hand') }, // 5.4.4.1
  { id: 'reynolds-pipe', min: leastReynolds, max: 2e6, source: iso('5.4.4.1', 'second-hand') },
  { id: 'pressure-ratio', min: 0.75, source: iso('5.4.4.3', 'second-hand') },
  nozzleRoughness(pipe, ratio),
];

const coefficientUncertainty = ({ ratio }: Geometry): readonly Part[] => [
  { id: 'base', percent: 1.2 + 1.5 * ratio ** 4, source: iso2003('5.3.5.1', 'memory') }, // 2003, 5.3.5.1
];

const expansibilityUncertainty = ({ ratio }: Geometry, flow: Condition): Part => ({
  id: 'base',
  percent: flow.expands ? (4 + 100 * ratio ** 8) * flow.expansion : 0, // 2003, 5.3.5.2
  source: iso2003('5.3.5.2', 'memory'),
});

/** The throat tappings, where the two parts of the throat meet, from the upstream face: 2003, 5.3.2. */
const throatTapping = (d: number): number => 0.6041 * d; // 2003, 5.3.2 and 5.1.2.6

const dimensions = ({ pipe: D, bore: d, ratio }: Geometry): readonly Dimension[] => {
  const profile = dimensionsOf(iso2003('5.3.2', 'memory'));
  const tap = dimensionsOf(iso2003('5.3.3', 'memory'));
  const play = ratio < 0.5 ? 0.1 : 0.03; // 5.1.2.3, tolerance of both radii
  const [R1, R2] = [0.2 * d, d / 3]; // 5.1.2.3
  return [
    profile.length('face-bore', 'd_f', { nominal: Math.min(1.5 * d, D) }), // 5.1.2.2
    profile.length('profile-radius-inlet', 'R_1', { min: (1 - play) * R1, nominal: R1, max: (1 + play) * R1 }),
    profile.length('profile-radius-throat', 'R_2', { min: (1 - play) * R2, nominal: R2, max: (1 + play) * R2 }),
    profile.length('throat-length', 'l_t', { min: 0.7 * d, max: 0.75 * d }), // 5.3.2, 0.3 d and 0.4 d to 0.45 d
    profile.angle('divergent-angle', 'φ', { max: 15 }), // 2003, 5.3.6; the geometry allows 30 degrees, the loss does not
    profile.ratio('divergent-cut', 'x_L', { max: 0.35 }), // 5.3.2, share of its length it may be cut short by
    profile.length('throat-roughness', 'Ra', { max: 1e-4 * d }), // 5.1.2.9
    tap.length('tapping-throat', 'l_2', { nominal: throatTapping(d) }), // 5.3.3
    tap.length('tapping-hole', 'δ', { min: 0.002, max: Math.max(0.002, Math.min(0.04 * d, 0.01)) }), // 5.3.3
  ];
};

const primary: Primary = {
  kind: 'venturi-nozzle',
  name: 'venturi-nozzle',
  standard: 'ISO 5167-3:2022',
  ratioRange: { min: 0.15, max: 0.85 },
  reynoldsFloor: () => 0.1 * leastReynolds,
  guess: 1, // ISO 5167-1:2003, Annex A
  discharge,
  expansibility: nozzleExpansibility,
  lossShare: (at, _, reynolds) => venturiLossShare(at.ratio, at.pipe, reynolds),
  limits,
  coefficientUncertainty,
  expansibilityUncertainty,
  straightLengths: (ratio, reynolds) => straightLengths(nozzleLengths, ratio, reynolds),
  dimensions,
  tappings: (at) => ({ upstream: 0, downstream: throatTapping(at.bore) }),
  recovery: 8, // the end of the longest divergent of 7 degrees, rounded up
  working: {
    coefficient: coefficientWorking,
    expansibility: (ratio, kappa, x) => nozzleExpansibilityWorking(ratio, kappa, x, iso('5.4.4.3', 'second-hand')),
    loss: (at, _, reynolds, differential) =>
      venturiLossWorking(venturiLossShare(at.ratio, at.pipe, reynolds), differential),
  },
};

/** The Venturi nozzle has no field of its own. */
export const venturiNozzle: Element = { kind: primary.kind, fields: [], primary: () => primary };
