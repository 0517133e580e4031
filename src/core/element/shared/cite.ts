/** Sources of one document, named once per file: `iso('5.3.1', 'read')`. */
import type { Seen, Source } from '../../quantity/source.ts';

const trust: readonly Seen[] = ['read', 'derived', 'second-hand', 'practice', 'memory'];

/** A function that names a clause of `document`, for example `ISO 5167-2:2022`, and how it was seen. */
export const cite =
  (document: string) =>
  (clause: string, seen: Seen): Source => ({ clause: `${document}, ${clause}`, seen });

/** The less trusted of two sources; a figure made of both is no better than it. */
export const worse = (one: Source, other: Source): Source =>
  trust.indexOf(one.seen) >= trust.indexOf(other.seen) ? one : other;
