import { describe, expect, it } from 'vitest';
import { inletEllipse } from '../../../src/views/drawing/long-radius-nozzle.ts';
import { type ArcSegment, endOf, type Path, type Point, type Segment } from '../../../src/views/drawing/path.ts';
import { radiusAt } from '../../../src/views/drawing/profile.ts';
import { draftOf, drawnKinds } from '../../../src/views/drawing/registry.ts';
import { stationsOf } from '../../../src/views/drawing/venturi-tube.ts';
import type { Shape } from '../../../src/views/present/model.ts';
import { barAt, row, shapeOf, shapesAt } from './shapes.ts';

const sectionOf = (shape: Shape) =>
  draftOf(shape.element).section(shape, [], draftOf(shape.element).reach(shape, false));
const onEllipse = (arc: ArcSegment, point: Point): number =>
  ((point.x - arc.centre.x) / arc.semiX) ** 2 + ((point.y - arc.centre.y) / arc.semiY) ** 2;

/** Direction of travel at a point of a segment that starts at `from`. */
function direction(segment: Segment, from: Point, point: Point): number {
  if (segment.kind !== 'arc') return Math.atan2(segment.to.y - from.y, segment.to.x - from.x);
  const [u, v] = [(point.x - segment.centre.x) / segment.semiX ** 2, (point.y - segment.centre.y) / segment.semiY ** 2];
  return segment.clockwise ? Math.atan2(-u, v) : Math.atan2(u, -v);
}

/** Turns at the joints of a contour, radians. */
function turns(path: Path): readonly number[] {
  const starts = [path.start, ...path.segments.map((segment) => segment.to)];
  return path.segments.slice(1).map((segment, index) => {
    const joint = starts[index + 1] as Point;
    const before = path.segments[index] as Segment;
    return direction(segment, joint, joint) - direction(before, starts[index] as Point, joint);
  });
}

const ratios = [0.2, 0.3, 0.45, 0.55, 0.7, 0.75];
const everything = ratios.flatMap((ratio) => [...shapesAt(0.05, ratio), ...shapesAt(0.3, ratio)]);

describe('every section', () => {
  it('is drawn for each kind of the registry and for no other', () => {
    expect(new Set([...shapesAt(0.1, 0.5), barAt(0.1)].map((shape) => shape.element.split('.')[0]))).toEqual(
      new Set(drawnKinds),
    );
    expect(() => draftOf('wedge')).toThrow(/expected one of orifice-plate/);
  });

  it.each(everything)(
    '$element at $pipe m, ratio $ratio: arcs end on their ellipse, metal and walls are closed',
    (shape) => {
      const section = sectionOf(shape);
      const paths = [section.profile, ...section.walls, ...section.metal];
      for (const path of paths) {
        let from = path.start;
        for (const segment of path.segments) {
          if (segment.kind === 'arc') {
            expect(onEllipse(segment, from)).toBeCloseTo(1, 9);
            expect(onEllipse(segment, segment.to)).toBeCloseTo(1, 9);
          }
          from = segment.to;
        }
      }
      expect([...section.walls, ...section.metal].every((path) => path.closed)).toBe(true);
      expect(section.walls).toHaveLength(4);
    },
  );

  it.each(everything)('$element at $pipe m, ratio $ratio: bore and pipe to the same scale', (shape) => {
    const section = sectionOf(shape);
    const least = Math.min(section.profile.start.y, ...section.profile.segments.map((segment) => segment.to.y));
    expect(least / (shape.pipe / 2)).toBeCloseTo(shape.ratio, 12);
    expect(section.edge.y / (shape.pipe / 2)).toBeCloseTo(shape.ratio, 12);
    expect(section.fluid.segments.every((segment) => Math.abs(segment.to.y) <= shape.pipe / 2 + 1e-12)).toBe(true);
  });

  it.each(everything)('$element at $pipe m, ratio $ratio: no streamline touches the metal of the bore', (shape) => {
    const { profile, streamlines } = sectionOf(shape);
    for (const path of streamlines) {
      for (const segment of path.segments) {
        const { x, y } = segment.to;
        if (x < 0 || x > endOf(profile).x) continue;
        expect(Math.abs(y)).toBeLessThan(radiusAt(profile, x));
      }
    }
  });

  it.each(everything)('$element at $pipe m, ratio $ratio: upper half and lower half are mirror images', (shape) => {
    const { metal } = sectionOf(shape);
    const [upper, lower] = [metal[0] as Path, metal.at(-1) as Path];
    expect(lower.segments.map((segment) => segment.to)).toEqual(
      upper.segments.map(({ to }) => ({ x: to.x, y: -to.y })),
    );
  });
});

