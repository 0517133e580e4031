/** Sources of one document, named once per file: `iso('5.3.1', 'read')`. */
import type { Seen, Source } from '../../quantity/source.ts';

/** A function that names a clause of `document`, for example `ISO 5167-2:2022`, and how it was seen. */
export const cite =
  (document: string) =>
  (clause: string, seen: Seen): Source => ({ clause: `${document}, ${clause}`, seen });
