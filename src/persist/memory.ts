/** The port in memory, for a browser that refuses its database. What it holds ends with the page. */
import type { KeptRecord, Port } from './port.ts';
import {
  entryOf,
  isSetAside,
  MOST_VERSIONS,
  newestFirst,
  readingOf,
  soundOnes,
  unnumbered,
  verdictOn,
} from './record.ts';

/** `cause` is the code of why nothing lasts; `now` the clock, ms since 1970. */
export function createMemory(cause: string, now: () => number = Date.now): Port {
  const projects = new Map<string, KeptRecord>();
  const versions = new Map<string, readonly KeptRecord[]>();
  const setAside = (stored: KeptRecord | undefined): void => {
    if (stored === undefined) return;
    const earlier = versions.get(stored.id) ?? [];
    if (isSetAside(stored, earlier[0], now())) versions.set(stored.id, [stored, ...earlier].slice(0, MOST_VERSIONS));
  };
  return {
    transient: cause,
    list: async () => newestFirst(await Promise.all([...projects].map(([id, stored]) => entryOf(stored, id)))),
    read: async (id) => readingOf(projects.get(id)),
    write: async (draft, expected, durability) => {
      const record = unnumbered(draft, durability, now());
      const stored = projects.get(draft.id);
      const verdict = verdictOn(stored, draft, expected);
      if (!verdict.ok) return verdict;
      setAside(stored);
      projects.set(draft.id, { ...record, revision: verdict.revision });
      return verdict;
    },
    leave: () => undefined, // nothing outlives the page
    versions: async (id) => soundOnes(versions.get(id) ?? []),
    remove: async (id) => {
      projects.delete(id);
      versions.delete(id);
    },
    close: () => undefined,
  };
}
