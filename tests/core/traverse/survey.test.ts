import { describe, expect, it } from 'vitest';
import type { TraverseText } from '../../../src/core/document/project.ts';
import { evaluate } from '../../../src/views/present/evaluate.ts';
import { parseFormula } from '../../../src/views/present/formula.ts';
import { answer, filled, flowOf, rectangular, round, solved, stated } from './sample.ts';

const plans: readonly (readonly [string, TraverseText])[] = [
  ['log-linear, round', round],
  ['log-Tchebycheff, round', { ...round, rule: 'log-tchebycheff', lines: 3, pointsPerLine: 10 }],
  ['equal area, round', { ...round, rule: 'equal-area', pointsPerLine: 12 }],
  ['log-Tchebycheff, rectangular', rectangular],
  ['equal area, rectangular', { ...rectangular, rule: 'equal-area', lines: 4, pointsPerLine: 3 }],
  ['log-linear, 26 points', { ...rectangular, rule: 'log-linear', lines: 4, pointsPerLine: 7 }],
];

describe.each(plans)('%s', (_, plan) => {
  const blank = solved({ ...plan, readings: [] });
  it('has weights that sum to one, and points that lie in the duct, alike from both walls', () => {
    const weights = blank.lines.flatMap(({ points }) => points.map(({ weight }) => weight));
    expect(weights.reduce((sum, weight) => sum + weight, 0)).toBeCloseTo(1, 14);
    const reach = blank.section.shape === 'circular' ? blank.section.diameter_m : blank.section.height_m;
    for (const { points } of blank.lines) {
      const places = points.map(({ position_m }) => position_m);
      expect(places).toEqual([...places].sort((one, other) => one - other));
      places.forEach((place, at) => {
        expect(place + (places.at(-1 - at) ?? 0)).toBeCloseTo(reach, 13);
      });
    }
  });
  it('gives area times velocity for a uniform profile', () => {
    const { meanVelocity_m_s, volumeFlow_m3_s } = flowOf(filled({ ...plan, fluid: stated(1.25) }, () => '10 Pa'));
    expect(meanVelocity_m_s).toBeCloseTo(4, 13); // sqrt(2 * 10 / 1.25)
    expect(volumeFlow_m3_s).toBeCloseTo(4 * blank.area_m2, 13);
  });
  it('is not moved by measuring from the other wall', () => {
    const slanted = filled(plan, (at, line) => `${50 + 100 * at + line} Pa`);
    const mirrored = { ...slanted, readings: slanted.readings?.map((line) => [...line].reverse()) };
    expect(flowOf(mirrored).meanVelocity_m_s).toBeCloseTo(flowOf(slanted).meanVelocity_m_s, 12);
  });
});

describe('laws', () => {
  it('turning the diameters about leaves the mean alone', () => {
    const turned = { ...round, readings: [...(round.readings ?? [])].reverse() };
    expect(flowOf(turned).meanVelocity_m_s).toBeCloseTo(flowOf(round).meanVelocity_m_s, 12);
  });
  it('the unit of a reading does not matter', () => {
    const inches = filled(round, () => '0.3 inH2O');
    const millimetres = filled(round, () => '7.62 mmH2O');
    expect(flowOf(inches).massFlow_kg_s).toBeCloseTo(flowOf(millimetres).massFlow_kg_s, 13);
  });
  it.each([2, 4, 9])('%s times the density: the root of it in velocity and in mass flow', (times) => {
    const [one, other] = [stated(1.2), stated(1.2 * times)].map((fluid) => flowOf({ ...round, fluid }));
    expect((one?.meanVelocity_m_s ?? 0) / (other?.meanVelocity_m_s ?? 1)).toBeCloseTo(Math.sqrt(times), 12);
    expect((other?.massFlow_kg_s ?? 0) / (one?.massFlow_kg_s ?? 1)).toBeCloseTo(Math.sqrt(times), 12);
  });
  it('twice the diameter: four times the flow', () => {
    const wide = flowOf({ ...round, section: { shape: 'circular', diameter: '1200 mm' } });
    expect(wide.volumeFlow_m3_s / flowOf(round).volumeFlow_m3_s).toBeCloseTo(4, 12);
  });
  it('a gas tends to a liquid as the reading falls, and its velocity is the smaller', () => {
    const share = (reading: string) => {
      const [gas, liquid] = [stated(1.2, 1.4), stated(1.2)].map((fluid) =>
        flowOf(filled({ ...round, fluid }, () => reading)),
      );
      return (gas?.meanVelocity_m_s ?? 0) / (liquid?.meanVelocity_m_s ?? 1);
    };
    expect(share('1 Pa')).toBeCloseTo(1, 5);
    expect(1 - share('100 Pa')).toBeCloseTo(100 / 101575 / 5.6, 6); // half of x / (2 κ), the next term is 1e-7
    expect(share('5 kPa')).toBeLessThan(share('1 kPa'));
  });
  it('the ports may be on either side of a rectangle', () => {
    const other = { ...rectangular, section: { ...rectangular.section, ports: 'height' } };
    const [across] = solved({ ...other, readings: [] }).lines;
    expect(across?.points.at(-1)?.position_m).toBeGreaterThan(0.8);
    const uniform = (plan: TraverseText) => flowOf(filled(plan, () => '80 Pa')).volumeFlow_m3_s;
    expect(uniform(other)).toBeCloseTo(uniform(rectangular), 12);
  });
});