describe('an averaging pitot', () => {
  const pipe = 0.2;
  const { bore, wall } = { bore: pipe / 2, wall: 0.56 * pipe };
  const drawnWith = (width?: number) => {
    const rows = width === undefined ? [] : [row('bar-width', `${width * 1000}\u00a0mm`, width)];
    const draft = draftOf('averaging-pitot.pipe');
    return draft.section(barAt(pipe, width), rows, draft.reach(barAt(pipe), false));
  };
  const extent = (paths: readonly Path[], axis: 'x' | 'y') => {
    const places = paths
      .flatMap((path) => [path.start, ...path.segments.map(({ to }) => to)])
      .map((point) => point[axis]);
    return { least: Math.min(...places), most: Math.max(...places) };
  };

  it.each([undefined, 0.004, 0.02, 0.06])('of width %s reaches across the pipe, in closed pieces', (width) => {
    const { metal, walls, fluid, outside } = drawnWith(width);
    expect([...walls, ...metal].every((path) => path.closed)).toBe(true);
    const across = extent(metal, 'y');
    expect(across.least).toBeLessThan(-bore);
    expect(across.least).toBeGreaterThanOrEqual(-wall - 1e-12);
    expect(across.most).toBe(outside);
    expect(outside).toBeGreaterThan(wall);
    expect(extent([fluid], 'y')).toEqual({ least: -bore, most: bore });
  });

  it('has its two passages apart from each other, inside the bar, and open at the top', () => {
    for (const width of [undefined, 0.004, 0.02, 0.06]) {
      const { tappings, profile, outside } = drawnWith(width);
      const [front, back] = tappings;
      if (front === undefined || back === undefined) throw new Error('expected two passages');
      expect(front.x + front.width / 2).toBeLessThan(back.x - back.width / 2);
      expect(front.x - front.width / 2).toBeGreaterThan(profile.start.x);
      expect(back.x + back.width / 2).toBeLessThan(endOf(profile).x);
      expect([front.outer, back.outer]).toEqual([outside, outside]);
    }
  });

  it('has ports through front and back at the middles of rings of equal area', () => {
    const { metal, profile } = drawnWith();
    const isFront = (x = 0): boolean => x > profile.start.x && x < 0;
    const front = metal.filter((path) => path.start.x === profile.start.x && isFront(path.segments[0]?.to.x));
    const gaps = front
      .map((path) => extent([path], 'y'))
      .sort((one, other) => one.least - other.least)
      .flatMap((piece, index, all) => {
        const next = all[index + 1];
        return next === undefined ? [] : [(piece.most + next.least) / 2];
      });
    expect(gaps.map((place) => Math.abs(place / bore) ** 2)).toEqual(
      [0.75, 0.25, 0.25, 0.75].map((share) => expect.closeTo(share, 3)), // r² at a quarter and three quarters of the area
    );
  });

  it('writes its width beside the bar on the sheet, and no diameter but that of the pipe', () => {
    const draft = draftOf('averaging-pitot.pipe');
    const measures = draft.measures(
      barAt(pipe),
      [row('bar-width', '20\u00a0mm', 0.02)],
      { from: -0.3, to: 0.3 },
      { pipe: '200', bore: '' },
    );
    expect(measures.map(({ kind, text }) => `${kind} ${text}`)).toEqual(['diameter Ø 200', 'note w 20']);
  });
});

