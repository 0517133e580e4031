/** The dimensioned section on paper, mm: its frame, its scale, where dimension lines run. */
import type { DimensionRow, Shape } from '../present/model.ts';
import type { Draft, Measure, Reach, Section } from './contract.ts';
import type { Scale } from './path.ts';
import { draftOf } from './registry.ts';
import type { SectionLabels } from './words.ts';

/** Size of the drawing, type size, distance of dimension lines, length of an arrowhead, mm. */
export const paper = { width: 178, height: 62, type: 2.82, row: 5.2, head: 2.2, wide: 0.5, narrow: 0.25 };
const detailWidth = 54;
const captionHeight = 5;
const side = 5;
/** Steps of a scale 1 : n within a power of ten. */
const steps = [1, 1.5, 2, 2.5, 3, 4, 5, 6, 8];

/** The largest n : 1 of the steps that is not above a ratio of drawn to real size, as [drawn, real]. */
export function statedScale(ratio: number): readonly [number, number] {
  const powers = [-3, -2, -1, 0, 1, 2, 3].map((power) => 10 ** power);
  const reductions = powers.flatMap((power) => steps.map((step) => step * power)).sort((left, right) => left - right);
  const n = reductions.find((one) => 1 / one <= ratio * (1 + 1e-9));
  if (n === undefined) throw new Error(`statedScale: expected a ratio of at least 1 : 8000, got ${ratio}`);
  return n >= 1 ? [1, n] : statedEnlargement(ratio);
}

/** Enlargements n : 1. */
function statedEnlargement(ratio: number): readonly [number, number] {
  const enlargements = [100, 10, 1].flatMap((power) => [5, 2, 1].map((step) => step * power));
  return [enlargements.find((one) => one <= ratio * (1 + 1e-9)) ?? 1, 1];
}

export interface SheetLayout {
  readonly section: Section;
  readonly measures: readonly Measure[];
  readonly reach: Reach;
  readonly scale: Scale; // mm per m
  readonly stated: string; // '1 : 4'
  /** Heights of the dimension lines next to the metal, above and below. */
  readonly above: number;
  readonly below: number;
  readonly edgeDetail: boolean;
}

const rowsOf = (measures: readonly Measure[], sign: 1 | -1): number =>
  Math.max(0, ...measures.map((measure) => (measure.kind === 'length' ? sign * measure.row : 0)));

function fitted(shape: Shape, draft: Draft, across: number, rows: number) {
  const wanted = draft.sheetReach(shape);
  const width = paper.width - 2 * side - (draft.edgeDetail ? detailWidth + 4 : 0);
  const height = paper.height - captionHeight - 3 - rows * paper.row;
  const largest = Math.min(width / (wanted.to - wanted.from), height / across) / 1000;
  const [drawn, real] = statedScale(largest);
  const factor = (1000 * drawn) / real;
  const spare = width / factor - (wanted.to - wanted.from);
  const stretch = Math.min(spare / 2, 0.5 * shape.pipe);
  const reach = { from: wanted.from - stretch, to: wanted.to + stretch };
  const middle = side + width / 2;
  return { factor, stated: `${drawn} : ${real}`, reach, originX: middle - (factor * (reach.from + reach.to)) / 2 };
}

/** Layout of the dimensioned section at the largest stated scale that fits. */
export function sheetLayout(shape: Shape, rows: readonly DimensionRow[], labels: SectionLabels): SheetLayout {
  const draft = draftOf(shape.element);
  const printed = { pipe: labels.pipe, bore: labels.bore };
  const wanted = draft.sheetReach(shape);
  const { outside, below = outside } = draft.section(shape, rows, wanted);
  const across = outside + below;
  const trial = draft.measures(shape, rows, wanted, printed);
  const [up, down] = [rowsOf(trial, 1), rowsOf(trial, -1)];
  const { factor, stated, reach, originX } = fitted(shape, draft, across, up + down);
  const beyond = 3 / factor; // the ends are cut by break lines
  const section = draft.section(shape, rows, { from: reach.from - beyond, to: reach.to + beyond });
  const free = paper.height - captionHeight - (up + down) * paper.row - across * factor;
  const originY = free / 2 + up * paper.row + outside * factor;
  return {
    section,
    measures: draft.measures(shape, rows, reach, printed),
    reach,
    scale: { factor, originX, originY },
    stated,
    above: originY - outside * factor,
    below: originY + below * factor,
    edgeDetail: draft.edgeDetail,
  };
}