describe('a traverse as it is read', () => {
  it('blank: its plan, depths and suggestions, no flow', () => {
    const blank = solved({ ...round, readings: [] });
    expect(blank).not.toHaveProperty('flow');
    expect(blank).not.toHaveProperty('quality');
    expect([blank.points, blank.measured]).toEqual([12, 0]);
    for (const { position_m, depth_m } of blank.lines.flatMap(({ points }) => points))
      expect(depth_m).toBeCloseTo(position_m + 0.04, 15);
    expect(blank.lines[1]?.angle_rad).toBeCloseTo(Math.PI / 2, 15);
    expect(blank.lines.flatMap(({ points }) => points.map(({ number }) => number))).toEqual(
      Array.from({ length: 12 }, (_, at) => at + 1),
    );
  });
  it('half: velocities where it is read, the mean of a whole line, no flow', () => {
    const half = solved({ ...round, readings: [round.readings?.[0] ?? [], ['', '70 Pa']] });
    expect(half).not.toHaveProperty('flow');
    expect(half.measured).toBe(7);
    expect(half.lines[0]?.meanVelocity_m_s).toBeGreaterThan(10);
    expect(half.lines[1]).not.toHaveProperty('meanVelocity_m_s');
    expect(half.lines[1]?.points.map(({ velocity_m_s }) => velocity_m_s !== undefined)).toEqual([
      false,
      true,
      false,
      false,
      false,
      false,
    ]);
    expect(half.quality?.strongReadings_percent).toBe(100);
  });
  it('whole: quality of the readings', () => {
    const { quality } = solved({ ...round, reference: ['80 Pa', '81 Pa', '80 Pa'] });
    expect(quality).toMatchObject({ strongReadings_percent: 100, reversedReadings: 0, stillReadings: 0 });
    expect(quality?.drift_percent).toBeCloseTo((100 * (9 - Math.sqrt(80))) / ((9 + 2 * Math.sqrt(80)) / 3), 9);
    // A quarter of the relative variance of the readings is the variance of the roots; half of that is the error.
    const cv = (quality?.scatter_percent ?? 0) / 100;
    expect((quality?.differentialAveraging_percent ?? 0) / 100).toBeCloseTo(Math.sqrt(1 + cv ** 2) - 1, 5);
  });
  it('a reading at or below zero counts as no velocity', () => {
    const { lines, quality, checks } = solved({
      ...round,
      readings: [['-5 Pa', '0 Pa', '80 Pa', '8 Pa', '9 Pa', '70 Pa']],
    });
    expect(lines[0]?.points.slice(0, 2).map(({ velocity_m_s }) => velocity_m_s)).toEqual([0, 0]);
    expect(quality).toMatchObject({ reversedReadings: 1, stillReadings: 1 });
    expect(quality?.strongReadings_percent).toBeCloseTo(50, 12); // 80, 9 and 70 of six; 8 is a tenth, not above it
    expect(checks.find(({ id }) => id === 'traverse-reversed')?.verdict).toBe('outside');
  });
  it('a site that stands in the file is used: gauge pressure and gravity', () => {
    const high = { site: { atmosphere: '80 kPa(a)' } };
    expect(solved(round, high).state.pressure_Pa).toBe(80250);
    expect(flowOf(round, high).meanVelocity_m_s).toBeGreaterThan(flowOf(round).meanVelocity_m_s);
  });
});

