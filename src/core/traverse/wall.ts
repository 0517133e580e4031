/** Points too near to the wall: how near a probe may come, and what becomes of a point that is nearer. */
import type { TraverseInput } from '../input/traverse.ts';
import { hydraulicDiameter } from '../input/traverse-section.ts';
import type { Length } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';
import type { Position } from './layout.ts';

/** A duct larger than this keeps the larger distance. */
const LARGE = 0.61; // m, 40 CFR 60 App. A, Method 1, 11.3.2
const EPA = { large: 0.025, small: 0.013 }; // m, 40 CFR 60 App. A, Method 1, 11.3.2
const METHOD_1: Source = { clause: '40 CFR 60 App. A, Method 1, 11.3.2', seen: 'second-hand' };
const HEAD: Source = { clause: 'ISO 3966, one head diameter from the wall', seen: 'memory' };

/**
 * The least distance of a point from the wall: the diameter of the head; with equal areas also the distance of Method 1.
 * Undefined where the rule sets none and the head is not known.
 */
export function leastDistance({
  rule,
  section,
  probe,
}: TraverseInput): { readonly least: Length; readonly source: Source } | undefined {
  const head = probe.head ?? 0;
  const epa = hydraulicDiameter(section) > LARGE ? EPA.large : EPA.small;
  if (rule === 'equal-area' && epa >= head) return { least: epa as Length, source: METHOD_1 };
  return head > 0 ? { least: head as Length, source: HEAD } : undefined;
}

/**
 * The points of a line by the wall rule. `leave` leaves them; `move` puts each point that is nearer than the least share
 * of the line at that share, where several may come to stand, each read for itself; `merge` makes one of those, which
 * counts for all of them.
 */
export function distanced(
  points: readonly Position[],
  least: number,
  rule: TraverseInput['wallRule'],
): readonly (Position & { readonly moved: boolean })[] {
  const fits = least <= 0.5; // beyond it no place is far enough from both walls
  const moved = points.map(({ at, weight }) => {
    const place = rule === 'leave' || !fits ? at : Math.min(Math.max(at, least), 1 - least);
    return { at: place, weight, moved: place !== at };
  });
  if (rule !== 'merge') return moved;
  const kept: (Position & { readonly moved: boolean })[] = [];
  for (const point of moved) {
    const before = kept.at(-1);
    const together = before !== undefined && before.at === point.at;
    if (together) kept.splice(-1, 1, { at: point.at, weight: before.weight + point.weight, moved: true });
    else kept.push(point);
  }
  return kept;
}
