/** The answer: one sentence, the line below it, and the figure that was found. */
import type { Unknown } from '../../core/document/project.ts';
import type { Solved } from '../../core/result/record.ts';
import { answerPieces, article, type Figure, uncertaintyAt } from '../words/answers.ts';
import { openingWord, variantWords } from '../words/elements.ts';
import { foundFrom } from '../words/verdicts.ts';
import { type Context, maximumOf } from './context.ts';
import type { PresentedSizing, Segment, Value } from './model.ts';

type Figures = Readonly<Record<Figure, Value>>;

/** Bore as measured, differential and flow of the maximum: what the user set as he wrote it, the found one rounded. */
export function figuresOf(at: Context, result: Solved): Figures {
  const { meter, value } = at;
  const maximum = maximumOf(result);
  const found = {
    bore: value(result.boreAsMeasured_m, 'bore'),
    differential: value(maximum.differential_Pa, 'differential'),
    flow: at.flow(maximum),
  };
  const written = {
    bore: at.given(meter.element?.bore, ['length'], result.boreAsMeasured_m, 'bore'),
    differential: at.given(meter.differential, ['pressure difference'], maximum.differential_Pa, 'differential'),
    flow: at.givenFlow(meter.duty?.maximum, maximum),
  };
  return { ...written, [result.find]: found[result.find] };
}

export function answerOf(at: Context, result: Solved): readonly Segment[] {
  const figures = figuresOf(at, result);
  const pieces = answerPieces(result.find, openingWord(result.element), article(figures.bore.number));
  return pieces.map((piece) => {
    if (typeof piece === 'string') return { text: piece, role: 'words' };
    return { text: figures[piece.figure].text, role: piece.figure === result.find ? 'found' : 'given' };
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
    uncertaintyAt(at.value(expanded_percent, 'uncertainty').text, name, open.length > 0),
  ];
  return parts.filter((part) => part !== undefined && part !== '').join(' · ');
}

export function foundOf(at: Context, result: Solved): PresentedSizing['found'] {
  const find: Unknown = result.find;
  return { value: figuresOf(at, result)[find], from: foundFrom[find] };
}
