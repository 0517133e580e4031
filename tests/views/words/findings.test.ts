/** What findings of readings say, with the figure and the limit they are held against. */
import { expect, test } from 'vitest';
import type { Finding } from '../../../src/core/check/finding.ts';
import { findingText } from '../../../src/views/words/findings.ts';
import { printSI } from '../../../src/views/words/print.ts';

const finding = (more: Pick<Finding, 'id' | 'value' | 'unit' | 'limit'> & Partial<Finding>) =>
  findingText(
    { assumption: 'range-and-span', verdict: 'caution', source: { clause: '', seen: 'memory' }, ...more },
    printSI,
  );

test('a differential a little below zero names the zero first', () => {
  const below = { id: 'reading-reversed', value: -156.25, unit: 'Pa', limit: { min: 0 } } as const;
  expect(finding(below).text).toMatch(/: the flow runs backwards, the legs are crossed, or a leg holds/);
  expect(finding({ ...below, detail: { near: 'zero' } }).text).toMatch(
    /, close to zero: the zero has drifted, the flow runs backwards, /,
  );
});

test('legs at another temperature say how their density is stated', () => {
  const legs = finding({
    id: 'legs-at-line-temperature',
    value: 313.15,
    unit: 'K',
    limit: { min: 270.65, max: 310.65 },
  });
  expect(legs.text).toMatch(/^Instrument at 313\.15 K, .*state their density as what fills them$/);
  expect(legs.limit).toBe('270.65 K to 310.65 K, about that of the line');
});
