/** The plan before the fluid is known, and the plan that a change of shape asks for. */
import { describe, expect, it } from 'vitest';
import { planForShape } from '../../../src/core/run/plan-for-shape.ts';
import { answer, rectangular, round, solved } from './sample.ts';

const planned = (traverse: unknown) => {
  const result = answer(traverse);
  return result.status === 'solved' ? undefined : result.planned;
};
const { state: _, fluid: __, ...dry } = rectangular;

describe('the plan of a traverse whose fluid is not known', () => {
  it('is that of the solved one, point by point', () => {
    const whole = solved({ ...rectangular, readings: [] });
    for (const traverse of [dry, { ...rectangular, state: {} }, { ...rectangular, fluid: { kind: 'ether' } }]) {
      const plan = planned({ ...traverse, readings: [] });
      expect(plan?.lines).toEqual(whole.lines);
      const { area_m2, hydraulicDiameter_m, points, measured, suggestions, port_m, section } = whole;
      const alike = { area_m2, hydraulicDiameter_m, points, measured, suggestions, port_m, section };
      expect(plan).toMatchObject({ ...alike, tag: 'SA-402', status: 'planned' });
    }
  });
  it('says no velocity, no flow and no check, and counts what is read', () => {
    const plan = planned(dry);
    expect(plan).toMatchObject({ measured: 25, checks: [], unchecked: [], working: [] });
    for (const key of ['flow', 'quality', 'uncertainty', 'state']) expect(plan).not.toHaveProperty(key);
    expect(plan?.lines.flatMap(({ points }) => points).some((point) => 'velocity_m_s' in point)).toBe(false);
  });
  it('leaves out readings that cannot be read, which keep their problem', () => {
    const result = answer({ ...dry, readings: [['61 Pa', '5x', '60 Pa']] });
    if (result.status === 'solved') throw new Error('expected a refusal');
    expect(result.problems.map(({ field }) => field)).toContain('readings.0.1');
    expect(result.planned?.measured).toBe(2);
  });
  it('is not there while anything else stands in the way, nor beside a result', () => {
    expect(planned({ ...dry, section: { shape: 'rectangular', width: '900 mm' } })).toBeUndefined();
    expect(planned({ ...dry, pointsPerLine: 10 })).toBeUndefined();
    expect(planned({ ...dry, probe: {} })).toBeUndefined();
    expect(planned({ ...dry, readings: [Array(6).fill('5 Pa')] })).toBeUndefined();
    expect(planned({ ...dry, state: 5 })).toBeUndefined();
    expect(planned({ ...rectangular, readings: [['5x']] })).toBeUndefined();
    expect(answer(round)).not.toHaveProperty('planned');
  });
});

describe('another shape of section', () => {
  const written = ({ rule, lines, pointsPerLine }: typeof round) => ({ rule, lines, pointsPerLine });
  const [two, five] = [
    { rule: 'log-linear', lines: 2, pointsPerLine: 6 },
    { rule: 'log-tchebycheff', lines: 5, pointsPerLine: 5 },
  ];
  it('brings the usual plan where the own one does not fit', () => {
    expect(planForShape('circular', written(rectangular))).toEqual(two);
    expect(planForShape('rectangular', written(round))).toEqual(five);
    const single = { rule: 'single-point', lines: undefined, pointsPerLine: undefined };
    expect(planForShape('rectangular', single)).toEqual(five);
    expect(planForShape('circular', { rule: 'log-linear', lines: '', pointsPerLine: '' })).toEqual(two);
    expect(planForShape('circular', { rule: 'equal-area', lines: 1.5, pointsPerLine: 6 })).toEqual(two);
    expect(planForShape('circular', { rule: 'own', lines: 'x', pointsPerLine: 6 })).toEqual(two);
  });
  it('keeps a plan that both shapes have', () => {
    expect(planForShape('circular', { rule: 'equal-area', lines: 2, pointsPerLine: '4' })).toBeUndefined();
    expect(planForShape('rectangular', { rule: 'equal-area', lines: 2, pointsPerLine: 8 })).toBeUndefined();
    const pattern = { rule: 'log-linear', lines: undefined, pointsPerLine: undefined };
    expect(planForShape('rectangular', pattern)).toBeUndefined();
    expect(planForShape('circular', { ...pattern, rule: 'single-point' })).toBeUndefined();
  });
  it('brings a plan that can be laid out', () => {
    const bare = { ...round, readings: [] };
    expect(solved({ ...bare, ...planForShape('circular', written(rectangular)) }).points).toBe(12);
    const rect = { ...rectangular, readings: [] };
    expect(solved({ ...rect, ...planForShape('rectangular', written(round)) }).points).toBe(25);
  });
});
