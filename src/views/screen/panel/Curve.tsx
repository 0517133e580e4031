/** Flow against differential. The curve may lag the figures by a moment; its table twin stands above it. */
import { lazy, Suspense } from 'react';
import type { ChartLabels } from '../../chart/words.ts';
import type { PresentedSizing } from '../../present/model.ts';
import { useLater } from '../meter.ts';
import { useWidth } from '../useWidth.ts';
import styles from './Curve.module.css';
import { Panel } from './Panel.tsx';

const HEIGHT = 290; // px

const LABELS: ChartLabels = {
  title: 'Flow against differential',
  low: 'lowest, 95\u00a0%',
  high: 'highest, 95\u00a0%',
  limits: 'Reynolds limits',
  inside: 'inside',
  outside: 'outside',
  band: 'Band: expanded uncertainty of the flow, 95\u00a0%.',
};

const FlowChart = lazy(() => import('../../chart/FlowChart.tsx').then((module) => ({ default: module.FlowChart })));

export function Curve({ sizing, stale }: { readonly sizing: PresentedSizing; readonly stale: boolean }) {
  const chart = useLater(sizing.chart);
  const [frame, width] = useWidth();
  return (
    <Panel id="curve" title="Flow against differential" stale={stale}>
      <div className={styles.frame} ref={frame}>
        <Suspense fallback={null}>
          {width > 0 && <FlowChart chart={chart} labels={LABELS} width={width} height={HEIGHT} />}
        </Suspense>
      </div>
    </Panel>
  );
}
