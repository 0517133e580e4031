import { describe, expect, it } from 'vitest';
import { headLines, pictureLayout } from '../../../src/views/drawing/layout.ts';
import { paper, sheetLayout, statedScale } from '../../../src/views/drawing/paper.ts';
import { onPage } from '../../../src/views/drawing/path.ts';
import { barAt, heads, sectionLabels, shapesAt } from './shapes.ts';

const widths = [1440, 1024, 760, 390, 320];

describe('the picture on the screen', () => {
  const cases = widths.flatMap((width) =>
    [...shapesAt(0.1, 0.6), barAt(0.1, 0.012)].map((shape) => ({ width, shape, name: shape.element })),
  );

  it.each(cases)(
    '$name at $width px: the metal stays inside and the pipe runs out at both ends',
    ({ width, shape }) => {
      const layout = pictureLayout(shape, [], width);
      const { section, scale, height, band } = layout;
      expect(scale.originY - section.outside * scale.factor).toBeGreaterThanOrEqual(band.bottom);
      expect(layout.below).toBeLessThan(height);
      const axis = section.streamlines.at(-1);
      expect(onPage(axis?.start ?? { x: 0, y: 0 }, scale).x).toBeLessThan(0);
      expect(onPage(axis?.segments[0]?.to ?? { x: 0, y: 0 }, scale).x).toBeGreaterThan(width);
      expect(scale.originX + shape.recovery_D * shape.pipe * scale.factor).toBeLessThan(width);
    },
  );

  it.each(cases)(
    '$name at $width px: marks stand over the holes, total head never below pressure head',
    ({ width, shape }) => {
      const layout = pictureLayout(shape, [], width);
      const { marks } = headLines(heads, shape, layout);
      const [upstream, downstream] = layout.section.tappings;
      const place = (x = Number.NaN) => layout.scale.originX + layout.scale.factor * x;
      expect(marks.find((mark) => mark.station === 'tapping-upstream')?.x).toBeCloseTo(place(upstream?.x), 9);
      expect(marks.find((mark) => mark.station === 'tapping-downstream')?.x).toBeCloseTo(place(downstream?.x), 9);
      for (const mark of marks) expect(mark.total).toBeLessThanOrEqual(mark.pressure);
    },
  );

  it('draws heads to scale: differences on the page are as the heads', () => {
    const shape = shapesAt(0.1, 0.6)[0];
    if (shape === undefined) throw new Error('expected a shape');
    const { marks } = headLines(heads, shape, pictureLayout(shape, [], 1200));
    const [, upstream, downstream, recovered] = marks;
    const drop = (downstream?.pressure ?? 0) - (upstream?.pressure ?? 0);
    const loss = (recovered?.total ?? 0) - (upstream?.total ?? 0);
    expect(loss / drop).toBeCloseTo(1.62 / 2.6, 9);
  });

  it('drops labels below 640 px only', () => {
    expect(widths.map((width) => pictureLayout(shapesAt(0.1, 0.6)[0] ?? never(), [], width).compact)).toEqual([
      false,
      false,
      false,
      true,
      true,
    ]);
  });
});

const never = (): never => {
  throw new Error('expected a shape, got none');
};

describe('the section on paper', () => {
  const cases = [0.05, 0.1, 0.25, 0.5, 1].flatMap((pipe) =>
    [0.3, 0.5, 0.7].flatMap((ratio) =>
      shapesAt(pipe, ratio).map((shape) => ({ shape, name: shape.element, pipe, ratio })),
    ),
  );

  it.each(cases)('$name, D $pipe m, ratio $ratio: fits the frame at its stated scale', ({ shape }) => {
    const layout = sheetLayout(shape, [], sectionLabels);
    const { scale, reach, section } = layout;
    const right = layout.edgeDetail ? 122 : paper.width;
    expect(scale.originX + reach.from * scale.factor).toBeGreaterThanOrEqual(0);
    expect(scale.originX + reach.to * scale.factor).toBeLessThanOrEqual(right);
    expect(scale.originY - section.outside * scale.factor).toBeGreaterThanOrEqual(0);
    expect(scale.originY + section.outside * scale.factor).toBeLessThanOrEqual(paper.height - 5);
    const [drawn, real] = layout.stated.split(' : ').map(Number);
    expect(scale.factor).toBeCloseTo((1000 * (drawn ?? 0)) / (real ?? 1), 9);
    expect(shape.pipe * scale.factor).toBeGreaterThan(9); // large enough to read
  });

  it('rounds a scale down to a stated step', () => {
    expect(statedScale(0.26)).toEqual([1, 4]);
    expect(statedScale(0.25)).toEqual([1, 4]);
    expect(statedScale(0.249)).toEqual([1, 5]);
    expect(statedScale(0.09)).toEqual([1, 15]);
    expect(statedScale(1)).toEqual([1, 1]);
    expect(statedScale(6.2)).toEqual([5, 1]);
  });
});
