/** The picture on the screen: the pipe to scale with its element, and the two head lines above it on the same axis. */
import { useId, useMemo } from 'react';
import type { DimensionRow, Heads, Shape } from '../present/model.ts';
import styles from './drawing.module.css';
import { HeadBand } from './HeadBand.tsx';
import { headLines, pictureLayout } from './layout.ts';
import { PipeBody } from './PipeBody.tsx';
import { PipeTexts } from './PipeTexts.tsx';
import { Pull } from './Pull.tsx';
import type { PipeLabels } from './words.ts';

interface PipeDrawingProps {
  readonly shape: Shape;
  /** The head lines above the pipe, where they are known. */
  readonly heads?: Heads | undefined;
  readonly labels: PipeLabels;
  /** Width in px; below 640 px the picture drops the labels that have no room. */
  readonly width: number;
  /** Dimensions of the element, where the drawing follows them. */
  readonly dimensions?: readonly DimensionRow[];
  /** Shows a handle on the bore's edge, and is told the diameter ratio that it asks for. */
  readonly onPullBore?: ((ratio: number) => void) | undefined;
}

const none: readonly DimensionRow[] = [];

export function PipeDrawing({ shape, heads, labels, width, dimensions = none, onPullBore }: PipeDrawingProps) {
  const id = useId();
  const headed = heads !== undefined;
  const layout = useMemo(() => pictureLayout(shape, dimensions, width, headed), [shape, dimensions, width, headed]);
  const lines = useMemo(() => heads && headLines(heads, shape, layout), [heads, shape, layout]);
  const { height, section, scale, compact } = layout;
  return (
    <figure className={styles.figureBox}>
      <svg
        className={compact ? `${styles.picture} ${styles.compact}` : styles.picture}
        width={width}
        height={height}
        viewBox={`0 0 ${width} ${height}`}
        role={onPullBore ? 'group' : 'img'}
        aria-labelledby={`${id}t`}
        aria-describedby={`${id}d`}
      >
        <title id={`${id}t`}>{labels.title}</title>
        <desc id={`${id}d`}>{labels.description}</desc>
        <PipeBody layout={layout} />
        {heads && lines && <HeadBand heads={heads} lines={lines} layout={layout} labels={labels} />}
        <PipeTexts shape={shape} layout={layout} labels={labels} />
        {onPullBore ? (
          <Pull
            edge={section.edge}
            pipe={shape.pipe}
            ratio={shape.ratio}
            scale={scale}
            name={labels.pull ?? labels.bore}
            spoken={labels.pullValue ?? labels.bore}
            onPull={onPullBore}
          />
        ) : null}
      </svg>
      <Legend labels={labels} headed={headed} />
    </figure>
  );
}

/** What is computed and what is to scale. */
function Legend({ labels, headed }: { readonly labels: PipeLabels; readonly headed: boolean }) {
  return (
    <figcaption className={styles.legend}>
      {headed && (
        <span>
          <span className={styles.bullet} aria-hidden="true" />
          {labels.legend}
        </span>
      )}
      <span>{labels.scale}</span>
    </figcaption>
  );
}