describe('probe and corrections', () => {
  const mean = (change: object) => flowOf({ ...round, ...change }).meanVelocity_m_s;
  const plain = mean({});
  it('a coefficient scales the velocity', () =>
    expect(mean({ probe: { kind: 's-type', coefficient: 0.84 } }) / plain).toBeCloseTo(0.84, 13));
  it('an S-type without one is taken as 0.84, and that is said', () => {
    const usual = solved({ ...round, probe: { kind: 's-type' } });
    expect((usual.flow?.meanVelocity_m_s ?? 0) / plain).toBeCloseTo(0.84, 13);
    expect(usual.checks.find(({ id }) => id === 'traverse-usual-coefficient')).toMatchObject({
      verdict: 'caution',
      value: 0.84,
    });
  });
  it('a calibration is met at its rows, linear in velocity between them and held beyond', () => {
    const calibration = [
      { velocity: '5 m/s', coefficient: 0.8 },
      { velocity: '10 m/s', coefficient: 0.85 },
    ];
    const at = (indicated: number) =>
      flowOf(
        filled({ ...round, fluid: stated(2), probe: { kind: 's-type', calibration } }, () => `${indicated ** 2} Pa`),
      ).meanVelocity_m_s;
    expect(at(5 / 0.8)).toBeCloseTo(5, 12);
    expect(at(10 / 0.85)).toBeCloseTo(10, 12);
    expect(at(7.5 / 0.825)).toBeCloseTo(7.5, 12);
    expect(at(2)).toBeCloseTo(1.6, 12);
    expect(at(20)).toBeCloseTo(17, 12);
  });
  it('turbulence of 10 % takes half a per cent off', () =>
    expect(mean({ corrections: { turbulence: '10 %' } }) / plain).toBeCloseTo(1 / Math.sqrt(1.01), 13));
  it('the factor of the wall zone scales the mean', () =>
    expect(mean({ corrections: { wall: 0.995 } }) / plain).toBeCloseTo(0.995, 13));
  it('the stem takes seven tenths of its share of the section off, point by point', () => {
    const probe = { kind: 'pitot-static', coefficient: 1, stem: '10 mm' };
    const [without, corrected] = [{}, { blockage: 'stem' }].map((corrections) =>
      solved({ ...round, probe, corrections }),
    );
    const last = (result: typeof without) => result?.lines[0]?.points.at(-1);
    const share = (0.01 * (last(without)?.position_m ?? 0)) / (without?.area_m2 ?? 1);
    expect((last(corrected)?.velocity_m_s ?? 0) / (last(without)?.velocity_m_s ?? 1)).toBeCloseTo(1 - 0.7 * share, 13);
  });
  it('a length is read on the manometer that is described', () => {
    const fluid = stated(1.2);
    const water = { liquid: { density: '998 kg/m3' } };
    const upright = flowOf(filled({ ...round, fluid, manometer: water }, () => '8 mm'));
    const inclined = flowOf(filled({ ...round, fluid, manometer: { ...water, angle: '30 deg' } }, () => '16 mm'));
    const pressure = flowOf(filled({ ...round, fluid }, () => `${(998 - 1.2) * 9.80665 * 0.008} Pa`));
    expect(upright.meanVelocity_m_s).toBeCloseTo(pressure.meanVelocity_m_s, 12);
    expect(inclined.meanVelocity_m_s).toBeCloseTo(upright.meanVelocity_m_s, 12);
  });
  it('mercury and water have their densities at the temperature of the manometer', () => {
    const at = (liquid: string, temperature: string) =>
      flowOf(filled({ ...round, fluid: stated(1.2), manometer: { liquid, temperature } }, () => '9 mm'))
        .meanVelocity_m_s ** 2;
    expect(at('mercury', '0 degC') / at('water', '20 degC')).toBeCloseTo((13595.08 - 1.2) / (998.2 - 1.2), 2);
  });
});

