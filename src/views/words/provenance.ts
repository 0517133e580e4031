/** How a figure of a standard was seen, as a mark beside its clause and a note that explains the mark. */
import type { Finding } from '../../core/check/finding.ts';

export type Source = Finding['source'];
export type Seen = Source['seen'];

const marks: Readonly<Record<Seen, '' | '°' | '†'>> = {
  read: '',
  derived: '',
  'second-hand': '°',
  memory: '°',
  practice: '†',
};

/** What the user stated is his own figure: no standard stands behind it and no note is due. */
const own = 'stated by the user';

export type Mark = '' | '°' | '†';

export const provenanceMark = ({ clause, seen }: Source): Mark => (clause.startsWith(own) ? '' : marks[seen]);

/** What a mark says. */
export const markMeaning: Readonly<Record<Exclude<Mark, ''>, string>> = {
  '°': 'second-hand or from memory of the source: check against your copy before purchase.',
  '†': 'custom of the trade, not a standard.',
};

/** The notes that the marks of these sources need, each once. */
export function provenanceNotes(sources: readonly Source[]): readonly string[] {
  const used = new Set(sources.map(provenanceMark));
  return (['°', '†'] as const).filter((mark) => used.has(mark)).map((mark) => `${mark}\u00a0${markMeaning[mark]}`);
}