describe('tapping holes stand where the standard puts them', () => {
  const places = (shape: Shape) => sectionOf(shape).tappings.map((hole) => hole.x);

  it('flange: one inch from the face on their own side (ISO 5167-2:2003, 5.2.2.3)', () => {
    const shape = shapeOf('orifice-plate.flange', 0.1, 0.6, 0.0254, 0.0254);
    const thickness = endOf(sectionOf(shape).profile).x;
    expect(places(shape)[0]).toBeCloseTo(-0.0254, 12);
    expect((places(shape)[1] ?? 0) - thickness).toBeCloseTo(0.0254, 12);
  });

  it('D and D/2: both from the upstream face (5.2.2.2)', () => {
    const [upstream, downstream] = places(shapeOf('orifice-plate.D-D/2', 0.2, 0.5, 0.2, 0.1));
    expect(upstream).toBeCloseTo(-0.2, 12);
    expect(downstream).toBeCloseTo(0.1, 12);
  });

  it('corner: against the faces of the plate (5.2.3)', () => {
    const shape = shapeOf('orifice-plate.corner', 0.2, 0.5);
    const [upstream, downstream] = sectionOf(shape).tappings;
    expect((upstream?.x ?? 0) + (upstream?.width ?? 0) / 2).toBeLessThanOrEqual(1e-12);
    expect((downstream?.x ?? 0) - (downstream?.width ?? 0) / 2).toBeGreaterThanOrEqual(
      endOf(sectionOf(shape).profile).x - 1e-12,
    );
  });

  it.each([0.4, 0.6, 0.7])(
    'corner: width within 0.005 D to 0.03 D, above 0.65 within 0.01 D to 0.02 D (ratio %d)',
    (ratio) => {
      const [least, most] = ratio <= 0.65 ? [0.005, 0.03] : [0.01, 0.02];
      for (const element of ['orifice-plate.corner', 'isa-1932-nozzle']) {
        const width = (sectionOf(shapeOf(element, 0.2, ratio)).tappings[0]?.width ?? 0) / 0.2;
        expect(width).toBeGreaterThanOrEqual(least);
        expect(width).toBeLessThanOrEqual(most);
      }
    },
  );

  it('Venturi nozzle: 0.3 d behind the inlet arcs, 0.6041 d from the face (ISO 5167-3:2003, 5.3.2)', () => {
    expect((places(shapeOf('venturi-nozzle', 0.2, 0.5))[1] ?? 0) / 0.1).toBeCloseTo(0.6041, 4);
  });

  it('Venturi tube: half a throat behind the start of the throat (ISO 5167-4:2003, 5.4.3)', () => {
    const shape = shapeOf('venturi-tube.machined', 0.2, 0.5, 0.1);
    const { throatFrom } = stationsOf(shape, []);
    expect(places(shape)[0]).toBeCloseTo(-0.1, 12);
    expect(places(shape)[1]).toBeCloseTo(throatFrom + 0.05, 12);
  });

  it.each(shapesAt(0.4, 0.6))('$element: a hole is narrower than 0.13 D and 13 mm', (shape) => {
    for (const hole of sectionOf(shape).tappings) expect(hole.width).toBeLessThan(Math.min(0.13 * shape.pipe, 0.013));
  });
});

