/** The answer: one sentence, the line below it, and the figure that was found. */
import type { Unknown } from '../../core/document/project.ts';
import type { PointRecord, Solved } from '../../core/result/record.ts';
import { answerPieces, article, barPieces, type Figure, uncertaintyAt, uncertaintyUnknown } from '../words/answers.ts';
import { openingWord, variantWords } from '../words/elements.ts';
import { foundFrom, foundFromBar } from '../words/verdicts.ts';
import { type Context, maximumOf } from './context.ts';
import type { PresentedSizing, Segment, Value } from './model.ts';

/** The bore is absent where the element has none. */
type Figures = Readonly<Record<Exclude<Figure, 'bore'>, Value>> & { readonly bore?: Value };

/** Bore as measured, differential, flow and coefficient of the maximum: what the user set as he wrote it, the found one rounded. */
export function figuresOf(at: Context, result: Solved): Figures {
  const { meter, value } = at;
  const maximum = maximumOf(result);
  const bore = result.boreAsMeasured_m;
  const found = {
    ...(bore === undefined ? {} : { bore: value(bore, 'bore') }),
    differential: value(maximum.differential_Pa, 'differential'),
    flow: at.flow(maximum),
  };
  const written = {
    ...(bore === undefined ? {} : { bore: at.given(meter.element?.bore, ['length'], bore, 'bore') }),
    differential: at.given(meter.differential, ['pressure difference'], maximum.differential_Pa, 'differential'),
    flow: at.givenFlow(meter.duty?.maximum, maximum),
    coefficient: coefficientOf(at, maximum),
  };
  return { ...written, [result.find]: found[result.find] };
}

/** The coefficient as it was entered, where it is what the meter is computed with; else as it was found. */
export function coefficientOf(at: Context, point: PointRecord): Value {
  const written = at.number(at.meter.element?.coefficient);
  return written?.si === point.C ? written : at.value(point.C, 'coefficient');
}

export function answerOf(at: Context, result: Solved): readonly Segment[] {
  const figures = figuresOf(at, result);
  const { bore } = figures;
  const pieces =
    bore === undefined
      ? barPieces(result.find)
      : answerPieces(result.find, openingWord(result.element), article(bore.number));
  return pieces.map((piece) => {
    if (typeof piece === 'string') return { text: piece, role: 'words' };
    return { text: figures[piece.figure]?.text ?? '', role: piece.figure === result.find ? 'found' : 'given' };
  });
}

/** Tag, variant, standard, and the uncertainty of the flow that is metered most. */
export function underOf(at: Context, result: Solved): string {
  const name = result.points.normal === undefined ? 'maximum' : 'normal';
  const { expanded_percent, open } = (result.points.normal ?? maximumOf(result)).uncertainty;
  const parts = [
    result.tag,
    variantWords(result.element),
    result.standard,
    expanded_percent === undefined
      ? uncertaintyUnknown
      : uncertaintyAt(at.value(expanded_percent, 'uncertainty').text, name, open.length > 0),
  ];
  return parts.filter((part) => part !== undefined && part !== '').join(' · ');
}

export function foundOf(at: Context, result: Solved): PresentedSizing['found'] {
  const find: Unknown = result.find;
  const value = figuresOf(at, result)[find];
  if (value === undefined) throw new Error(`expected the ${find} of ${result.tag}, got none`);
  return { value, from: (result.bore_m === undefined ? foundFromBar : foundFrom)[find] };
}
