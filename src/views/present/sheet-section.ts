/** The words and figures on the dimensioned section of a sheet. */
import type { Solved } from '../../core/result/record.ts';
import { sectionWords } from '../words/sheet.ts';
import { figuresOf } from './answer.ts';
import type { Context } from './context.ts';
import type { PresentedSizing, Value } from './model.ts';

export interface SectionText {
  readonly caption: string;
  readonly title: string;
  readonly description: string;
  readonly flow: string;
  readonly scale: string;
  readonly edge: string;
  /** Diameters as measured, in the unit of the caption. */
  readonly pipe: string;
  readonly bore: string;
}

const usualTemperature = 293.15; // K; 20 degC, the default of the file format

export function sectionText(at: Context, result: Solved, sizing: PresentedSizing): SectionText {
  const { flow, scale, edge } = sectionWords;
  const unit = at.units.bore.print;
  /** As it is written where that is in the unit of the caption, else rounded. */
  const inUnit = (value: Value): string => (value.unit === unit ? value.number : at.value(value.si, 'bore').number);
  const pipe = at.given(at.meter.pipe?.bore, ['length'], result.pipeAsMeasured_m, 'bore');
  return {
    caption: sectionWords.caption(unit, temperatureOf(at)),
    title: sectionWords.title(sizing.element),
    description: sizing.answer.map(({ text }) => text).join(''),
    flow,
    scale,
    edge,
    pipe: inUnit(pipe),
    bore: inUnit(figuresOf(at, result).bore),
  };
}

/** Where the diameters were measured: 'at 20 °C', or each part apart. */
function temperatureOf(at: Context): string {
  const { pipe, element } = at.meter;
  const of = (metal: { material?: string; measuredAt?: string } | undefined): string =>
    metal?.material === undefined
      ? sectionWords.asMeasured
      : at.given(metal.measuredAt, ['temperature'], usualTemperature, 'temperature').text;
  const [first, second] = [of(pipe), of(element)];
  if (first !== second) return sectionWords.apartAt(first, second);
  return first === sectionWords.asMeasured ? first : sectionWords.bothAt(first);
}
