/** A log as it is presented: a real conversion of a small one, its first rows, its questions, its tables and its chart. */
import { describe, expect, it } from 'vitest';
import { emptyProject } from '../../../src/core/document/codec.ts';
import type { MeterText, Project } from '../../../src/core/document/project.ts';
import type { LogText } from '../../../src/core/document/v/1-log.ts';
import { openLog } from '../../../src/core/log/log.ts';
import { lookAt, planLog } from '../../../src/core/log/look.ts';
import { solveMeter } from '../../../src/core/run.ts';
import { bytesText } from '../../../src/views/present/bytes.ts';
import { inputsHash } from '../../../src/views/present/hash.ts';
import { presentLog } from '../../../src/views/present/log.ts';
import { presentLook } from '../../../src/views/present/log-look.ts';
import { presentProgress } from '../../../src/views/present/log-progress.ts';
import { feedWater } from './meters.ts';

const columns = {
  time: 'time',
  differential: { column: 'dp', unit: 'mbar' },
  pressure: { column: 'p', unit: 'bar(g)' },
  maxGap: '5 s',
};
const meterWith = (log: LogText): MeterText => ({ ...feedWater, log });
const project: Project = { ...emptyProject(), title: 'Tern Island works' };
const bytes = (lines: readonly string[]): Uint8Array => new TextEncoder().encode(`${lines.join('\n')}\n`);
const stamp = (second: number): string => new Date(Date.UTC(2026, 2, 14, 23, 59, 50) + 1000 * second).toISOString();

/** Twenty seconds across midnight: a negative differential, an unreadable one, a missing pressure, a gap of eight. */
const lines = ['time,dp,p'];
for (let second = 0; second < 20; second += 1) {
  if (second >= 12) break;
  const dp = second === 3 ? '-1.5' : second === 5 ? 'Bad Input' : `${100 + second}`;
  lines.push(`${stamp(second)},${dp},${second === 7 ? '' : '7.0'}`);
}
lines.push(`${stamp(20)},100,7.0`, `${stamp(21)},100,7.0`);

const text = bytes(lines);

function converted(log: LogText = columns, display: 'SI' | 'US' = 'SI', stale = false) {
  const meter = meterWith(log);
  const plan = planLog({ meter, index: 0, project }, { first: text, complete: true });
  if (!plan.ok) throw new Error(`expected a plan, got ${JSON.stringify(plan.problems)}`);
  const running = openLog(plan.value, () => undefined);
  running.push(text);
  const record = running.finish();
  const result = solveMeter(meter, 0, project);
  const shown = { ...project, display };
  const presented = presentLog({ record, meter, project: shown, result, name: 'night.csv', seconds: 0.25, stale });
  return { record, meter, presented };
}

const plainOf = (
  rows: readonly { readonly id: string; readonly value: { readonly text: string } }[],
  id: string,
): string => rows.find((row) => row.id === id)?.value.text ?? '';

describe('a converted log', () => {
  const { record, meter, presented } = converted();

  it('says in one sentence what passed', () => {
    const said = presented.answer.map(({ text: part }) => part).join('');
    expect(said).toMatch(
      /^[\d.]+\u00a0kg passed between 2026-03-14\u00a023:59:50 and 2026-03-15\u00a000:00:11, [\d.]+\u00a0t\/h in the mean\.$/,
    );
    expect(presented.answer.filter(({ role }) => role === 'found')).toHaveLength(2);
  });

  it('accounts for every row, the first of each told with its moment or its text', () => {
    expect(presented.account).toBe('14 rows in 0.25\u00a0s: 12 converted, 1 of them with a remark, 2 not converted.');
    const rows = presented.reasons.map(({ code, rows: count, first }) => [code, count.si, first]);
    expect(rows).toEqual([
      ['converted', 11, []],
      ['differential-negative', 1, ['4 (2026-03-14\u00a023:59:53)']],
      ['pressure-missing', 1, ['8 (2026-03-14\u00a023:59:57)']],
      ['signal-unreadable', 1, [`6 (‘${stamp(5)},Bad Input,7.0’)`]],
    ]);
    expect(presented.reasons.reduce((sum, one) => sum + one.rows.si, 0)).toBe(record.rows);
    expect(presented.share).toBe('85.7\u00a0% of the rows converted');
  });

  it('prints totals with the gap beside them, and means with the error of rooting', () => {
    expect(plainOf(presented.totals, 'mass')).toBe(`${Number(record.total_kg.toPrecision(6))}\u00a0kg`);
    expect(plainOf(presented.totals, 'gaps')).toBe('9\u00a0s');
    expect(presented.totals.find(({ id }) => id === 'gaps')?.note).toContain('from 2026-03-15\u00a000:00:01');
    expect(presented.means.map(({ id }) => id)).toEqual(['mean', 'differential', 'pressure', 'temperature', 'rooting']);
  });

  it('has a row for each day and for each extreme', () => {
    expect(presented.days.map(({ date }) => date)).toEqual(['2026-03-14', '2026-03-15']);
    const mass = presented.days.reduce((sum, day) => sum + day.mass.si, 0);
    expect(Math.abs(mass - record.total_kg)).toBeLessThan(1e-9);
    expect(presented.extremes.find(({ key }) => key === 'differential')?.mostAt).toBe('2026-03-15\u00a000:00:01');
  });

  it('draws the flow with the gap left open and marks on whole steps of the clock', () => {
    const { points, ticks, unit } = presented.chart;
    expect(points.filter(({ flow }) => flow === undefined)).toHaveLength(1);
    expect(unit).toBe('t/h');
    expect(ticks.length).toBeGreaterThan(2);
    for (const { time, label } of ticks) {
      expect(time % 5).toBe(0);
      expect(label === '2026-03-15' || label === stampClock(time)).toBe(true);
    }
  });

  it('says how it was made, with the fingerprint of the inputs', () => {
    const said = new Map(presented.configuration.map(({ label, text: value }) => [label, value]));
    expect([said.get('Log'), said.get('Longest interval bridged'), said.get('Time zone')]).toEqual([
      'night.csv',
      '5\u00a0s',
      'UTC, taken, not stated',
    ]);
    expect(said.get('Column of the differential')).toBe('dp');
    expect(presented.head.status).toContain(inputsHash(meter, project));
    expect(presented.head.warning).toBe('');
    expect(converted(columns, 'SI', true).presented.head.warning).not.toBe('');
  });

  it('is shown in the units of the display', () => {
    const us = converted(columns, 'US').presented;
    expect(plainOf(us.totals, 'mass')).toMatch(/\u00a0lb$/);
    expect(us.chart.unit).toBe('lb/h');
  });
});

