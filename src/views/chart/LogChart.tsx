/**
 * Mass flow over time: the least and the largest flow of every stretch, gaps left open. Fixed size: the caller measures
 * the width; on paper it is black on white. Nothing moves and nothing answers the pointer.
 */
import { CartesianGrid, ComposedChart, Line, XAxis, YAxis } from 'recharts';
import type { LogChart as Chart } from '../present/log-model.ts';
import styles from './chart.module.css';
import { axisText, ticksTo } from './series.ts';

interface Props {
  readonly chart: Chart;
  readonly width: number; // px
  readonly height: number;
  /** Black on white, for the sheet. */
  readonly print?: boolean;
}

const margin = { top: 22, right: 34, bottom: 2, left: 6 };
const axis = { type: 'number', tickLine: false, stroke: 'var(--chart-ink)', tickMargin: 6 } as const;
const glyph = 7.5; // px, a digit of an axis
const MARK = 84; // px that a mark of the axis of time takes

export function LogChart({ chart, width, height, print = false }: Props) {
  return (
    <figure className={print ? `${styles.chart} ${styles.print}` : styles.chart}>
      <div aria-hidden="true">
        <Plot chart={chart} width={width} height={height} />
      </div>
      <figcaption className={styles.summary}>{chart.summary}</figcaption>
    </figure>
  );
}

function Plot({ chart, width, height }: Props) {
  const up = ticksTo(chart.most, 4);
  const room = Math.max(1, Math.floor(width / MARK));
  const every = Math.ceil(chart.ticks.length / room);
  const marks = chart.ticks.filter((_, at) => at % every === 0);
  const labels = new Map(chart.ticks.map(({ time, label }) => [time, label]));
  const axisWidth = 20 + glyph * Math.max(3, ...up.map((tick) => axisText(tick).length));
  return (
    <ComposedChart width={width} height={height} data={[...chart.points]} margin={margin} accessibilityLayer={false}>
      <CartesianGrid stroke="var(--chart-rule)" vertical={false} />
      <XAxis
        {...axis}
        height={26}
        dataKey="time"
        domain={['dataMin', 'dataMax']}
        ticks={marks.map(({ time }) => time)}
        tickFormatter={(time: number) => labels.get(time) ?? ''}
        interval={0}
      />
      <YAxis
        {...axis}
        width={axisWidth}
        domain={[0, up.at(-1) ?? 1]}
        ticks={[...up]}
        tickFormatter={axisText}
        label={{ value: `q_m / ${chart.unit}`, position: 'top', offset: 10 }}
      />
      <Line
        dataKey="flow"
        type="linear"
        dot={false}
        activeDot={false}
        isAnimationActive={false}
        connectNulls={false}
        stroke="var(--chart-line)"
        strokeWidth={1.25}
      />
    </ComposedChart>
  );
}
