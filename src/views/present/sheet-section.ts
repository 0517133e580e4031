/** The words and figures on the dimensioned section of a sheet. */
import type { Solved } from '../../core/result/record.ts';
import { sectionWords } from '../words/sheet.ts';
import { figuresOf } from './answer.ts';
import type { Context } from './context.ts';
import type { DimensionRow, PresentedSizing, Value } from './model.ts';

export interface SectionText {
  readonly caption: string;
  readonly title: string;
  readonly description: string;
  readonly flow: string;
  readonly scale: string;
  readonly edge: string;
  /** Diameters as measured, in the unit of the caption. */
  readonly pipe: string;
  /** Empty where the element has no bore. */
  readonly bore: string;
}

/** The rows of the element that settle a dimension of the standard. */
const settled: readonly string[] = ['plate-thickness', 'plate-thickness-edge'];

export function sectionText(at: Context, result: Solved, sizing: PresentedSizing): SectionText {
  const { flow, scale, edge } = sectionWords;
  const unit = at.units.bore.print;
  /** As it is written where that is in the unit of the caption, else rounded. */
  const inUnit = (value: Value): string => (value.unit === unit ? value.number : at.value(value.si, 'bore').number);
  const { bore } = figuresOf(at, result);
  const pipe = at.given(at.meter.pipe?.bore, ['length'], result.pipeAsMeasured_m, 'bore');
  return {
    caption: sectionWords.caption(unit, measuredText(sizing)),
    title: sectionWords.title(sizing.element),
    description: sizing.answer.map(({ text }) => text).join(''),
    flow,
    scale: result.bore_m === undefined ? sectionWords.scaleOfPipe : scale,
    edge,
    pipe: inUnit(pipe),
    bore: bore === undefined ? '' : inUnit(bore),
  };
}

/** The dimensions as they are drawn: what the user has settled instead of the range that the standard leaves. */
export function drawnDimensions(at: Context, { dimensions, metal }: PresentedSizing): readonly DimensionRow[] {
  const unit = at.units.bore;
  return dimensions.map((dimension) => {
    const own = settled.includes(dimension.id) ? metal.find(({ id }) => id === dimension.id)?.value : undefined;
    if (own === undefined) return dimension;
    return { ...dimension, text: own.unit === unit.print ? own.text : at.value(own.si, 'bore').text, nominal: own.si };
  });
}

/** How the diameters were measured, once where pipe and element agree. */
function measuredText({ pipe, metal }: PresentedSizing): string {
  const [first = '', second = ''] = [pipe, metal].map((rows) => rows.find(({ note }) => note !== undefined)?.note);
  if (second === '') return sectionWords.pipeAlone(first);
  return first === second ? sectionWords.both(first) : sectionWords.apart(first, second);
}
