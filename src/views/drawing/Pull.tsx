/** The handle on the edge of the bore: drag it, or use the arrow keys, to ask for another diameter ratio. */
import type { KeyboardEvent, PointerEvent } from 'react';
import { useRef } from 'react';
import styles from './drawing.module.css';
import { onPage, type Point, type Scale } from './path.ts';

/** The range that can be asked for, and the steps of the keys. */
export const pullRange = { least: 0.1, most: 0.8 };
const step = 0.005;
const stride = 0.05;

const clamp = (ratio: number): number => Math.min(pullRange.most, Math.max(pullRange.least, ratio));

/** The ratio a key asks for; undefined for any other key. Bounds by Home and End. */
export function ratioByKey(key: string, ratio: number): number | undefined {
  const steps: Readonly<Record<string, number>> = {
    ArrowUp: step,
    ArrowRight: step,
    ArrowDown: -step,
    ArrowLeft: -step,
    PageUp: stride,
    PageDown: -stride,
  };
  if (key === 'Home') return pullRange.least;
  if (key === 'End') return pullRange.most;
  const by = steps[key];
  return by === undefined ? undefined : clamp(ratio + by);
}

/** The ratio that a distance from the axis asks for, both on the page. */
export const ratioByDistance = (distance: number, pipeOnPage: number): number =>
  clamp((2 * Math.abs(distance)) / pipeOnPage);

interface PullProps {
  readonly edge: Point;
  readonly pipe: number; // m
  readonly ratio: number;
  readonly scale: Scale;
  readonly name: string;
  readonly spoken: string;
  readonly onPull: (ratio: number) => void;
}

export function Pull({ edge, pipe, ratio, scale, name, spoken, onPull }: PullProps) {
  const grip = useRef<SVGGElement>(null);
  const place = onPage(edge, scale);

  const drag = (event: PointerEvent<SVGGElement>) => {
    const svg = grip.current?.ownerSVGElement;
    if (!event.currentTarget.hasPointerCapture(event.pointerId) || !svg) return;
    const box = svg.getBoundingClientRect();
    const y = ((event.clientY - box.top) * svg.viewBox.baseVal.height) / box.height;
    onPull(ratioByDistance(scale.originY - y, pipe * scale.factor));
  };
  const press = (event: KeyboardEvent<SVGGElement>) => {
    const asked = ratioByKey(event.key, ratio);
    if (asked === undefined) return;
    event.preventDefault();
    onPull(asked);
  };

  return (
    <g
      ref={grip}
      className={styles.pull}
      role="slider"
      tabIndex={0}
      aria-label={name}
      aria-orientation="vertical"
      aria-valuemin={pullRange.least}
      aria-valuemax={pullRange.most}
      aria-valuenow={Math.round(ratio * 10000) / 10000}
      aria-valuetext={spoken}
      onPointerDown={(event) => event.currentTarget.setPointerCapture(event.pointerId)}
      onPointerMove={drag}
      onKeyDown={press}
    >
      <circle className={styles.pullArea} cx={place.x} cy={place.y} r={14} />
      <circle className={styles.pullGrip} cx={place.x} cy={place.y} r={7.5} />
      <path
        className={styles.pullMark}
        d={`M${place.x} ${place.y - 4.4}v8.8m-2.4 -2.4l2.4 2.4l2.4 -2.4m-4.8 -4l2.4 -2.4l2.4 2.4`}
      />
    </g>
  );
}
