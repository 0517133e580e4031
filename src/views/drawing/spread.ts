/** Labels in one line, kept apart: each near its place, none over another, none outside. */
export interface Placed {
  readonly text: string;
  readonly x: number; // middle of the text
}

const glyph = 0.56; // mean width of a character, in sizes of the type
const gap = 14;

/** Estimated width of a text at a size of type. */
export const widthOf = (text: string, size: number): number => text.length * glyph * size;

/** Places in the given order, moved apart and inside; a label for which no room is left is dropped, the last first. */
export function spread(labels: readonly Placed[], from: number, to: number, size: number): readonly Placed[] {
  const needed = labels.reduce((sum, label) => sum + widthOf(label.text, size) + gap, -gap);
  if (needed > to - from && labels.length > 1) return spread(labels.slice(0, -1), from, to, size);
  const ordered = [...labels].sort((left, right) => left.x - right.x);
  let edge = from;
  const pushed = ordered.map((label) => {
    const half = widthOf(label.text, size) / 2;
    const x = Math.max(label.x, edge + half);
    edge = x + half + gap;
    return { text: label.text, x };
  });
  let limit = to;
  return pushed
    .reverse()
    .map((label) => {
      const half = widthOf(label.text, size) / 2;
      const x = Math.min(label.x, limit - half);
      limit = x - half - gap;
      return { text: label.text, x };
    })
    .reverse();
}
