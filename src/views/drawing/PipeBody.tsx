/** The pipe itself: water, streamlines, cut metal, tapping holes, flow arrows. */
import { useId } from 'react';
import { arrowhead } from './Dimension.tsx';
import styles from './drawing.module.css';
import { Hatch } from './Hatch.tsx';
import type { PictureLayout } from './layout.ts';
import { at, onPage, pathData } from './path.ts';

export function PipeBody({ layout }: { readonly layout: PictureLayout }) {
  const hatch = useId();
  const { section, scale, compact, width } = layout;
  const metal = [...section.walls, ...section.metal];
  const arrows = compact ? [0.09, 0.93] : [0.06, 0.5, 0.94];
  return (
    <g>
      <defs>
        <Hatch id={hatch} pitch={compact ? 4 : 5} width={0.9} className={styles.hatchLine} />
      </defs>
      <path className={styles.water} d={pathData(section.fluid, scale)} />
      {section.streamlines.map((path) => (
        <path key={pathData(path, scale)} className={styles.streamline} d={pathData(path, scale)} />
      ))}
      {arrows.map((share) => (
        <polygon
          key={share}
          className={styles.flow}
          points={arrowhead(at(share * width, scale.originY), at(1, 0), compact ? 9 : 12, 2.8)}
        />
      ))}
      {metal.map((path) => (
        <g key={pathData(path, scale)}>
          <path className={styles.metal} d={pathData(path, scale)} />
          <path fill={`url(#${hatch})`} stroke="none" d={pathData(path, scale)} />
          <path className={styles.outline} d={pathData(path, scale)} />
        </g>
      ))}
      <Tappings layout={layout} />
    </g>
  );
}

function Tappings({ layout: { section, scale } }: { readonly layout: PictureLayout }) {
  return section.tappings.map((hole) => {
    const top = onPage(at(hole.x, hole.outer), scale);
    const half = Math.max(1.5, (hole.width * scale.factor) / 2);
    const depth = (hole.outer - hole.inner) * scale.factor;
    return (
      <g key={hole.x}>
        <rect className={styles.water} x={top.x - half} y={top.y - 1} width={2 * half} height={depth + 2} />
        <path className={styles.outline} d={`M${top.x - half} ${top.y}v${depth}M${top.x + half} ${top.y}v${depth}`} />
      </g>
    );
  });
}
