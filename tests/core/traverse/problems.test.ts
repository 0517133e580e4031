import fc from 'fast-check';
import { describe, expect, it, test } from 'vitest';
import type { Project, TraverseText } from '../../../src/core/document/project.ts';
import { run } from '../../../src/core/run.ts';
import { solveText } from '../../../src/views/headless/solve.ts';
import { problemSentence } from '../../../src/views/words/problems.ts';
import { rectangular, refusal, round } from './sample.ts';

describe('what is refused, where', () => {
  it.each<[string, object, string[]]>([
    ['a number of points that the rule lacks', { pointsPerLine: 5 }, ['points-not-of-rule at pointsPerLine']],
    ['no real set of nodes', { rule: 'log-tchebycheff', pointsPerLine: 18 }, ['points-not-of-rule at pointsPerLine']],
    ['a part of a line', { lines: 1.5 }, ['number-out-of-range at lines']],
    ['no count', { lines: undefined }, ['field-missing at lines']],
    ['a line too many', { readings: [[], [], ['5 Pa']] }, ['readings-too-many at readings.2']],
    ['a reading too many', { readings: [Array(7).fill('5 Pa')] }, ['readings-too-many at readings.0']],
    ['a reading without unit', { readings: [['5']] }, ['unit-missing at readings.0.0']],
    ['a length without manometer', { readings: [['', '5 mm']] }, ['manometer-missing at readings.0.1']],
    [
      'a manometer lighter than the fluid',
      { fluid: { kind: 'water' }, manometer: { liquid: { density: '800 kg/m3' } }, readings: [['5 mm']] },
      ['manometer-liquid-light at manometer.liquid'],
    ],
    [
      'a level manometer',
      { manometer: { liquid: 'water', angle: '0 deg' } },
      ['angle-out-of-range at manometer.angle'],
    ],
    ['faster than sound', { readings: [['150 kPa']] }, ['above-sonic at readings.0.0']],
    ['a probe of no kind', { probe: { kind: 'vane' } }, ['choice-unknown at probe.kind']],
    [
      'a coefficient of ten',
      { probe: { kind: 's-type', coefficient: 10 } },
      ['number-out-of-range at probe.coefficient'],
    ],
    [
      'a calibration that falls back',
      {
        probe: {
          kind: 's-type',
          calibration: [
            { velocity: '5 m/s', coefficient: 0.4 },
            { velocity: '6 m/s', coefficient: 0.8 },
          ],
        },
      },
      ['probe-calibration-order at probe.calibration.1.velocity'],
    ],
    ['a correction without its stem', { corrections: { blockage: 'stem' } }, ['field-missing at probe.stem']],
    [
      'less than nothing',
      { port: '-1 mm', straight: { before: '-2 D' } },
      ['negative at port', 'negative at straight.before'],
    ],
    [
      'a group that is none',
      { section: 5, readings: [5] },
      ['group-expected at section', 'list-expected at readings.0'],
    ],
    ['a vacuum', { state: { pressure: '-2 bar(g)', temperature: '20 degC' } }, ['not-above-vacuum at state.pressure']],
    ['a single point without profile', { rule: 'single-point' }, ['field-missing at profile.kind']],
    ['a fluid of no kind', { fluid: { kind: 'ether' } }, ['fluid-unknown at fluid.kind']],
  ])('%s', (_, change, problems) => {
    expect(refusal({ ...round, ...change })).toEqual(problems);
  });
  it('the pattern of 26 points has its own lines; one point knows no rectangle', () => {
    expect(refusal({ ...rectangular, rule: 'log-linear' })).toEqual([
      'points-not-of-rule at lines',
      'points-not-of-rule at pointsPerLine',
    ]);
    const profile = { kind: 'laminar', at: 'centre' };
    expect(refusal({ ...rectangular, rule: 'single-point', profile })).toEqual(['choice-unknown at rule']);
  });
  it('everything at once', () => {
    const problems = refusal({
      probe: {},
      fluid: {},
      state: { pressure: 'x' },
      section: { shape: 'circular' },
      port: '1',
    });
    expect(problems).toEqual([
      'field-missing at section.diameter',
      'field-missing at rule',
      'unit-missing at port',
      'field-missing at probe.kind',
      'number-unreadable at state.pressure',
    ]);
  });
  it('what is no traverse is named by its place in the list', () => {
    expect([5, null, [], 'x'].flatMap(refusal)).toEqual(Array(4).fill('group-expected at traverses.0'));
  });
});

const project = (...traverses: unknown[]) =>
  JSON.stringify({ format: 'headwright', version: 1, meters: [], traverses });

