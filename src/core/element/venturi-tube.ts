/**
 * Classical Venturi tube, as-cast, machined or fabricated convergent.
 * Standard: ISO 5167-4:2003, clauses: geometry 5.2, discharge 5.5, expansibility 5.6, uncertainty 5.7, limits 5.5.
 * Symbols: clause 3 of the standard, SI.
 * Departs: Annex B: C is linear in ln Re between the points and held beyond, because solving needs one continuous value.
 */
import type { Source } from '../quantity/source.ts';
import type { Working } from '../quantity/working.ts';
import type { Condition, Dimension, Element, Geometry, Limit, Part, Primary, StraightLength } from './contract.ts';
import { cite } from './shared/cite.ts';
import { coefficientAt, curveWorking } from './shared/curve.ts';
import { type Bounds, dimensionsOf, within } from './shared/dimension.ts';
import { nozzleExpansibility, nozzleExpansibilityWorking } from './shared/expansibility.ts';
import { venturiLossShare, venturiLossWorking } from './shared/loss.ts';
import { downstreamFitting, straightLengths } from './shared/straight.ts';
import { venturiLengths } from './shared/straight-venturi.table.ts';

const iso = cite('ISO 5167-4:2003');

type Convergent = 'as-cast' | 'machined' | 'fabricated';
const choices: readonly Convergent[] = ['as-cast', 'machined', 'fabricated'];

/** A row of Annex B: from this Reynolds number up to the next row, C and its uncertainty in percent. */
interface Outside {
  readonly reynolds: number;
  readonly coefficient: number;
  readonly percent: number;
}

interface Range {
  readonly clause: string;
  readonly seen: Source['seen'];
  readonly pipe: readonly [min: number, max: number]; // m
  readonly ratio: readonly [min: number, max: number];
  readonly reynolds: readonly [min: number, max: number];
  readonly coefficient: number;
  readonly percent: number;
  /** Annex B below the range; empty where its list is in doubt, then C is held. */
  readonly below: readonly Outside[];
}

const ranges: Record<Convergent, Range> = {
  'as-cast': {
    clause: '5.5.2',
    seen: 'second-hand',
    pipe: [0.1, 0.8], // 5.5.2
    ratio: [0.3, 0.75], // 5.5.2
    reynolds: [2e5, 2e6], // 5.5.2
    coefficient: 0.984, // 5.5.2
    percent: 0.7, // 5.7.1
    below: [
      { reynolds: 4e4, coefficient: 0.957, percent: 2.5 }, // Annex B
      { reynolds: 6e4, coefficient: 0.966, percent: 2 }, // Annex B
      { reynolds: 1e5, coefficient: 0.976, percent: 1.5 }, // Annex B
      { reynolds: 1.5e5, coefficient: 0.982, percent: 1 }, // Annex B
    ],
  },
  machined: {
    clause: '5.5.3',
    seen: 'memory',
    pipe: [0.05, 0.25], // 5.5.3
    ratio: [0.4, 0.75], // 5.5.3
    reynolds: [2e5, 1e6], // 5.5.3
    coefficient: 0.995, // 5.5.3
    percent: 1, // 5.7.2
    below: [], // Annex B counts in a Reynolds number that could not be confirmed
  },
  fabricated: {
    clause: '5.5.4',
    seen: 'memory',
    pipe: [0.2, 1.2], // 5.5.4
    ratio: [0.4, 0.7], // 5.5.4
    reynolds: [2e5, 2e6], // 5.5.4
    coefficient: 0.985, // 5.5.4
    percent: 1.5, // 5.7.3
    below: [
      { reynolds: 4e4, coefficient: 0.96, percent: 3 }, // Annex B
      { reynolds: 6e4, coefficient: 0.97, percent: 2.5 }, // Annex B
      { reynolds: 1e5, coefficient: 0.98, percent: 2.5 }, // Annex B
    ],
  },
};

const annexB = iso('Annex B', 'second-hand');
const annexUncertainty = iso('Annex B', 'memory');

/** The points of C: Annex B, then the constant from the lower limit of the range upwards. */
const pointsOf = (range: Range) => [...range.below, { reynolds: range.reynolds[0], coefficient: range.coefficient }];

const isBelow = (range: Range, reynolds: number): boolean => reynolds < range.reynolds[0];
const isOutside = (range: Range, reynolds: number): boolean => isBelow(range, reynolds) || reynolds > range.reynolds[1];

