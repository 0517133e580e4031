/**
 * Averaging pitot, a bar across the pipe with ports that face the flow and ports that turn away from it.
 * Standard: ISO 5167-1:2022 for the form of the equation alone; the rest is the maker's sheet, clauses: geometry sheet,
 * discharge sheet, expansibility sheet, uncertainty sheet, limits sheet.
 * Symbols: clause 3 of the standard, SI.
 * Departs: none.
 *
 * q_m = K ε A √(2 Δp ρ₁): no bore and no velocity of approach factor. No general K exists; K and the area A that it
 * counts, that of the pipe or what the bar leaves clear, are the maker's.
 */
import type { Length } from '../quantity/kinds.ts';
import { fail, gather, type Outcome, ok } from '../quantity/outcome.ts';
import type { Source } from '../quantity/source.ts';
import { named, type Working } from '../quantity/working.ts';
import type { Dimension, Element, Geometry, Insertion, Limit, Primary, StraightLength } from './contract.ts';
import { dimensionsOf } from './shared/dimension.ts';

const sheet: Source = { clause: 'maker’s sheet, as entered', seen: 'read' };
const LEAST_COEFFICIENT = 0.01;
const MOST_COEFFICIENT = 10;
/** Up to here a x/κ stays below a third for every x that is searched and every κ of a gas, so that Δp ε² rises with Δp. */
const MOST_EXPANSION_NUMBER = 0.41;

type Area = 'pipe' | 'clear';
const areas: readonly Area[] = ['pipe', 'clear'];

/** What the maker's sheet says, SI; a figure that it does not give is absent. */
interface Sheet {
  readonly coefficient?: number; // K
  readonly coefficientUncertainty?: number;
  readonly expansion?: number; // a of ε = 1 - a Δp/(κ p₁)
  readonly reynoldsMin?: number;
  readonly reynoldsMax?: number;
  readonly velocityMax?: number;
  readonly straightBefore?: number; // pipe bores
  readonly straightAfter?: number;
  readonly loss?: number; // share of Δp
  readonly width?: number; // w, across the flow
  readonly area: Area;
}

/** The area that K counts where the bar is taken off: a strip of its width across the pipe. */
const clearArea = (D: number, w: number): number => (Math.PI / 4) * D ** 2 - w * D; // A = π/4 D² - w D

const clearAreaWorking = (D: number, w: number): Working => ({
  id: 'clear-area',
  symbol: 'A',
  formula: 'π / 4 * D^2 - w * D', // A = π/4 D² - w D
  given: [named('D', D, 'm', 'pipe-bore'), named('w', w, 'm', 'bar-width')],
  value: clearArea(D, w),
  unit: 'm2',
  source: { clause: 'area that the bar leaves clear', seen: 'derived' },
});

/** Problems of the sheet: a width that the area needs or that is too wide, Reynolds numbers that exclude each other. */
function section({ area, width, reynoldsMin, reynoldsMax }: Sheet, pipe: Length): Outcome<Geometry> {
  const crossed = reynoldsMin !== undefined && reynoldsMax !== undefined && reynoldsMin >= reynoldsMax;
  const limits = crossed
    ? fail('reynolds-order', 'element.reynoldsMax', { least: reynoldsMin, most: reynoldsMax })
    : ok(undefined);
  const geometry = geometryOf(area, width, pipe);
  return limits.ok && geometry.ok ? geometry : gather(limits, geometry);
}

function geometryOf(area: Area, width: number | undefined, pipe: Length): Outcome<Geometry> {
  const wide = width !== undefined && clearArea(pipe, width) <= 0;
  if (wide) return fail('bar-too-wide', 'element.width', { width, pipe });
  if (area === 'pipe') return ok({ pipe, bore: pipe, ratio: 0 });
  if (width === undefined) return fail('field-missing', 'element.width');
  const diameter = Math.sqrt(clearArea(pipe, width) / (Math.PI / 4)); // of a circle of the same area
  return ok({ pipe, bore: diameter as Length, ratio: 0 });
}

function insertionOf(data: Sheet): Insertion {
  const { area, width = 0, expansion } = data;
  return {
    section: (pipe) => section(data, pipe),
    ...(area === 'pipe' ? {} : { area: (pipe: Length) => clearAreaWorking(pipe, width) }),
    pipeSensitivity: (D) => (area === 'pipe' ? 2 : 1 + ((Math.PI / 4) * D ** 2) / clearArea(D, width)), // D/A dA/dD
    expansionStated: expansion !== undefined,
  };
}

const limitsOf = ({ reynoldsMin: min, reynoldsMax: max, velocityMax }: Sheet): readonly Limit[] => [
  ...(min === undefined && max === undefined
    ? []
    : [{ id: 'reynolds-pipe', ...bounds(min, max), source: sheet } as const]),
  ...(velocityMax === undefined ? [] : [{ id: 'pipe-velocity', max: velocityMax, source: sheet } as const]),
];

