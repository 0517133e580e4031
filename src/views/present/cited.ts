/** A source as a clause with its mark. */
import type { Source } from '../../core/quantity/source.ts';
import { provenanceMark } from '../words/provenance.ts';
import type { Cited } from './model.ts';

export const cited = (source: Source): Cited => ({ ...source, mark: provenanceMark(source) });