const coefficientWorking = (convergent: Convergent, reynolds: number): Working => {
  const range = ranges[convergent];
  if (isBelow(range, reynolds) && range.below.length > 0) {
    return curveWorking(pointsOf(range), reynolds, {
      symbol: 'C',
      source: annexB,
      between: 'venturi-annex-b',
      held: 'venturi-annex-b',
    });
  }
  const doubt = convergent === 'machined' ? { remark: 'venturi-machined-doubt' } : {};
  return {
    id: 'C',
    symbol: 'C',
    given: [],
    value: range.coefficient,
    unit: '',
    source: iso(range.clause, 'second-hand'),
    ...(isOutside(range, reynolds) ? { remark: 'venturi-held' } : doubt),
  };
};

const limits = (range: Range, { pipe }: Geometry): readonly Limit[] => {
  const source = iso(range.clause, range.seen);
  return [
    { id: 'pipe-bore', min: range.pipe[0], max: range.pipe[1], source },
    { id: 'diameter-ratio', min: range.ratio[0], max: range.ratio[1], source },
    { id: 'reynolds-pipe', min: range.reynolds[0], max: range.reynolds[1], source },
    { id: 'pressure-ratio', min: 0.75, source: iso('5.6', 'second-hand') },
    { id: 'pipe-roughness', max: 3.2e-4 * pipe, source: iso('6.4.2', 'memory') }, // 6.4.2
  ];
};

/** Annex B gives the held machined value 3 % at both ends of its list; that covers every value of the list. */
const outsidePercent = (range: Range, reynolds: number): number => {
  if (range.below.length === 0) return 3; // Annex B
  const reached = range.below.filter((row) => row.reynolds <= reynolds);
  return (reached[reached.length - 1] ?? (range.below[0] as Outside)).percent;
};

const coefficientUncertainty = (range: Range, flow: Condition): readonly Part[] => {
  const listed = isBelow(range, flow.reynolds) || (isOutside(range, flow.reynolds) && range.below.length === 0);
  if (listed) return [{ id: 'annex-b', percent: outsidePercent(range, flow.reynolds), source: annexUncertainty }];
  return [{ id: 'base', percent: range.percent, source: iso('5.7', 'memory') }];
};

const expansibilityUncertainty = ({ ratio }: Geometry, flow: Condition): Part => ({
  id: 'base',
  percent: flow.expands ? (4 + 100 * ratio ** 8) * flow.expansion : 0, // 5.8
  source: iso('5.8', 'memory'),
});

/** A fitting four throat diameters beyond the throat tappings does no harm; the rest is the table. */
const lengths = (ratio: number, reynolds: number): readonly StraightLength[] => [
  ...straightLengths(venturiLengths, ratio, reynolds),
  {
    fitting: downstreamFitting,
    side: 'downstream',
    full: Math.ceil(2 * 4 * ratio - 1e-9) / 2, // 6.2, 4 d, rounded up to half a pipe bore
    source: iso('6.2', 'memory'),
    note: 'straight-from-throat-tapping',
  },
];

const convergentAngle = 21; // degrees, 5.2.3
const coneLength = (D: number, d: number, degrees: number): number =>
  (D - d) / (2 * Math.tan((degrees * Math.PI) / 360));

/** Curvature at the entrance, into and out of the throat: 5.2.6 to 5.2.8. */
const radii = (convergent: Convergent, D: number, d: number): readonly [Bounds, Bounds, Bounds] => {
  if (convergent === 'fabricated') return [{ nominal: 0 }, { nominal: 0 }, { nominal: 0 }]; // 5.2.8
  if (convergent === 'machined') return [{ max: 0.25 * D }, { max: 0.25 * d }, { max: 0.25 * d }]; // 5.2.7
  return [within(1.375 * D, 0.275 * D), within(3.625 * d, 0.125 * d), { min: 5 * d, max: 15 * d }]; // 5.2.6
};

/** From the upstream tappings to the start of the convergent: 5.4.3. */
const upstreamDistance = (convergent: Convergent, D: number): Bounds => {
  if (convergent !== 'as-cast') return within(0.5 * D, 0.05 * D); // 5.4.3
  return D <= 0.15 ? within(0.5 * D, 0.25 * D) : { min: 0.25 * D, nominal: 0.5 * D, max: 0.5 * D }; // 5.4.3
};