const bounds = (min: number | undefined, max: number | undefined) => ({
  ...(min === undefined ? {} : { min }),
  ...(max === undefined ? {} : { max }),
});

function straightOf({ straightBefore, straightAfter }: Sheet): readonly StraightLength[] {
  const row = (side: StraightLength['side'], fitting: string, full: number | undefined): readonly StraightLength[] =>
    full === undefined ? [] : [{ side, fitting, full, source: sheet }];
  return [...row('upstream', 'any', straightBefore), ...row('downstream', 'downstream', straightAfter)];
}

const dimensionsOfBar = ({ width }: Sheet): readonly Dimension[] =>
  width === undefined ? [] : [dimensionsOf(sheet).length('bar-width', 'w', { nominal: width })];

const coefficientWorking = (coefficient: number): Working => ({
  id: 'C',
  symbol: 'K',
  given: [],
  value: coefficient,
  unit: '',
  source: sheet,
});

const expansibilityWorking = (a: number | undefined, kappa: number, x: number): Working => ({
  id: 'epsilon',
  symbol: 'ε',
  ...(a === undefined ? { formula: '1' } : { formula: '1 - a * (1 - τ) / κ' }), // ε = 1 - a Δp/(κ p₁)
  given:
    a === undefined
      ? []
      : [
          named('a', a, '', 'expansion-number'),
          named('κ', kappa, '', 'isentropic-exponent'),
          named('τ', 1 - x, '', 'pressure-ratio'),
        ],
  value: 1 - ((a ?? 0) * x) / kappa,
  unit: '',
  source: sheet,
  ...(a === undefined ? { remark: 'expansion-number-missing' } : {}),
});

const lossWorking = (share: number, differential: number): Working => ({
  id: 'loss',
  symbol: 'Δϖ',
  formula: 'ξ * Δp',
  given: [named('ξ', share, '', 'loss-share'), named('Δp', differential, 'Pa', 'differential')],
  value: share * differential,
  unit: 'Pa',
  source: sheet,
});

/** K; a meter without one is read through its calibration alone. */
function coefficientOf({ coefficient }: Sheet): number {
  if (coefficient !== undefined) return coefficient;
  throw new RangeError('averaging pitot: expected a coefficient or a calibration, got undefined');
}

function primary(data: Sheet): Primary {
  const { coefficient, coefficientUncertainty: stated, expansion: a, loss, width = 0 } = data;
  return {
    kind: 'averaging-pitot',
    name: `averaging-pitot.${data.area}`,
    standard: 'maker’s sheet',
    ratioRange: { min: 0, max: 0 }, // nothing to search
    reynoldsFloor: () => 1, // K holds at any flow there is
    guess: coefficient ?? 1,
    insertion: insertionOf(data),
    discharge: () => () => coefficientOf(data),
    expansibility: (_, kappa) => (x) => 1 - ((a ?? 0) * x) / kappa, // ε = 1 - a Δp/(κ p₁)
    ...(loss === undefined ? {} : { lossShare: () => loss }),
    limits: () => limitsOf(data),
    coefficientUncertainty: () => (stated === undefined ? [] : [{ id: 'base', percent: 100 * stated, source: sheet }]),
    expansibilityUncertainty: () => undefined,
    straightLengths: () => straightOf(data),
    dimensions: () => dimensionsOfBar(data),
    tappings: () => ({ upstream: width / 2, downstream: width / 2 }),
    working: {
      coefficient: () => coefficientWorking(coefficientOf(data)),
      expansibility: (_, kappa, x) => expansibilityWorking(a, kappa, x),
      ...(loss === undefined ? {} : { loss: (_at, _c, _re, differential) => lossWorking(loss, differential) }),
    },
  };
}

/** The averaging pitot; its fields are the figures of the maker's sheet. */
export const averagingPitot: Element = {
  kind: 'averaging-pitot',
  bore: 'none',
  fields: [
    {
      name: 'coefficient',
      type: 'number',
      required: 'uncalibrated',
      least: LEAST_COEFFICIENT,
      most: MOST_COEFFICIENT,
    },
    { name: 'area', type: 'choice', choices: areas, required: false },
    { name: 'width', type: 'quantity', measure: 'length', required: false },
    { name: 'coefficientUncertainty', type: 'share', required: false },
    { name: 'expansion', type: 'number', required: false, least: 0, most: MOST_EXPANSION_NUMBER },
    { name: 'reynoldsMin', type: 'number', required: false, least: 1, most: 1e12 },
    { name: 'reynoldsMax', type: 'number', required: false, least: 1, most: 1e12 },
    { name: 'velocityMax', type: 'quantity', measure: 'velocity', required: false },
    { name: 'straightBefore', type: 'quantity', measure: 'bores', required: false },
    { name: 'straightAfter', type: 'quantity', measure: 'bores', required: false },
    { name: 'loss', type: 'share', required: false },
  ],
  primary: (fields) => primary({ area: 'pipe', ...fields }),
};
