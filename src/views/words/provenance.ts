/** How a figure of a standard was seen, as a mark beside its clause and a note that explains the mark. */
import type { Finding } from '../../core/check/finding.ts';

export type Seen = Finding['source']['seen'];

const marks: Readonly<Record<Seen, '' | '°' | '†'>> = {
  read: '',
  derived: '',
  'second-hand': '°',
  memory: '°',
  practice: '†',
};

export const provenanceMark = (seen: Seen): '' | '°' | '†' => marks[seen];

const notes: Readonly<Record<'°' | '†', string>> = {
  '°': '° second-hand or from memory of the standard: check against your copy before purchase.',
  '†': '† custom of the trade, not a standard.',
};

/** The notes that the marks of these sources need, each once. */
export function provenanceNotes(seen: readonly Seen[]): readonly string[] {
  const used = new Set(seen.map(provenanceMark));
  return (['°', '†'] as const).filter((mark) => used.has(mark)).map((mark) => notes[mark]);
}
