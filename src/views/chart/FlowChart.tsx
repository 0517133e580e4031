/**
 * Flow against differential: the curve with its uncertainty band, the duty points, and the ranges outside the Reynolds
 * limits, hatched and dashed. Fixed size: the caller measures the width; on paper it is 640 px, black on white.
 */
import { useId } from 'react';
import type { Chart } from '../present/model.ts';
import styles from './chart.module.css';
import { Plot } from './Plot.tsx';
import { Twin } from './Twin.tsx';
import type { ChartLabels } from './words.ts';

interface FlowChartProps {
  readonly chart: Chart;
  readonly labels: ChartLabels;
  readonly width: number; // px
  readonly height: number;
  /** Black on white, for the sheet. */
  readonly print?: boolean;
}

/** Below this width the words of the ranges stand under the plot. */
const narrowBelow = 480;

export function FlowChart({ chart, labels, width, height, print = false }: FlowChartProps) {
  const hatch = useId();
  const narrow = width < narrowBelow;
  return (
    <figure className={print ? `${styles.chart} ${styles.print}` : styles.chart}>
      <div aria-hidden="true">
        <Plot chart={chart} width={width} height={height} narrow={narrow} hatch={hatch} />
      </div>
      <figcaption className={styles.summary}>
        {(narrow ? chart.outside : []).map((range) => (
          <p key={range.from} className={styles.key}>
            {range.label}
          </p>
        ))}
        <p>
          {chart.summary} {chart.banded && labels.band}
        </p>
      </figcaption>
      <Twin chart={chart} labels={labels} />
    </figure>
  );
}