const stampClock = (time: number): string => new Date(time * 1000).toISOString().slice(11, 19);

describe('the first rows', () => {
  const look = (log: LogText, written: Uint8Array = text) => {
    const meter = meterWith(log);
    const found = lookAt({ meter, index: 0, project }, { first: written, complete: true });
    if (found === undefined) throw new Error('expected a look, got none');
    return presentLook(found, meter, project);
  };

  it('show each cell as it is written and as it is read', () => {
    const { rows, roles, decided, spelling, problems } = look(columns);
    expect(roles).toEqual({ 0: 'time', 1: 'differential', 2: 'pressure' });
    expect(rows[0]?.cells[1]).toEqual({ text: '100', read: '100.0\u00a0mbar' });
    expect(rows[0]?.cells[0]?.read).toBe('2026-03-14\u00a023:59:50');
    expect(rows[5]?.trouble).toBe('Signal unreadable');
    expect(rows[7]?.cells[2]).toEqual({ text: '' });
    expect(decided.time).toMatch(/^year, month, day \(ISO 8601\): ‘2026-03-14T23:59:50\.000Z’ in row 1 says so$/);
    expect([spelling, problems]).toEqual(['UTF-8, parted by comma, 1 row above the data', []]);
  });

  it('ask where a date or a decimal mark can be read in two ways', () => {
    const dates = bytes([
      'time;dp',
      ...Array.from({ length: 9 }, (_, at) => `0${at + 1}/0${at + 1}/2026 12:00;1${at}`),
      '03/04/2026 12:00;20',
    ]);
    const [question] = look({ time: 'time', differential: { column: 'dp', unit: 'mbar' } }, dates).questions;
    expect(question?.path).toBe('log.dateOrder');
    expect(question?.answers.map(({ value }) => value)).toEqual(['day-first', 'month-first']);
    expect(question?.answers[0]?.label).toContain('2026-04-03');
    const marks = bytes(['time;dp', '2026-03-01T00:00:00Z;1,234', '2026-03-01T00:00:01Z;1,235']);
    const [mark] = look({ time: 'time', differential: { column: 'dp', unit: 'mbar' } }, marks).questions;
    expect([mark?.path, mark?.answers.map(({ value }) => value)]).toEqual(['log.decimal', ['.', ',']]);
    expect(mark?.answers.map(({ label }) => label)).toEqual([
      'Read it as 1234, decimal point',
      'Read it as 1.234, decimal comma',
    ]);
  });

  it('say what stands in the way', () => {
    const { problems, questions, roles } = look({ time: 'nowhere', differential: { column: 'dp', unit: 'mbar' } });
    expect(problems.map(({ field }) => field)).toEqual(['log.time']);
    expect([questions, roles]).toEqual([[], {}]);
  });
});

describe('how far it is', () => {
  it('rows, rate and time left, the last two once they are known', () => {
    expect(presentProgress({ bytes: 0, ofBytes: 10, rows: 0, rowsPerSecond: 0 })).toEqual({ share: 0, text: '0 rows' });
    const later = presentProgress({ bytes: 5, ofBytes: 10, rows: 123_456, rowsPerSecond: 987_654, secondsLeft: 61.4 });
    expect(later).toEqual({ share: 0.5, text: '123\u202f456 rows · 990\u202f000 rows a second · 61\u00a0s left' });
  });

  it.each([
    [12, '12\u00a0bytes'],
    [5_421_337, '5.42\u00a0MB'],
    [1.3e9, '1.3\u00a0GB'],
  ])('%d bytes', (bytes_, said) => expect(bytesText(bytes_)).toBe(said));
});