describe('ISA 1932 nozzle (ISO 5167-3:2003, 5.1.2)', () => {
  const { profile } = sectionOf(shapeOf('isa-1932-nozzle', 1, 0.5));
  const [first, second, throat] = profile.segments as readonly [ArcSegment, ArcSegment, Segment];
  const d = 0.5;

  it('has arcs of 0.2 d and d/3 that meet at 0.0439 d behind the face, 0.625 d from the axis', () => {
    expect(first.semiX).toBeCloseTo(0.2 * d, 12);
    expect(second.semiX).toBeCloseTo(d / 3, 12);
    expect(first.to.x / d).toBeCloseTo(0.0439, 4);
    expect(first.to.y / d).toBeCloseTo(0.625, 4);
  });

  it('leaves the face at 1.5 d at a right angle, and its joints do not turn', () => {
    expect(profile.start.y).toBeCloseTo(0.75 * d, 12);
    expect(Math.abs(direction(first, profile.start, profile.start))).toBeCloseTo(Math.PI / 2, 9);
    for (const turn of turns(profile)) expect(turn).toBeCloseTo(0, 9);
  });

  it('is 0.6041 d long with a throat of 0.3 d; shorter where the pipe cuts the face', () => {
    expect(throat.to.x / d).toBeCloseTo(0.6041, 4);
    expect(throat.to.x - second.to.x).toBeCloseTo(0.3 * d, 12);
    for (const b of [0.68, 0.75, 0.8]) {
      const cut = sectionOf(shapeOf('isa-1932-nozzle', 1, b)).profile;
      expect(endOf(cut).x / b).toBeCloseTo(0.4041 + Math.sqrt(0.75 / b - 0.25 / b ** 2 - 0.5225), 4);
      expect(cut.start.y).toBeCloseTo(0.5, 12);
    }
  });
});

describe('long-radius nozzle (ISO 5167-3:2003, 5.2)', () => {
  it.each([
    [0.2, 0.2, (2 / 3) * 0.2],
    [0.5, 0.5, 0.25],
    [0.8, 0.5, 0.1],
  ])('ratio %d: quarter ellipse with semi-axes %d and %d of the pipe bore, throat 0.6 d', (ratio, along, across) => {
    const shape = shapeOf('long-radius-nozzle', 1, ratio, 1, 0.5);
    const { profile } = sectionOf(shape);
    expect(inletEllipse(shape)).toEqual({ along: expect.closeTo(along, 12), across: expect.closeTo(across, 12) });
    expect(profile.segments[0]?.to.x).toBeCloseTo(along, 12);
    expect(endOf(profile).x - (profile.segments[0]?.to.x ?? 0)).toBeCloseTo(0.6 * ratio, 12);
    for (const turn of turns(profile)) expect(turn).toBeCloseTo(0, 9);
  });
});

describe('Venturi tube (ISO 5167-4:2003, 5.2)', () => {
  it('has a convergent of 21 degrees, about 2.7 (D - d) long, and a throat of one d', () => {
    const { throatFrom, throatTo } = stationsOf(shapeOf('venturi-tube.machined', 1, 0.6), []);
    expect((2 * Math.atan(0.2 / throatFrom) * 180) / Math.PI).toBeCloseTo(21, 9);
    expect(throatFrom / 0.4).toBeCloseTo(2.7, 2);
    expect(throatTo - throatFrom).toBeCloseTo(0.6, 12);
  });

  it('follows the divergent angle of its dimensions: 7.15 (D - d) at 8, 3.80 (D - d) at 15 degrees', () => {
    const shape = shapeOf('venturi-tube.machined', 1, 0.6);
    const cone = (nominal: number): number => {
      const row = {
        id: 'divergent-angle',
        label: '',
        text: '',
        nominal,
        cited: { clause: '', seen: 'memory', mark: '' },
      } as const;
      const { throatTo, exit } = stationsOf(shape, [row]);
      return (exit - throatTo) / 0.4;
    };
    expect(cone(8)).toBeCloseTo(7.15, 2);
    expect(cone(15)).toBeCloseTo(3.8, 2);
  });

  it('as cast is rounded with 1.375 D and 3.625 d, and its contour does not turn sharply anywhere', () => {
    const { profile } = sectionOf(shapeOf('venturi-tube.as-cast', 1, 0.5, 0.5));
    const arcs = profile.segments.filter((segment) => segment.kind === 'arc');
    expect(arcs.map((arc) => arc.semiX)).toEqual([1.375, 3.625 * 0.5, 5]);
    for (const turn of turns(profile)) expect(turn).toBeCloseTo(0, 9);
    expect(radiusAt(profile, 0)).toBeLessThan(0.5);
  });
});
