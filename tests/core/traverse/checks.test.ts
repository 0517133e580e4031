import { describe, expect, it } from 'vitest';
import { filled, rectangular, round, solved, stated } from './sample.ts';

const find = (traverse: object, id: string) => solved(traverse).checks.find((finding) => finding.id === id);
const verdict = (traverse: object, id: string) => find(traverse, id)?.verdict;

describe('the plane', () => {
  it.each([
    ['log-linear', '20 D', '5 D', 'inside', 'inside'],
    ['log-linear', '19.9 D', '4.9 D', 'caution', 'caution'],
    ['log-linear', '7.4 D', '2.9 D', 'outside', 'outside'],
    ['equal-area', '8 D', '2 D', 'inside', 'inside'],
    ['equal-area', '2 D', '0.5 D', 'caution', 'caution'],
    ['equal-area', '1.9 D', '0.4 D', 'outside', 'outside'],
  ])('%s, %s before and %s after: %s, %s', (rule, before, after, first, second) => {
    const traverse = { ...round, rule, straight: { before, after } };
    expect(verdict(traverse, 'traverse-straight-before')).toBe(first);
    expect(verdict(traverse, 'traverse-straight-after')).toBe(second);
  });
  it('a length counts in hydraulic diameters: 4 A / P of 900 by 600 is 720 mm', () => {
    const traverse = { ...rectangular, straight: { before: '14.4 m' } };
    expect(solved(traverse).hydraulicDiameter_m).toBeCloseTo(0.72, 14);
    expect(find(traverse, 'traverse-straight-before')).toMatchObject({
      value: expect.closeTo(20, 12),
      verdict: 'inside',
    });
    expect(find(traverse, 'traverse-straight-after')).toBeUndefined();
  });
  it('swirl of more than 20 degrees', () => {
    expect(verdict({ ...round, nullAngle: '20 deg' }, 'traverse-swirl')).toBe('inside');
    expect(verdict({ ...round, nullAngle: '21 deg' }, 'traverse-swirl')).toBe('outside');
  });
  it('too few points', () => {
    expect(verdict({ ...round, lines: 1, readings: [] }, 'traverse-point-count')).toBe('outside');
    expect(verdict({ ...rectangular, lines: 4, readings: [] }, 'traverse-point-count')).toBe('outside');
    expect(verdict(rectangular, 'traverse-point-count')).toBe('inside');
  });
});

describe('the probe', () => {
  const probe = { kind: 'pitot-static', coefficient: 1 };
  it.each([
    ['head', '12 mm', 'traverse-head-size', 'inside'],
    ['head', '12.1 mm', 'traverse-head-size', 'outside'],
    ['alignment', '3 deg', 'traverse-alignment', 'inside'],
    ['alignment', '3.1 deg', 'traverse-alignment', 'outside'],
    ['stem', '4 mm', 'traverse-stem-blockage', 'inside'],
    ['stem', '6 mm', 'traverse-stem-blockage', 'caution'],
    ['stem', '12 mm', 'traverse-stem-blockage', 'outside'],
    ['hole', '2 mm', 'traverse-hole-reynolds', 'inside'],
    ['hole', '0.2 mm', 'traverse-hole-reynolds', 'outside'],
  ])('%s of %s: %s %s', (key, size, id, expected) => {
    expect(verdict({ ...round, probe: { ...probe, [key]: size } }, id)).toBe(expected);
  });
  it('a head of 12 mm keeps 12 mm from the wall; the first of six points is at 19 mm of 600', () => {
    expect(verdict({ ...round, probe: { ...probe, head: '19 mm' } }, 'traverse-wall-distance')).toBe('inside');
    expect(verdict({ ...round, probe: { ...probe, head: '20 mm' } }, 'traverse-wall-distance')).toBe('outside');
  });
});

describe('the readings', () => {
  it('weak ones: three quarters must be above a tenth of the largest', () => {
    const share = (weak: number) =>
      filled(round, () => '80 Pa').readings?.map((line, at) =>
        line.map((text, point) => (6 * at + point < weak ? '8 Pa' : text)),
      );
    expect(verdict({ ...round, readings: share(3) }, 'traverse-weak-readings')).toBe('inside');
    expect(verdict({ ...round, readings: share(4) }, 'traverse-weak-readings')).toBe('outside');
  });
  it('slow ones, of a gas only', () => {
    const slow = filled(round, () => '5 Pa');
    expect(verdict(slow, 'traverse-slow')).toBe('caution');
    expect(verdict({ ...slow, fluid: stated(1000) }, 'traverse-slow')).toBeUndefined();
  });
  it('fast ones: a Mach number above a quarter', () => {
    const mach = (reading: string) =>
      find(
        filled({ ...round, fluid: stated(1.2, 1.4) }, () => reading),
        'traverse-mach',
      );
    expect(mach('4 kPa')?.verdict).toBe('inside');
    expect(mach('5 kPa')?.verdict).toBe('outside');
    // Stagnation over static pressure at M 0.25 in air is 1.04442 (NACA Report 1135, Table I).
    expect(mach(`${101575 * 0.04442} Pa`)?.value).toBeCloseTo(0.25, 4);
  });
  it('a coarse gauge: at 1.27 mmH2O the ratio is the root of 1.1', () => {
    const t = (reading: string) =>
      find(
        filled({ ...round, rule: 'equal-area' }, () => reading),
        'traverse-gauge',
      );
    expect(t('1.27 mmH2O')).toMatchObject({ value: expect.closeTo(Math.sqrt(1.1), 12), verdict: 'inside' });
    expect(t('1.2 mmH2O')?.verdict).toBe('outside');
  });
  it('drift at the reference probe', () => {
    expect(verdict({ ...round, reference: ['80 Pa', '82 Pa'] }, 'traverse-drift')).toBe('inside');
    expect(verdict({ ...round, reference: ['80 Pa', '90 Pa'] }, 'traverse-drift')).toBe('caution');
    expect(verdict({ ...round, reference: ['80 Pa'] }, 'traverse-drift')).toBeUndefined();
  });
  it('what the fluid itself is unsure of is said too', () => {
    const cold = { ...round, state: { pressure: '250 Pa(g)', temperature: '-70 degC' }, fluid: { kind: 'air' } };
    const said = solved(cold).checks.filter(({ id }) => !id.startsWith('traverse-'));
    expect(said.every(({ assumption }) => assumption === 'one-phase')).toBe(true);
  });
});

