import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it, vi } from 'vitest';
import { pullRange, ratioByDistance, ratioByKey } from '../../../src/views/drawing/Pull.tsx';
import { PipeDrawing } from '../../../src/views/drawing/pipe.tsx';
import { SectionDrawing } from '../../../src/views/drawing/section.tsx';
import { barAt, heads, pipeLabels, row, sectionLabels, shapeOf, shapesAt } from './shapes.ts';

const flange = shapeOf('orifice-plate.flange', 0.10226, 0.611, 0.0254, 0.0254);
const picture = (width: number, onPullBore?: (ratio: number) => void): string =>
  renderToStaticMarkup(
    <PipeDrawing
      shape={flange}
      heads={heads}
      labels={pipeLabels}
      width={width}
      {...(onPullBore ? { onPullBore } : {})}
    />,
  );

describe('the picture', () => {
  it('has a name, a description, and every given text', () => {
    const markup = picture(1200);
    expect(markup).toContain('role="img"');
    for (const text of [
      'title',
      'description',
      'totalHead',
      'pressureHead',
      'tappings',
      'loss',
      'pipe',
      'bore',
      'legend',
    ] as const)
      expect(markup).toContain(pipeLabels[text]);
    expect(markup).toContain('2.6\u00a0m');
    expect(markup).toContain('1.62\u00a0m');
  });

  it('keeps both figures but not the words of the drop on a narrow screen', () => {
    const markup = picture(360);
    expect(markup).toContain('2.6\u00a0m');
    expect(markup).toContain('1.62\u00a0m');
    expect(markup).not.toContain(pipeLabels.tappings);
  });

  it('without head lines is lower, and says nothing of them', () => {
    const bar = barAt(0.2, 0.02);
    const draw = (known?: typeof heads) =>
      renderToStaticMarkup(<PipeDrawing shape={bar} heads={known} labels={pipeLabels} width={1024} />);
    const height = (markup: string) => Number(/height="(\d+)"/.exec(markup)?.[1]);
    expect(draw()).not.toContain(pipeLabels.totalHead);
    expect(draw()).not.toContain(pipeLabels.legend);
    expect(draw(heads)).toContain(pipeLabels.totalHead);
    expect(height(draw())).toBeLessThan(height(draw(heads)));
  });

  it.each([...shapesAt(0.2, 0.6), barAt(0.2, 0.02)])(
    '$element carries no inline style and no number that is not one',
    (shape) => {
      const drawn = renderToStaticMarkup(<PipeDrawing shape={shape} heads={heads} labels={pipeLabels} width={1024} />);
      const sheet = renderToStaticMarkup(
        <SectionDrawing shape={shape} dimensions={[]} caption="dimensions in mm at 20 °C" labels={sectionLabels} />,
      );
      for (const markup of [drawn, sheet]) {
        expect(markup).not.toMatch(/\sstyle=|<style/);
        expect(markup).not.toMatch(/NaN|Infinity|undefined/);
      }
    },
  );
});

describe('the handle on the edge of the bore', () => {
  it('is there only when someone listens, as a slider with its value in words', () => {
    expect(picture(1200)).not.toContain('role="slider"');
    const markup = picture(1200, vi.fn());
    expect(markup).toContain('role="slider"');
    expect(markup).toContain('aria-valuenow="0.611"');
    expect(markup).toContain(`aria-valuetext="${pipeLabels.pullValue}"`);
    expect(markup).toContain('tabindex="0"');
  });

  it('moves by keys within its range', () => {
    expect(ratioByKey('ArrowUp', 0.6)).toBeCloseTo(0.605, 12);
    expect(ratioByKey('ArrowDown', 0.6)).toBeCloseTo(0.595, 12);
    expect(ratioByKey('PageUp', 0.78)).toBe(pullRange.most);
    expect(ratioByKey('Home', 0.6)).toBe(0.1);
    expect(ratioByKey('End', 0.6)).toBe(0.8);
    expect(ratioByKey('a', 0.6)).toBeUndefined();
  });

  it('asks for the ratio under the pointer, on either side of the axis', () => {
    expect(ratioByDistance(30, 120)).toBeCloseTo(0.5, 12);
    expect(ratioByDistance(-30, 120)).toBeCloseTo(0.5, 12);
    expect(ratioByDistance(0, 120)).toBe(0.1);
    expect(ratioByDistance(90, 120)).toBe(0.8);
  });
});

describe('the dimensioned section', () => {
  const rows = [
    row('tapping-upstream', '25.4\u00a0±\u00a00.5\u00a0mm'),
    row('tapping-downstream-face', '25.4\u00a0±\u00a00.5\u00a0mm'),
    row('plate-thickness', '4.0\u00a0mm', 0.004),
    row('bevel-angle', '45\u00a0±\u00a015°', 45),
  ];
  const markup = renderToStaticMarkup(
    <SectionDrawing shape={flange} dimensions={rows} caption="dimensions in mm at 20 °C" labels={sectionLabels} />,
  );

  it('measures 178 mm by 62 mm and states its scale', () => {
    expect(markup).toContain('width="178mm" height="62mm"');
    expect(markup).toContain('dimensions in mm at 20 °C; scale 1 : 4');
  });

  it('writes Ø before diameters and no unit behind a length', () => {
    expect(markup).toContain('Ø 102.26');
    expect(markup).toContain('Ø 62.48 ± 0.03');
    expect(markup).toContain('>25.4\u00a0±\u00a00.5<');
    expect(markup).toContain('>4.0<');
    expect(markup).toContain('>45\u00a0±\u00a015°<');
  });
});
