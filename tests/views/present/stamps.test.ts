import { describe, expect, it } from 'vitest';
import { duration, stampsIn } from '../../../src/views/present/stamps.ts';

const noon = Date.UTC(2026, 6, 1, 12, 0, 0) / 1000; // clocks are moved then, and not in January
const winter = Date.UTC(2026, 0, 1, 23, 30, 0) / 1000;

describe('a moment as the clock of the log shows it', () => {
  it.each([
    ['UTC', noon, '2026-07-01\u00a012:00:00'],
    ['GMT', noon, '2026-07-01\u00a012:00:00'],
    ['+01:00', noon, '2026-07-01\u00a013:00:00'],
    ['UTC-3:30', noon, '2026-07-01\u00a008:30:00'],
    ['\u22125', noon, '2026-07-01\u00a007:00:00'],
    ['Europe/Oslo', noon, '2026-07-01\u00a014:00:00'],
    ['Europe/Oslo', winter, '2026-01-02\u00a000:30:00'],
    ['America/St_Johns', noon, '2026-07-01\u00a009:30:00'],
    ['UTC', -1, '1969-12-31\u00a023:59:59'],
  ])('%s at %d', (zone, seconds, shown) => expect(stampsIn(zone)(seconds)).toBe(shown));

  it('leaves parts of a second out', () => expect(stampsIn('UTC')(noon + 0.9)).toBe('2026-07-01\u00a012:00:00'));
});

describe('a length of time', () => {
  it.each([
    [0, '0\u00a0s'],
    [119.5, '119.5\u00a0s'],
    [1260, '21\u00a0min'],
    [7199, '120\u00a0min'],
    [84_137, '23.37\u00a0h'],
    [31_536_000, '8760\u00a0h'],
  ])('%d s', (seconds, text) => expect(duration(seconds).text).toBe(text));
});