describe('one point for all', () => {
  const point = (profile: object) => ({
    ...round,
    rule: 'single-point',
    profile,
    fluid: stated(1.25),
    readings: [['10 Pa']],
  });
  it('at the centre it counts by the ratio of the profile', () => {
    expect(flowOf(point({ kind: 'laminar', at: 'centre' })).meanVelocity_m_s).toBeCloseTo(2, 13);
    expect(flowOf(point({ kind: 'power', at: 'centre' })).meanVelocity_m_s).toBeCloseTo((4 * 49) / 60, 13);
    expect(flowOf(point({ kind: 'stated', meanOverCentre: 0.82 })).meanVelocity_m_s).toBeCloseTo(3.28, 13);
  });
  it('at the mean velocity it counts in full, and there it lies', () => {
    const result = solved(point({ kind: 'laminar', at: 'mean-velocity' }));
    expect(result.flow?.meanVelocity_m_s).toBeCloseTo(4, 13);
    expect(result.lines[0]?.points[0]?.position_m).toBeCloseTo(0.3 * (1 - Math.SQRT1_2), 13);
  });
});

describe('points near the wall', () => {
  const small = {
    ...round,
    section: { shape: 'circular', diameter: '350 mm' },
    rule: 'equal-area',
    pointsPerLine: 20,
    readings: [],
  };
  const places = (wallRule: string) =>
    solved({ ...small, wallRule }).lines[0]?.points.map(({ position_m, weight }) => [position_m, weight] as const) ??
    [];
  it('are left, moved to the distance, or moved and merged', () => {
    expect(places('leave')[0]?.[0]).toBeCloseTo(0.35 * 0.01266028, 8); // printed to eight decimals
    expect(places('move').slice(0, 2)).toEqual([
      [0.013, 1 / 40],
      [0.35 * ((1 - Math.sqrt(0.85)) / 2), 1 / 40].map((value) => expect.closeTo(value, 14)),
    ]);
    const near = solved({
      ...small,
      probe: { kind: 'pitot-static', coefficient: 1, head: '15 mm' },
      wallRule: 'merge',
    });
    expect(near.lines[0]?.points).toHaveLength(18);
    expect(near.lines[0]?.points[0]).toMatchObject({
      position_m: 0.015,
      weight: expect.closeTo(2 / 40, 15),
      moved: true,
    });
    const weights = near.lines.flatMap(({ points }) => points.map(({ weight }) => weight));
    expect(weights.reduce((sum, one) => sum + one, 0)).toBeCloseTo(1, 14);
  });
  it('and the check says so', () => {
    const verdict = (wallRule: string) =>
      solved({ ...small, wallRule }).checks.find(({ id }) => id === 'traverse-wall-distance')?.verdict;
    expect([verdict('leave'), verdict('move'), verdict('merge')]).toEqual(['outside', 'inside', 'inside']);
  });
});

describe('the working', () => {
  it.each([
    ['gas', round],
    ['liquid', { ...round, fluid: stated(900), corrections: { wall: 0.99 } }],
    ['half', { ...round, readings: [['20 Pa']] }],
  ])('%s: every formula gives its figure', (_, traverse) => {
    const lines = solved(traverse).working.filter(({ formula }) => formula !== undefined);
    expect(lines.some(({ id }) => id === 'traverse-velocity')).toBe(true);
    for (const { id, formula = '', given, value } of lines) {
      const put = evaluate(parseFormula(formula), Object.fromEntries(given.map((one) => [one.symbol, one.value])));
      expect(Math.abs(put / value - 1), id).toBeLessThan(1e-11);
    }
  });
  it('a clean traverse has nothing outside and nothing to be careful of', () => {
    const { checks } = solved({ ...round, probe: { ...round.probe, alignment: '2 deg' }, nullAngle: '5 deg' });
    expect(checks.filter(({ verdict }) => verdict !== 'inside')).toEqual([]);
    expect(checks.length).toBeGreaterThan(8);
  });
  it('a traverse without a tag is named by its place', () => expect(answer({ ...round, tag: '' }).tag).toBe('#1'));
});
