/** Between a log and its meter: what fits, and what is refused with which reason. */
import { describe, expect, test } from 'vitest';
import type { MeterText } from '../../../src/core/document/project.ts';
import { planLog } from '../../../src/core/log/look.ts';
import { logOf, projectOf, steamMeter } from './example.ts';

const bytes = logOf(['2026-03-14T00:00:00Z,12,39,400', '2026-03-14T00:00:01Z,12.1,39,400']);
const planned = (more: Partial<MeterText>) => {
  const meter = { ...steamMeter, ...more };
  return planLog({ meter, index: 0, project: projectOf(meter) }, { first: bytes, complete: true });
};
const instrument = (more: object): Partial<MeterText> => ({
  instrument: { ...(steamMeter.instrument as object), ...more },
});
const log = (more: object): Partial<MeterText> => ({ log: { ...(steamMeter.log as object), ...more } });

/** Codes and fields of the problems. */
const refused = (more: Partial<MeterText>): string[] => {
  const plan = planned(more);
  return plan.ok ? [] : plan.problems.map(({ code, field }) => `${code} at ${field}`);
};

test('limits stand in the unit of the column, to the digit that people write', () => {
  const plan = planned({});
  if (!plan.ok) throw new Error(JSON.stringify(plan.problems));
  expect(plan.value.faults.signal).toMatchObject({
    ends: { zero: 4, full: 20 },
    limits: { failLow: 3.6, low: 3.8, high: 20.5, failHigh: 21 },
  });
  expect(plan.value.faults.cutOff).toBeCloseTo(0.03 ** 2 * 60_000, 9);
});

test('the cut-off of the log goes before that of the transmitter', () => {
  const plan = planned(log({ cutOff: '2 mbar' }));
  expect(plan.ok && plan.value.faults.cutOff).toBe(200);
});

describe('is refused', () => {
  test.each<[string, Partial<MeterText>, string]>([
    [
      'a signal of no transmitter',
      { instrument: { kind: 'differential' } },
      'log-transmitter-missing at instrument.kind',
    ],
    ['a signal of another kind', instrument({ signal: '1-5 V' }), 'log-signal-unlike at log.signal.unit'],
    ['a transmitter without a range', instrument({ upper: '' }), 'field-missing at instrument.upper'],
    ['legs that weigh', instrument({ above: 'water', rise: '1 m' }), 'log-legs at instrument.above'],
    ['a day that begins at no hour', log({ dayStart: '25:00' }), 'log-day-start at log.dayStart'],
    ['a fluid that is none', { fluid: { kind: 'ether' } }, 'fluid-unknown at fluid.kind'],
  ])('%s', (_what, more, expected) => expect(refused(more)).toContain(expected));
});

test('legs of one liquid between tappings at one level weigh nothing', () => {
  expect(refused(instrument({ above: 'water' }))).toEqual([]);
});
