/** What both forms of the port agree on: the shape of a record, when it is sound, what is set aside of it. */
import { hasHash, hashOf } from './hash.ts';
import type { Draft, Durability, Entry, KeptRecord, Reading, Writing } from './port.ts';

export const MOST_VERSIONS = 10;
/** While work goes on without a save of its own, what is overwritten is set aside this often. */
const VERSION_INTERVAL = 10 * 60_000; // ms

export const isRecord = (stored: unknown): stored is KeptRecord => {
  if (typeof stored !== 'object' || stored === null) return false;
  const { id, title, text, hash, revision, formatVersion, savedAt } = stored as Record<string, unknown>;
  const words = [id, title, text, hash].every((part) => typeof part === 'string');
  return words && [revision, formatVersion, savedAt].every((part) => typeof part === 'number' && Number.isFinite(part));
};

export const isSound = async (stored: unknown): Promise<boolean> =>
  isRecord(stored) && (await hasHash(stored.text, stored.hash));

export async function readingOf(stored: unknown): Promise<Reading> {
  if (stored === undefined) return { state: 'absent' };
  if (isRecord(stored) && (await hasHash(stored.text, stored.hash))) return { state: 'sound', record: stored };
  const text = typeof stored === 'object' && stored !== null && 'text' in stored ? stored.text : stored;
  return { state: 'damaged', text: typeof text === 'string' ? text : (JSON.stringify(text) ?? '') };
}

/** The line of the list for a stored value, whatever is left of it. */
export async function entryOf(stored: unknown, id: string): Promise<Entry> {
  if (!isRecord(stored)) return { id, title: '', revision: 0, formatVersion: 0, savedAt: 0, sound: false };
  const { title, revision, formatVersion, savedAt } = stored;
  return { id, title, revision, formatVersion, savedAt, sound: await isSound(stored) };
}

export const newestFirst = (entries: readonly Entry[]): readonly Entry[] =>
  entries.toSorted((a, b) => b.savedAt - a.savedAt || b.revision - a.revision);

export async function soundOnes(stored: readonly unknown[]): Promise<readonly KeptRecord[]> {
  const sound = await Promise.all(stored.map(isSound));
  return stored.filter((one, index): one is KeptRecord => sound[index] === true && isRecord(one));
}

/** Everything of a record but its revision, which only the transaction knows. */
export const unnumbered = (draft: Draft, durability: Durability, savedAt: number): Omit<KeptRecord, 'revision'> => ({
  id: draft.id,
  title: draft.title,
  text: draft.text,
  formatVersion: draft.formatVersion,
  hash: hashOf(draft.text),
  savedAt,
  explicit: durability === 'strict',
});

/** Compare-and-set: whether `draft` may replace what is stored. A damaged record is replaced by nobody. */
export function verdictOn(stored: unknown, draft: Draft, expected: number): Writing {
  if (stored === undefined) return expected === 0 ? { ok: true, revision: 1 } : { ok: false, cause: 'gone' };
  if (!isRecord(stored)) return { ok: false, cause: 'conflict' };
  if (stored.formatVersion > draft.formatVersion) return { ok: false, cause: 'newer' };
  if (stored.revision !== expected) return { ok: false, cause: 'conflict' };
  return { ok: true, revision: expected + 1 };
}

/** Whether the record about to be overwritten is set aside; a clock put back counts as time gone by. */
export function isSetAside(stored: KeptRecord, latest: KeptRecord | undefined, now: number): boolean {
  return stored.explicit || latest === undefined || Math.abs(now - latest.savedAt) >= VERSION_INTERVAL;
}
