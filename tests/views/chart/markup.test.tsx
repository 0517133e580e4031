import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it, vi } from 'vitest';
import { FlowChart } from '../../../src/views/chart/FlowChart.tsx';
import { chart, chartLabels } from './chart.ts';

const render = (width: number): string =>
  renderToStaticMarkup(<FlowChart chart={chart} labels={chartLabels} width={width} height={280} />);

describe('the table beside the chart', () => {
  const markup = render(640);

  it('names its columns as quantity over unit', () => {
    expect(markup).toContain('<th scope="col">Δp / mbar</th>');
    expect(markup).toContain('<th scope="col">q / t/h</th>');
  });

  it('has every point of a short curve with its verdict, and the duty points by name', () => {
    expect(markup.match(/<th scope="row">/g)).toHaveLength(chart.points.length + chart.duty.length);
    expect(markup.match(/<td>outside<\/td>/g)).toHaveLength(4);
    expect(markup).toContain('maximum 60 t/h');
  });

  it('thins a long curve but keeps its two ends', () => {
    const points = Array.from(
      { length: 200 },
      (_, index) => ({ ...chart.points[3], differential: index + 0.5 }) as (typeof chart.points)[number],
    );
    const long = renderToStaticMarkup(
      <FlowChart chart={{ ...chart, points }} labels={chartLabels} width={640} height={280} />,
    );
    expect(long.match(/<th scope="row">/g)?.length).toBeLessThanOrEqual(13 + chart.duty.length);
    expect(long).toContain('<th scope="row">0.5</th>');
    expect(long).toContain('<th scope="row">199.5</th>');
  });
});

describe('the words of the chart', () => {
  it('say in one sentence what it shows, and hide the picture from a reader of the table', () => {
    expect(render(640)).toContain(chart.summary);
    expect(render(640)).toContain('aria-hidden="true"');
  });

  it('name the ranges outside below a narrow chart, where the plot has no room', () => {
    for (const range of chart.outside) expect(render(380)).toContain(range.label);
  });

  it('say nothing of a band or of limits where there are none', () => {
    const bare = renderToStaticMarkup(
      <FlowChart chart={{ ...chart, banded: false, limited: false }} labels={chartLabels} width={640} height={280} />,
    );
    for (const word of [chartLabels.band, chartLabels.low, chartLabels.high, chartLabels.limits]) {
      expect(render(640)).toContain(word);
      expect(bare).not.toContain(word);
    }
    expect(bare).not.toContain('<td>inside</td>');
    expect(bare).toContain('maximum 60 t/h');
  });

  it('complain of nothing', () => {
    const said = [vi.spyOn(console, 'error'), vi.spyOn(console, 'warn')];
    render(640);
    for (const spy of said) expect(spy).not.toHaveBeenCalled();
    vi.restoreAllMocks();
  });
});
