/** The line of stations under the pipe. */
import type { Shape } from '../present/model.ts';
import styles from './drawing.module.css';
import type { PictureLayout } from './layout.ts';
import { spread } from './spread.ts';
import type { PipeLabels } from './words.ts';

interface PipeTextsProps {
  readonly shape: Shape;
  readonly layout: PictureLayout;
  readonly labels: PipeLabels;
}

export function PipeTexts({ shape, layout, labels }: PipeTextsProps) {
  const { scale, section, compact, width, margin, below } = layout;
  const place = (x: number): number => scale.originX + scale.factor * x;
  const recovered = place(shape.recovery_D * shape.pipe);
  const wanted = [
    { text: labels.pipe, x: place(-1.9 * shape.pipe) },
    { text: labels.bore, x: place(section.edge.x) },
    ...(labels.recovered === '' || recovered > width ? [] : [{ text: labels.recovered, x: recovered }]),
  ];
  const row = below + 17;
  const foot = scale.originY + scale.factor * shape.pipe * 0.56;
  return (
    <g>
      {labels.recovered === '' || recovered > width ? null : (
        <path className={styles.thin} d={`M${recovered} ${foot}V${below + 3}`} />
      )}
      {spread(wanted, margin, width - margin, compact ? 11 : 12).map((label) => (
        <text key={label.text} className={styles.station} x={label.x} y={row} textAnchor="middle">
          {label.text}
        </text>
      ))}
    </g>
  );
}
