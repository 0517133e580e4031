import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { smoothThrough } from '../../../src/views/drawing/curve.ts';
import { spread, widthOf } from '../../../src/views/drawing/spread.ts';

const heights = fc.array(fc.double({ min: -100, max: 100, noNaN: true }), { minLength: 2, maxLength: 12 });
const gaps = fc.array(fc.double({ min: 0.01, max: 50, noNaN: true }), { minLength: 12, maxLength: 12 });

describe('the drawn line between computed points', () => {
  it('passes through every point and never leaves the range of its two neighbours', () => {
    fc.assert(
      fc.property(heights, gaps, (ys, steps) => {
        let x = 0;
        const points = ys.map((y, index) => {
          x += steps[index] ?? 1;
          return { x, y };
        });
        const path = smoothThrough(points);
        let from = path.start;
        path.segments.forEach((segment, index) => {
          expect(segment.to).toEqual(points[index + 1]);
          if (segment.kind !== 'cubic') throw new Error(`expected a cubic, got ${segment.kind}`);
          for (let t = 0.05; t < 1; t += 0.05) {
            const s = 1 - t;
            const y =
              s ** 3 * from.y +
              3 * s * s * t * segment.first.y +
              3 * s * t * t * segment.second.y +
              t ** 3 * segment.to.y;
            expect(y).toBeGreaterThanOrEqual(Math.min(from.y, segment.to.y) - 1e-9);
            expect(y).toBeLessThanOrEqual(Math.max(from.y, segment.to.y) + 1e-9);
          }
          from = segment.to;
        });
      }),
    );
  });

  it('is level at a turning point', () => {
    const [into, out] = smoothThrough([
      { x: 0, y: 0 },
      { x: 1, y: 5 },
      { x: 3, y: 2 },
    ]).segments;
    expect(into?.kind === 'cubic' && into.second.y).toBe(5);
    expect(out?.kind === 'cubic' && out.first.y).toBe(5);
  });
});

describe('labels in one line', () => {
  const labels = fc.array(
    fc.record({ text: fc.string({ minLength: 1, maxLength: 18 }), x: fc.double({ min: -50, max: 900, noNaN: true }) }),
    { minLength: 1, maxLength: 4 },
  );

  it('never overlap and never leave their room', () => {
    fc.assert(
      fc.property(labels, fc.integer({ min: 260, max: 1400 }), (wanted, width) => {
        const placed = spread(wanted, 10, width, 12);
        let edge = 10 - 1e-9;
        for (const label of placed) {
          const half = widthOf(label.text, 12) / 2;
          expect(label.x - half).toBeGreaterThanOrEqual(edge);
          edge = label.x + half;
        }
        expect(edge).toBeLessThanOrEqual(width + 1e-9);
      }),
    );
  });

  it('drops the last where there is no room for all', () => {
    const wanted = ['D 102.26 mm', 'bore 62.48 mm', 'recovered by 6 D'].map((text) => ({ text, x: 100 }));
    expect(spread(wanted, 0, 200, 12).map((label) => label.text)).toEqual(['D 102.26 mm', 'bore 62.48 mm']);
  });
});