describe('the uncertainty', () => {
  const percent = (traverse: object, name: string) =>
    solved(traverse).uncertainty?.terms.find((term) => term.name === name)?.percentOfFlow;
  it('a share of the reading is half of it in flow', () =>
    expect(percent({ ...round, uncertainty: { reading: '1 % of reading' } }, 'reading')).toBeCloseTo(0.5, 12));
  it('pascals weigh more the weaker the readings are', () => {
    const at = (reading: string) =>
      percent({ ...filled(round, () => reading), uncertainty: { reading: '1 Pa' } }, 'reading') ?? 0;
    expect(at('50 Pa')).toBeCloseTo(1, 12);
    expect(at('10 Pa')).toBeCloseTo(5, 12);
  });
  it('a reading of nothing keeps it finite', () => {
    const [first = [], second = []] = round.readings ?? [];
    const readings = [['0 Pa', ...first.slice(1)], second];
    expect(percent({ ...round, readings, uncertainty: { reading: '1 Pa' } }, 'reading')).toBeGreaterThan(0);
  });
  it('the terms add in squares', () => {
    const stated = { coefficient: '1 %', density: '2 %', area: '2 %', points: '2 %' };
    const { uncertainty } = solved({ ...round, uncertainty: stated });
    expect(uncertainty?.expanded_percent).toBeCloseTo(Math.sqrt(1 + 1 + 4 + 4), 12);
    expect(uncertainty?.terms.map(({ name, stated: said }) => [name, said])).toEqual([
      ['reading', false],
      ['coefficient', true],
      ['density', true],
      ['area', true],
      ['points', true],
    ]);
  });
  it('where nothing is said of the points: the error of the rule on a 1/7-power profile', () => {
    const even = filled(round, () => '50 Pa');
    expect(percent(even, 'points')).toBeCloseTo(0.2702, 4); // 3 on a radius, log-linear
    expect(percent(round, 'points')).toBeGreaterThan(0.2702);
  });
});

describe('numbers of points that are asked for', () => {
  const of = (section: object, straight: object = {}) =>
    solved({
      ...rectangular,
      section,
      straight,
      rule: 'equal-area',
      lines: 2,
      pointsPerLine: 2,
      readings: [],
    }).suggestions.map(
      ({ practice, rule, lines, pointsPerLine }) => `${practice}: ${rule} ${lines} x ${pointsPerLine}`,
    );
  const circle = (diameter: string) => ({ shape: 'circular', diameter });
  it.each([
    ['1 m', { before: '8 D', after: '2 D' }, '2 x 6'],
    ['1 m', { before: '8 D', after: '1.75 D' }, '2 x 8'],
    ['1 m', { before: '6 D', after: '2 D' }, '2 x 10'],
    ['1 m', { before: '5 D', after: '2 D' }, '2 x 12'],
    ['1 m', {}, '2 x 12'],
    ['0.5 m', { before: '8 D', after: '2 D' }, '2 x 4'],
  ])('Method 1, a stack of %s', (diameter, straight, expected) =>
    expect(of(circle(diameter), straight)).toContain(`epa-method-1: equal-area ${expected}`),
  );
  it('Method 1 in a rectangle, and not in a small duct', () => {
    const section = { shape: 'rectangular', width: '1 m', height: '0.5 m' };
    expect(of(section, { before: '7 D', after: '2 D' })).toContain('epa-method-1: equal-area 4 x 4');
    expect(of({ ...section, width: '600 mm' }, { before: '8 D', after: '2 D' })).toContain(
      'epa-method-1: equal-area 3 x 3',
    );
    expect(of(circle('290 mm')).some((text) => text.startsWith('epa'))).toBe(false);
  });
  it('air balancing by the sides: 5 below 762 mm, 6 below 914 mm, 7 above', () => {
    const sides = (width: string, height: string) => of({ shape: 'rectangular', width, height });
    expect(sides('761 mm', '763 mm')).toContain('air-balancing: log-tchebycheff 5 x 6');
    expect(sides('913 mm', '915 mm')).toContain('air-balancing: log-tchebycheff 6 x 7');
  });
  it('and each of them can be measured', () => {
    for (const [section, straight] of [
      [{ shape: 'circular', diameter: '800 mm' }, {}],
      [
        { shape: 'rectangular', width: '1 m', height: '800 mm' },
        { before: '6 D', after: '2 D' },
      ],
    ])
      for (const { rule, lines, pointsPerLine } of solved({
        ...rectangular,
        section,
        straight,
        readings: [],
        lines: 5,
        pointsPerLine: section === undefined ? 5 : 6,
        rule: 'equal-area',
      }).suggestions)
        expect(solved({ ...rectangular, section, rule, lines, pointsPerLine, readings: [] }).points).toBe(
          lines * pointsPerLine,
        );
  });
});
