/** A source as a clause with its mark. */
import type { Source } from '../../core/quantity/source.ts';
import { provenanceMark } from '../words/provenance.ts';
import type { Cited } from './model.ts';

export const cited = (source: Source): Cited => ({ ...source, mark: provenanceMark(source) });

/** The clause with its marks, which hold to its last word: after a unit, ° would else read as a degree. */
export const withMarks = (clause: string, marks: readonly string[]): string => {
  const shown = marks.filter((mark) => mark !== '').join('');
  return shown === '' ? clause : `${clause}\u202f${shown}`;
};
