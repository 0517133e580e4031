/** The dimensioned section for the sheet: black on white at a stated scale, 178 mm by 62 mm on paper. */
import { useId } from 'react';
import type { DimensionRow, Shape } from '../present/model.ts';
import { arrowhead } from './Dimension.tsx';
import { EdgeDetail } from './EdgeDetail.tsx';
import { Hatch } from './Hatch.tsx';
import { Measures } from './Measures.tsx';
import { paper, type SheetLayout, sheetLayout } from './paper.ts';
import { at, type Point, pathData } from './path.ts';
import styles from './section.module.css';
import type { SectionLabels } from './words.ts';

interface SectionDrawingProps {
  readonly shape: Shape;
  readonly dimensions: readonly DimensionRow[];
  readonly caption: string; // 'dimensions in mm at 20 °C'
  readonly labels: SectionLabels;
}

export function SectionDrawing({ shape, dimensions, caption, labels }: SectionDrawingProps) {
  const id = useId();
  const layout = sheetLayout(shape, dimensions, labels);
  const { section, scale } = layout;
  return (
    <svg
      className={styles.sheet}
      width={`${paper.width}mm`}
      height={`${paper.height}mm`}
      viewBox={`0 0 ${paper.width} ${paper.height}`}
      role="img"
      aria-labelledby={`${id}t`}
      aria-describedby={`${id}d`}
    >
      <title id={`${id}t`}>{labels.title}</title>
      <desc id={`${id}d`}>{labels.description}</desc>
      <Metal layout={layout} id={id} />
      <Axis layout={layout} />
      <Flow layout={layout} word={labels.flow} />
      <Measures layout={layout} />
      {layout.edgeDetail ? <EdgeDetail shape={shape} dimensions={dimensions} labels={labels} hatch={`${id}h`} /> : null}
      <text className={styles.caption} x={scale.originX + scale.factor * layout.reach.from} y={paper.height - 1}>
        {`${caption}; ${labels.scale} ${layout.stated}`}
      </text>
      <path className={styles.thin} d={breaks(layout, section.walls.length)} />
    </svg>
  );
}

/** Edges of the bore that show beyond the cut: where the contour begins, ends, or has a corner. */
function edgesOf(layout: SheetLayout): readonly Point[] {
  const { profile } = layout.section;
  return [profile.start, ...profile.segments.map((segment) => segment.to)];
}

function Metal({ layout, id }: { readonly layout: SheetLayout; readonly id: string }) {
  const { section, scale, reach } = layout;
  const x = (place: number): number => scale.originX + scale.factor * place;
  const metal = [...section.walls, ...section.metal];
  return (
    <g>
      <defs>
        <Hatch id={`${id}h`} pitch={1.5} width={0.18} className={styles.hatchLine} />
        <clipPath id={`${id}c`}>
          <rect x={x(reach.from)} y={0} width={scale.factor * (reach.to - reach.from)} height={paper.height} />
        </clipPath>
      </defs>
      <g clipPath={`url(#${id}c)`}>
        {edgesOf(layout).map((edge) => (
          <line
            key={`${edge.x} ${edge.y}`}
            className={styles.thin}
            x1={x(edge.x)}
            x2={x(edge.x)}
            y1={scale.originY - scale.factor * edge.y}
            y2={scale.originY + scale.factor * edge.y}
          />
        ))}
        {metal.map((path) => (
          <path
            key={pathData(path, scale)}
            className={styles.outline}
            fill={`url(#${id}h)`}
            d={pathData(path, scale)}
          />
        ))}
        <Holes layout={layout} />
      </g>
    </g>
  );
}

function Holes({ layout: { section, scale } }: { readonly layout: SheetLayout }) {
  return section.tappings.map((hole) => {
    const x = scale.originX + scale.factor * hole.x;
    const half = Math.max(0.35, (hole.width * scale.factor) / 2);
    const [top, foot] = [scale.originY - scale.factor * hole.outer, scale.originY - scale.factor * hole.inner];
    return (
      <g key={hole.x}>
        <rect className={styles.blank} x={x - half} y={top - 0.3} width={2 * half} height={foot - top + 0.6} />
        <path className={styles.hole} d={`M${x - half} ${top}V${foot}M${x + half} ${top}V${foot}`} />
      </g>
    );
  });
}

function Axis({ layout }: { readonly layout: SheetLayout }) {
  const { scale, reach } = layout;
  const [from, to] = [scale.originX + scale.factor * reach.from - 3, scale.originX + scale.factor * reach.to + 3];
  return <line className={styles.axis} x1={from} y1={scale.originY} x2={to} y2={scale.originY} />;
}

function Flow({ layout, word }: { readonly layout: SheetLayout; readonly word: string }) {
  const { scale, reach } = layout;
  const x = scale.originX + scale.factor * reach.from + 3;
  const y = scale.originY + 4.6;
  return (
    <g>
      <text className={styles.figure} x={x} y={y}>
        {word}
      </text>
      <path className={styles.wide} d={`M${x} ${y + 1.8}h9`} />
      <polygon className={styles.arrow} points={arrowhead(at(x + 11, y + 1.8), at(1, 0), 3)} />
    </g>
  );
}

/** Thin break lines where the pipe is cut off at both ends. */
function breaks(layout: SheetLayout, walls: number): string {
  if (walls === 0) return '';
  const { scale, reach, section } = layout;
  const wall = Math.max(...section.walls.flatMap((path) => [path.start.y])) * scale.factor;
  return [reach.from, reach.to]
    .map((end) => {
      const x = scale.originX + scale.factor * end;
      const [top, bottom] = [scale.originY - wall - 3, scale.originY + wall + 3];
      return `M${x} ${top}V${scale.originY - 7}l-1 1l2 1l-1 1V${bottom}`;
    })
    .join('');
}
