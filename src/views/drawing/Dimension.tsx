/** A dimension line between two places: thin line, arrowheads inside, or outside where there is no room. */
import type { Point } from './path.ts';
import { at } from './path.ts';

interface DimensionProps {
  readonly from: Point;
  readonly to: Point;
  /** Length of an arrowhead, in the units of the drawing. */
  readonly head: number;
  readonly className?: string | undefined;
  readonly headClassName?: string | undefined;
}

const text = (points: readonly Point[]): string => points.map((point) => `${point.x},${point.y}`).join(' ');

/** Corners of an arrowhead with its tip at a place, pointing along a unit vector; `slim` is its length over half its width. */
export function arrowhead(tip: Point, along: Point, head: number, slim = 5): string {
  const foot = at(tip.x - along.x * head, tip.y - along.y * head);
  const half = head / slim;
  return text([
    tip,
    at(foot.x - along.y * half, foot.y + along.x * half),
    at(foot.x + along.y * half, foot.y - along.x * half),
  ]);
}

export function Dimension({ from, to, head, className, headClassName }: DimensionProps) {
  const length = Math.hypot(to.x - from.x, to.y - from.y);
  const along = length > 0 ? at((to.x - from.x) / length, (to.y - from.y) / length) : at(1, 0);
  const back = at(-along.x, -along.y);
  const outside = length < 2.6 * head;
  const tail = outside ? 2.2 * head : 0;
  const start = at(from.x - along.x * tail, from.y - along.y * tail);
  const end = at(to.x + along.x * tail, to.y + along.y * tail);
  return (
    <g>
      <line className={className} x1={start.x} y1={start.y} x2={end.x} y2={end.y} />
      <polygon className={headClassName} points={arrowhead(from, outside ? along : back, head)} />
      <polygon className={headClassName} points={arrowhead(to, outside ? back : along, head)} />
    </g>
  );
}