describe('the command line', () => {
  it('writes the keys of the contract; a traverse does not decide how the program ends', () => {
    const { exit, output } = solveText(
      project(round, { ...round, tag: 'bad', rule: 'x' }, { ...round, readings: [['5 Pa']] }),
    );
    expect(exit).toBe(0);
    const { traverses } = JSON.parse(output);
    const [whole, bad, begun] = traverses;
    expect(whole).toMatchObject({ tag: 'SA-401', status: 'solved', points: 12, measured: 12 });
    expect(whole.positions_m.map((line: number[]) => line.length)).toEqual([6, 6]);
    expect(whole.velocities_m_s.map((line: number[]) => line.length)).toEqual([6, 6]);
    const { meanVelocity_m_s, volumeFlow_m3_s, massFlow_kg_s, baseVolumeFlow_m3_s, state, area_m2 } = whole;
    const mean = whole.velocities_m_s.flat().reduce((sum: number, v: number) => sum + v, 0) / 12;
    expect(meanVelocity_m_s).toBeCloseTo(mean, 12);
    expect(volumeFlow_m3_s).toBeCloseTo(mean * (Math.PI / 4) * 0.36, 12);
    expect(area_m2).toBeCloseTo((Math.PI / 4) * 0.36, 14);
    expect(massFlow_kg_s).toBeCloseTo(volumeFlow_m3_s * state.density_kg_m3, 12);
    expect(baseVolumeFlow_m3_s).toBeCloseTo(massFlow_kg_s / state.baseDensity_kg_m3, 12);
    for (const { id, verdict, source, message } of whole.checks) {
      expect(id).toMatch(/^traverse-/);
      expect(verdict).toMatch(/^(inside|caution|outside)$/);
      expect(source).toMatch(/\S/);
      expect(message).toMatch(/^[A-Z].+\.$/);
    }
    expect(bad).toMatchObject({ tag: 'bad', status: 'refused', problem: { code: 'choice-unknown', field: 'rule' } });
    expect(begun).not.toHaveProperty('velocities_m_s');
    expect(begun).not.toHaveProperty('meanVelocity_m_s');
    expect(begun.read).toEqual([{ line: 1, number: 1, differential_Pa: 5, velocity_m_s: expect.any(Number) }]);
  });
  it('the base volume is absent where the fluid has none', () => {
    const steam = { ...round, fluid: { kind: 'water' }, state: { pressure: '2 bar(a)', temperature: '150 degC' } };
    expect(JSON.parse(solveText(project(steam)).output).traverses[0]).not.toHaveProperty('baseVolumeFlow_m3_s');
  });
});

type Path = readonly (string | number)[];

function placesOf(value: unknown, path: Path = []): Path[] {
  if (typeof value !== 'object' || value === null) return [path];
  const below = Object.entries(value).flatMap(([key, one]) =>
    placesOf(one, [...path, Array.isArray(value) ? Number(key) : key]),
  );
  return path.length === 0 ? below : [path, ...below];
}

function put(target: unknown, [key, ...rest]: Path, value: unknown): void {
  if (key === undefined || typeof target !== 'object' || target === null) return;
  const group = target as Record<string | number, unknown>;
  if (rest.length > 0) put(group[key], rest, value);
  else if (value === undefined) delete group[key];
  else group[key] = value;
}

const everything: TraverseText = {
  ...round,
  wallRule: 'merge',
  profile: { kind: 'power', at: 'centre', exponent: 7 },
  probe: {
    kind: 's-type',
    calibration: [{ velocity: '5 m/s', coefficient: 0.84 }],
    head: '8 mm',
    stem: '9 mm',
    hole: '2 mm',
    alignment: '1 deg',
  },
  manometer: { liquid: { density: '998 kg/m3' }, temperature: '20 degC', angle: '10 deg' },
  reference: ['5 Pa', '6 Pa'],
  nullAngle: '4 deg',
  corrections: { blockage: 'stem', turbulence: '5 %', wall: 0.99 },
  uncertainty: { reading: '1 Pa', coefficient: '1 %', density: '0.2 %', area: '0.5 %', points: '1 %' },
};
const junk = fc.oneof(
  fc.constantFrom(
    undefined,
    null,
    0,
    -1,
    1e308,
    1e-300,
    41,
    true,
    '',
    ' ',
    [],
    {},
    [null],
    [['x']],
    [[]],
    'NaN',
    '__proto__',
  ),
  fc.constantFrom(
    '5 Pa',
    '-5 Pa',
    '0 Pa',
    '1e9 bar',
    '1e-11 Pa',
    '5 mm',
    '1e9 m',
    '1e-11 mm',
    '5 D',
    '0 deg',
    '90 deg',
    '1e12 kg/m3',
  ),
  fc.constantFrom(
    'log-linear',
    'log-tchebycheff',
    'equal-area',
    'single-point',
    'rectangular',
    'merge',
    'mercury',
    'stated',
    'water',
  ),
  fc.string({ maxLength: 10 }),
);

test('whatever stands in a traverse, it is solved with finite figures or refused in words, and nothing is thrown', () => {
  const base = fc.constantFrom(everything, round, rectangular);
  fc.assert(
    fc.property(base, fc.array(fc.tuple(fc.nat(), junk), { minLength: 1, maxLength: 4 }), (good, changes) => {
      const traverse = structuredClone(good);
      const places = placesOf(good);
      for (const [at, value] of changes) put(traverse, places[at % places.length] ?? [], value);
      const { traverses } = run({ format: 'headwright', version: 1, meters: [], traverses: [traverse] } as Project);
      expect(traverses).toHaveLength(1);
      const [result] = traverses;
      if (result?.status === 'refused')
        for (const problem of result.problems) expect(problemSentence(problem)).toMatch(/^\S.+\.$/s);
      const { exit, output } = solveText(project(traverse)); // throws at a number that is not finite
      expect(exit).toBe(0);
      expect(output).not.toMatch(/: (null|NaN|-?Infinity)|undefined/);
    }),
    { numRuns: 500 },
  );
});
