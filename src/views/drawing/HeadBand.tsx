/** The head lines above the pipe: total head dashed, pressure head solid, computed points marked, two dimensions. */
import type { Heads } from '../present/model.ts';
import { Dimension } from './Dimension.tsx';
import styles from './drawing.module.css';
import { type HeadLines, type HeadMark, type PictureLayout, pageData } from './layout.ts';
import { at } from './path.ts';
import { widthOf } from './spread.ts';
import type { PipeLabels } from './words.ts';

interface HeadBandProps {
  readonly heads: Heads;
  readonly lines: HeadLines;
  readonly layout: PictureLayout;
  readonly labels: PipeLabels;
}

export function HeadBand({ heads, lines, layout, labels }: HeadBandProps) {
  const { compact, margin } = layout;
  const first = lines.marks[0];
  if (first === undefined) return null;
  const lowest = lines.marks.reduce((least, mark) => (mark.pressure > least.pressure ? mark : least), first);
  const side = compact ? { x: lowest.x + 8, y: lowest.pressure } : { x: margin, y: first.pressure };
  return (
    <g>
      <TappingDrop heads={heads} lines={lines} layout={layout} labels={labels} />
      <Loss heads={heads} lines={lines} layout={layout} labels={labels} />
      <path className={styles.totalHead} d={pageData(lines.total)} />
      <path className={styles.pressureHead} d={pageData(lines.pressure)} />
      {lines.marks
        .filter((mark) => mark.computed)
        .map((mark) => (
          <g key={`${mark.station} ${mark.x}`}>
            <circle className={styles.totalMark} cx={mark.x} cy={mark.total} r={2.6} />
            <circle className={styles.pressureMark} cx={mark.x} cy={mark.pressure} r={2.8} />
          </g>
        ))}
      <text className={styles.label} x={margin} y={first.total - 8}>
        {labels.totalHead}
      </text>
      <text className={styles.waterLabel} x={side.x} y={side.y + 16}>
        {labels.pressureHead}
      </text>
    </g>
  );
}

function TappingDrop({ heads, lines, layout, labels }: HeadBandProps) {
  const upstream = lines.marks.find((mark) => mark.station === 'tapping-upstream');
  const downstream = lines.marks.find((mark) => mark.station === 'tapping-downstream');
  if (upstream === undefined || downstream === undefined) return null;
  const { section, scale, compact } = layout;
  const x = upstream.x - (compact ? 10 : 20);
  const middle = (upstream.pressure + downstream.pressure) / 2 + 4;
  const words = compact ? [] : inRoom(labels.tappings, x - 7 - layout.margin);
  const stems: readonly (readonly [HeadMark, number])[] = [
    [upstream, scale.originY - scale.factor * (section.tappings[0]?.outer ?? 0)],
    [downstream, scale.originY - scale.factor * (section.tappings[1]?.outer ?? 0)],
  ];
  return (
    <g>
      {stems.map(([mark, foot]) => (
        <line key={mark.station} className={styles.stem} x1={mark.x} y1={mark.pressure} x2={mark.x} y2={foot} />
      ))}
      <line className={styles.thin} x1={x - 4} y1={downstream.pressure} x2={downstream.x} y2={downstream.pressure} />
      <Dimension
        from={at(x, upstream.pressure)}
        to={at(x, downstream.pressure)}
        head={7}
        className={styles.thin}
        headClassName={styles.arrow}
      />
      <text className={styles.figure} x={x - 7} y={compact ? middle + 8 : middle - 2} textAnchor="end">
        {heads.tappingDrop.text}
      </text>
      {words.map((part, index) => (
        <text key={part} className={styles.label} x={x - 7} y={middle + 14 + 14 * index} textAnchor="end">
          {part}
        </text>
      ))}
    </g>
  );
}

/** The words in one line, or in two where the room is too narrow. */
function inRoom(words: string, room: number): readonly string[] {
  if (widthOf(words, 12) <= room) return [words];
  const middle = words.indexOf(' ', words.length / 2 - 1);
  return middle < 0 ? [words] : [words.slice(0, middle), words.slice(middle + 1)];
}

function Loss({ heads, lines, layout, labels }: HeadBandProps) {
  const first = lines.marks[0];
  const last = lines.marks.at(-1);
  if (first === undefined || last === undefined) return null;
  const from = lines.marks.find((mark) => mark.station === 'tapping-upstream')?.x ?? first.x;
  const x = layout.width - layout.margin - 6;
  return (
    <g>
      <line className={styles.lossThin} x1={from} y1={first.total} x2={x + 5} y2={first.total} />
      <Dimension
        from={at(x, first.total)}
        to={at(x, last.total)}
        head={7}
        className={styles.lossThin}
        headClassName={styles.lossArrow}
      />
      <text className={styles.label} x={x - 8} y={first.total - 8} textAnchor="end">
        {labels.loss} <tspan className={styles.lossFigure}>{heads.loss.text}</tspan>
      </text>
    </g>
  );
}
