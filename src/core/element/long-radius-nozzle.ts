/**
 * Long-radius nozzle, high ratio (from β = 0.25) or low ratio profile.
 * Standard: ISO 5167-3:2022, clauses: geometry 5.2.2, discharge 5.2.6.2, expansibility 5.2.6.3, uncertainty 5.2.7, limits 5.2.6.1.
 * Symbols: clause 3 of the standard, SI.
 * Departs: 6.2: tabled lengths are interpolated in β, because the table leaves it open.
 */
import type { Working } from '../quantity/working.ts';
import type { Condition, Dimension, Discharge, Element, Geometry, Limit, Part, Primary } from './contract.ts';
import { cite } from './shared/cite.ts';
import { dimensionsOf, within } from './shared/dimension.ts';
import { nozzleExpansibility, nozzleExpansibilityWorking } from './shared/expansibility.ts';
import { jetLossShare, jetLossWorking } from './shared/loss.ts';
import { straightLengths } from './shared/straight.ts';
import { nozzleLengths } from './shared/straight-nozzle.table.ts';

const iso = cite('ISO 5167-3:2022');
const iso2003 = cite('ISO 5167-3:2003');
const leastReynolds = 1e4; // 5.2.6.1

/** C for any Re_D > 0. */
const discharge =
  ({ ratio: b }: Geometry): Discharge =>
  (reynolds) =>
    0.9965 - 0.00653 * Math.sqrt((1e6 * b) / reynolds); // Formula (10)

const coefficientWorking = (at: Geometry, reynolds: number): Working => ({
  id: 'C',
  symbol: 'C',
  formula: '0.9965 - 0.00653 * sqrt(1e6 * β / Re_D)', // Formula (10)
  given: [
    { symbol: 'β', value: at.ratio, unit: '', words: 'diameter-ratio' },
    { symbol: 'Re_D', value: reynolds, unit: '', words: 'reynolds-pipe' },
  ],
  value: discharge(at)(reynolds),
  unit: '',
  source: iso('5.2.6.2, Formula (10)', 'second-hand'),
});

const limits = ({ pipe }: Geometry): readonly Limit[] => [
  { id: 'pipe-bore', min: 0.05, max: 0.63, source: iso('5.2.6.1', 'second-hand') },
  { id: 'diameter-ratio', min: 0.2, max: 0.8, source: iso('5.2.6.1', 'second-hand') },
  { id: 'reynolds-pipe', min: leastReynolds, max: 1e7, source: iso('5.2.6.1', 'second-hand') },
  { id: 'pressure-ratio', min: 0.75, source: iso('5.2.6.3', 'second-hand') },
  { id: 'pipe-roughness', max: 3.2e-4 * pipe, source: iso2003('5.2.6.1', 'memory') }, // 5.2.6.1
];

const coefficientUncertainty = (): readonly Part[] => [
  { id: 'base', percent: 2, source: iso2003('5.2.7.1', 'memory') }, // 5.2.7.1
];

const expansibilityUncertainty = (flow: Condition): Part => ({
  id: 'base',
  percent: flow.expands ? 2 * flow.expansion : 0, // 5.2.7.2
  source: iso2003('5.2.7.2', 'memory'),
});

/** Between 0.25 and 0.5 the standard allows both profiles; the high ratio is drawn there. */
const isHigh = (ratio: number): boolean => ratio >= 0.25; // 5.2.1

/** The downstream tapping, from the inlet face: at half a bore, or at 1.6 d where that is less (low ratio): 5.2.5. */
const downstreamTapping = ({ pipe: D, bore: d, ratio }: Geometry): number =>
  isHigh(ratio) || ratio >= 0.3188 ? 0.5 * D : 1.6 * d; // 5.2.5

const dimensions = (at: Geometry): readonly Dimension[] => {
  const { pipe: D, bore: d, ratio } = at;
  const high = isHigh(ratio);
  const profile = dimensionsOf(iso2003(high ? '5.2.2' : '5.2.3', 'memory'));
  const tap = dimensionsOf(iso2003('5.2.5', 'memory'));
  const axial = high ? 0.5 * D : d; // 5.2.2, 5.2.3
  const radial = high ? 0.5 * (D - d) : (2 * d) / 3; // 5.2.2, 5.2.3
  const l2 = downstreamTapping(at);
  const downstream = high ? within(l2, 0.01 * D) : { min: l2 - 0.02 * D, nominal: l2, max: l2 }; // 5.2.5
  return [
    profile.length('ellipse-axial', 'a', { nominal: axial }), // 5.2.2, 5.2.3
    profile.length('ellipse-radial', 'b', { nominal: radial }), // 5.2.2, 5.2.3
    profile.length('throat-length', 'l_t', { nominal: 0.6 * d }), // 5.2.2
    profile.length('profile-length', 'l', { nominal: axial + 0.6 * d }),
    profile.length('throat-clearance', 's', { min: 0.003 }), // 5.2.2, outside of the throat to the pipe wall
    profile.length('flange-thickness', 'H', { min: 0.003, max: 0.15 * D }), // 5.2.2
    profile.length('throat-wall', 'F', { min: D <= 0.065 ? 0.002 : 0.003, max: 0.013 }), // 5.2.2
    profile.length('throat-roughness', 'Ra', { max: 1e-4 * d }), // 5.2.2
    profile.ratio('bore-roundness', 'Δd/d', { max: 0.0005 }), // 5.2.2
    tap.length('tapping-upstream', 'l_1', { min: 0.9 * D, nominal: D, max: 1.2 * D }), // 5.2.5
    tap.length('tapping-downstream', 'l_2', downstream),
  ];
};

const primary: Primary = {
  kind: 'long-radius-nozzle',
  name: 'long-radius-nozzle',
  standard: 'ISO 5167-3:2022',
  ratioRange: { min: 0.1, max: 0.85 },
  reynoldsFloor: () => 0.1 * leastReynolds,
  guess: 1, // ISO 5167-1:2003, Annex A
  discharge,
  expansibility: nozzleExpansibility,
  lossShare: (at, coefficient) => jetLossShare(at.ratio, coefficient),
  limits,
  coefficientUncertainty,
  expansibilityUncertainty: (_, flow) => expansibilityUncertainty(flow),
  straightLengths: (ratio, reynolds) => straightLengths(nozzleLengths, ratio, reynolds),
  dimensions,
  tappings: (at) => ({ upstream: at.pipe, downstream: downstreamTapping(at) }),
  recovery: 6, // 5.2.8, as for orifice plates
  working: {
    coefficient: coefficientWorking,
    expansibility: (ratio, kappa, x) => nozzleExpansibilityWorking(ratio, kappa, x, iso('5.2.6.3', 'second-hand')),
    loss: (at, coefficient, _, differential) =>
      jetLossWorking(at.ratio, coefficient, differential, iso2003('5.2.8', 'memory')),
  },
};

/** The long-radius nozzle has no field of its own: its ratio settles the profile. */
export const longRadiusNozzle: Element = { kind: primary.kind, fields: [], primary: () => primary };
