/** The answer as one sentence, its figures left open. */
import type { DutyName, Unknown } from '../../core/document/project.ts';

export type Figure = 'bore' | 'differential' | 'flow' | 'coefficient';
export type Piece = string | { readonly figure: Figure };

const bore: Piece = { figure: 'bore' };
const differential: Piece = { figure: 'differential' };
const flow: Piece = { figure: 'flow' };
const coefficient: Piece = { figure: 'coefficient' };

/** `opening` is 'bore' or 'throat'; `article` fits the figure of the bore. */
export function answerPieces(find: Unknown, opening: string, article: string): readonly Piece[] {
  if (find === 'flow') return [`${article} `, bore, ` ${opening} at `, differential, ' passes ', flow, '.'];
  return [`${article} `, bore, ` ${opening} reads `, differential, ' at ', flow, '.'];
}

/** The same of an averaging pitot, which is known by its coefficient. */
export function barPieces(find: Unknown): readonly Piece[] {
  const bar: readonly Piece[] = ['An averaging pitot of K\u00a0', coefficient];
  if (find === 'flow') return [...bar, ' at ', differential, ' passes ', flow, '.'];
  return [...bar, ' reads ', differential, ' at ', flow, '.'];
}

/** 'A' or 'An' before a printed number: an 8, an 11, an 18, an 80; a 62.5, a 110. */
export const article = (number: string): 'A' | 'An' => (/^(8|1[18](?!\d))/.test(number) ? 'An' : 'A');

export const uncertaintyUnknown = 'uncertainty not stated';

/** `least` where something is left out of it. */
export const uncertaintyAt = (text: string, at: DutyName, least: boolean): string =>
  `${least ? 'at least ' : ''}±${text} at ${at} flow, 95\u00a0%`;
