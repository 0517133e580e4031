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

const margin = { top: 22, right: 26, bottom: 14, left: 6 };
const axisHeight = 24; // px, of the figures below the axis
const labelDepth = 24; // px, from a duty point to the foot of its label
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
  const x = ticksTo(most.differential, narrow ? 5 : 6);
  const y = ticksTo(most.flow, 4);
  const [right, top] = [x.at(-1) ?? 1, y.at(-1) ?? 1];
  const rise = (height - margin.top - margin.bottom - axisHeight) / top; // px, a unit of flow
  const axisWidth = 20 + glyph * Math.max(3, ...y.map((tick) => axisText(tick).length));
  const across = {
    value: `Δp / ${chart.differentialUnit}`,
    position: 'insideBottomRight',
    offset: -11,
  } as const;
  const up = {
    value: `q / ${chart.flowUnit}`,
    position: 'top',
    offset: 10,
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
      <XAxis {...axis} height={axisHeight} dataKey="differential" domain={[0, right]} ticks={[...x]} label={across} />
      <YAxis {...axis} width={axisWidth} domain={[0, top]} ticks={[...y]} label={up} />
      <Curve />
      <Duty points={chart.duty} rise={rise} />
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

interface DutyProps {
  readonly points: Chart['duty'];
  readonly rise: number; // px above the axis for each unit of flow
}

function Duty({ points, rise }: DutyProps) {
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
      label={
        <DutyLabel
          words={point.label}
          highest={point.differential === highest}
          grounded={point.flow * rise < labelDepth}
        />
      }
    />
  ));
}