const dimensions = (convergent: Convergent, { pipe: D, bore: d }: Geometry): readonly Dimension[] => {
  const body = dimensionsOf(iso('5.2', 'memory'));
  const tap = dimensionsOf(iso('5.4', 'memory'));
  const [R1, R2, R3] = radii(convergent, D, d);
  const entrance = convergent === 'as-cast' ? Math.min(D, 0.25 * D + 0.25) : D; // 5.2.2
  const wall = convergent === 'fabricated' ? 5e-4 * D : 1e-4 * D; // 5.2.6 to 5.2.8
  const small = d < 0.0333; // 5.4.2
  const least = small ? 0.1 * d : 0.004; // 5.4.2
  return [
    body.length('entrance-length', 'l_e', { min: entrance }), // 5.2.2
    body.angle('convergent-angle', 'φ_1', within(convergentAngle, 1)), // 5.2.3
    body.length('convergent-length', 'l_c', { nominal: coneLength(D, d, convergentAngle) }), // 5.2.3
    body.length('throat-length', 'l_t', within(d, 0.03 * d)), // 5.2.4
    body.angle('divergent-angle', 'φ_2', { min: 7, max: 15 }), // 5.2.5
    body.length('divergent-length', 'l_d', { min: coneLength(D, d, 15), max: coneLength(D, d, 7) }), // 5.2.5
    body.ratio('divergent-cut', 'x_L', { max: 0.35 }), // 5.2.10, share of its length it may be cut short by
    body.length('radius-entrance', 'R_1', R1),
    body.length('radius-throat-inlet', 'R_2', R2),
    body.length('radius-throat-outlet', 'R_3', R3),
    body.length('throat-roughness', 'Ra_d', { max: 1e-4 * d }), // 5.2.6 to 5.2.8
    body.length('convergent-roughness', 'Ra_D', { max: wall }),
    body.ratio('bore-roundness', 'Δd/d', { max: 0.001 }), // 5.2.4
    body.ratio('pipe-roundness', 'ΔD/D', { max: 0.004 }), // 5.2.2
    tap.length('tapping-upstream', 'l_1', upstreamDistance(convergent, D)),
    tap.length('tapping-throat', 'l_2', within(0.5 * d, 0.02 * d)), // 5.4.3
    tap.length('tapping-hole', 'δ_D', { min: least, max: small ? 0.1 * D : Math.min(0.1 * D, 0.01) }), // 5.4.2
    tap.length('tapping-hole-throat', 'δ_d', { min: least, max: Math.min(0.13 * d, 0.01) }), // 5.4.2
  ];
};

const primary = (convergent: Convergent): Primary => {
  const range = ranges[convergent];
  const points = pointsOf(range);
  return {
    kind: 'venturi-tube',
    name: `venturi-tube.${convergent}`,
    standard: 'ISO 5167-4:2003',
    ratioRange: { min: 0.15, max: 0.85 },
    reynoldsFloor: () => 0.1 * range.reynolds[0],
    guess: 1, // ISO 5167-1:2003, Annex A
    discharge: () => (reynolds) => coefficientAt(points, reynolds),
    expansibility: nozzleExpansibility,
    lossShare: (at, _, reynolds) => venturiLossShare(at.ratio, at.pipe, reynolds),
    limits: (at) => limits(range, at),
    coefficientUncertainty: (_, flow) => coefficientUncertainty(range, flow),
    expansibilityUncertainty,
    straightLengths: lengths,
    dimensions: (at) => dimensions(convergent, at),
    /** From the start of the convergent. */
    tappings: ({ pipe: D, bore: d }) => ({
      upstream: 0.5 * D,
      downstream: coneLength(D, d, convergentAngle) + 0.5 * d,
    }),
    sections: ({ pipe: D, bore: d }) => [
      { station: 'convergent', position: 0, level: 'upstream' },
      { station: 'throat-inlet', position: coneLength(D, d, convergentAngle), level: 'throat' }, // 5.2.3
      { station: 'throat-outlet', position: coneLength(D, d, convergentAngle) + d, level: 'throat' }, // 5.2.4
    ],
    recovery: 9, // the end of the longest divergent of 7 degrees, rounded up
    working: {
      coefficient: (_, reynolds) => coefficientWorking(convergent, reynolds),
      expansibility: (ratio, kappa, x) => nozzleExpansibilityWorking(ratio, kappa, x, iso('5.6', 'second-hand')),
      loss: (at, _, reynolds, differential) =>
        venturiLossWorking(venturiLossShare(at.ratio, at.pipe, reynolds), differential),
    },
  };
};

const isConvergent = (text: string | number | undefined): text is Convergent => choices.some((one) => one === text);

/** The Venturi tube; its own field is how the convergent was made. */
export const venturiTube: Element = {
  kind: 'venturi-tube',
  fields: [{ name: 'convergent', type: 'choice', choices, required: true }],
  primary: (fields) => {
    const { convergent } = fields;
    if (!isConvergent(convergent))
      throw new RangeError(`Venturi tube: expected convergent ${choices}, got ${convergent}`);
    return primary(convergent);
  },
};
