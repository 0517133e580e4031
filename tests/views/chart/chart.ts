/** A curve with both ends outside the Reynolds limits. */
import type { Chart } from '../../../src/views/present/model.ts';

const differentials = [1, 5, 10, 50, 100, 150, 200, 250, 275];

export const chart: Chart = {
  points: differentials.map((differential) => {
    const flow = 60 * Math.sqrt(differential / 250);
    return {
      differential,
      flow,
      low: 0.99 * flow,
      high: 1.01 * flow,
      inside: differential >= 10 && differential <= 200,
    };
  }),
  duty: [
    { name: 'maximum', label: 'maximum 60 t/h', differential: 250, flow: 60 },
    { name: 'minimum', label: 'minimum 12 t/h', differential: 10, flow: 12 },
  ],
  differentialUnit: 'mbar',
  flowUnit: 't/h',
  banded: true,
  limited: true,
  outside: [
    { from: 0, to: 10, label: 'pipe Reynolds number below 6 510' },
    { from: 200, to: 275, label: 'pipe Reynolds number above 10⁷' },
  ],
  summary: 'Flow rises from 12 t/h at 10 mbar to 60 t/h at 250 mbar.',
};

export const chartLabels = {
  title: 'Flow against differential',
  low: 'lowest, 95 %',
  high: 'highest, 95 %',
  limits: 'Reynolds limits',
  inside: 'inside',
  outside: 'outside',
  band: 'Band: expanded uncertainty, 95 %.',
};
