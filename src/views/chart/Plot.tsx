/** The plot itself: axes, hatched ranges, band, curve, duty points. Nothing moves and nothing answers the pointer. */
import { Area, CartesianGrid, ComposedChart, Line, ReferenceArea, ReferenceDot, XAxis, YAxis } from 'recharts';
import type { Chart } from '../present/model.ts';
import styles from './chart.module.css';
import { DutyLabel, OutsideLabel } from './Labels.tsx';
import { axisText, extremes, plotRows, ticksTo } from './series.ts';

interface PlotProps {
  readonly chart: Chart;
  readonly width: number; // px
  readonly height: number;
  /** No room for the words of the ranges. */
  readonly narrow: boolean;
  /** Id of the hatching. */
  readonly hatch: string;
}

const margin = { top: 22, right: 26, bottom: 18, left: 6 };
const axis = {
  type: 'number',
  tickLine: false,
  stroke: 'var(--chart-ink)',
  tickMargin: 6,
  tickFormatter: axisText,
} as const;
const still = { dot: false, activeDot: false, isAnimationActive: false } as const;
const glyph = 7.5; // px, a digit of an axis

export function Plot({ chart, width, height, narrow, hatch }: PlotProps) {
  const most = extremes(chart);
  const x = ticksTo(most.differential, narrow ? 4 : 6).filter((tick) => tick <= most.differential);
  const y = ticksTo(most.flow, 4);
  const [right, top] = [most.differential > 0 ? most.differential : 1, y.at(-1) ?? 1];
  const axisWidth = 20 + glyph * Math.max(3, ...y.map((tick) => axisText(tick).length));
  const across = {
    value: `Δp / ${chart.differentialUnit}`,
    position: 'insideBottomRight',
    offset: -12,
    className: styles.axisTitle ?? '',
  } as const;
  const up = {
    value: `q / ${chart.flowUnit}`,
    position: 'top',
    offset: 10,
    className: styles.axisTitle ?? '',
  } as const;
  return (
    <ComposedChart
      width={width}
      height={height}
      data={[...plotRows(chart.points)]}
      margin={margin}
      accessibilityLayer={false}
    >
      <Hatching id={hatch} />
      <CartesianGrid stroke="var(--chart-rule)" vertical={false} />
      <Outside
        ranges={chart.outside}
        right={right}
        top={top}
        hatch={hatch}
        plotRight={narrow ? null : width - margin.right}
      />
      <XAxis {...axis} dataKey="differential" domain={[0, right]} ticks={[...x]} label={across} />
      <YAxis {...axis} width={axisWidth} domain={[0, top]} ticks={[...y]} label={up} />
      <Curve />
      <Duty points={chart.duty} />
    </ComposedChart>
  );
}

function Hatching({ id }: { readonly id: string }) {
  return (
    <defs>
      <pattern id={id} width={6} height={6} patternUnits="userSpaceOnUse" patternTransform="rotate(-45)">
        <rect className={styles.outsideWash} width={6} height={6} />
        <line className={styles.outsideHatch} x1={3} y1={0} x2={3} y2={6} />
      </pattern>
    </defs>
  );
}

interface OutsideProps {
  readonly ranges: Chart['outside'];
  readonly right: number; // ends of the axes
  readonly top: number;
  readonly hatch: string;
  /** Right edge of the plot, px; null where the words stand elsewhere. */
  readonly plotRight: number | null;
}

function Outside({ ranges, right, top, hatch, plotRight }: OutsideProps) {
  return ranges.map((range) => {
    const low = range.from === 0; // below the limits, from the axis on; else above them
    const words = plotRight === null ? '' : <OutsideLabel words={range.label} low={low} plotRight={plotRight} />;
    return (
      <ReferenceArea
        key={range.from}
        x1={range.from}
        x2={Math.min(range.to, right)}
        y1={0}
        y2={top}
        fill={`url(#${hatch})`}
        fillOpacity={1}
        label={words}
      />
    );
  });
}

function Curve() {
  return (
    <>
      <Area
        {...still}
        className={styles.band ?? ''}
        dataKey="band"
        stroke="none"
        fill="var(--chart-band)"
        fillOpacity={1}
      />
      <Line {...still} dataKey="inside" stroke="var(--chart-line)" strokeWidth={2} />
      <Line {...still} dataKey="outside" stroke="var(--chart-outside)" strokeWidth={2} strokeDasharray="5 4" />
    </>
  );
}

function Duty({ points }: { readonly points: Chart['duty'] }) {
  const highest = Math.max(...points.map((point) => point.differential));
  return points.map((point) => (
    <ReferenceDot
      key={point.name}
      x={point.differential}
      y={point.flow}
      r={4.5}
      fill="var(--chart-ink)"
      stroke="var(--chart-paper)"
      strokeWidth={1.5}
      label={<DutyLabel words={point.label} highest={point.differential === highest} />}
    />
  ));
}
