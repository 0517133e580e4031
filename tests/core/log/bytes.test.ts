/** Figures and stamps as bytes against the rule of the house and the calendar of the platform. */
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
  type Bytes,
  endRow,
  flush,
  openBytes,
  writeCount,
  writeExact,
  writeSignificant,
  writeWord,
} from '../../../src/core/log/bytes.ts';
import { openCalendar, writeStamp } from '../../../src/core/log/stamp.ts';
import { spell } from '../../../src/core/quantity/digits.ts';

const written = (write: (out: Bytes) => void): string => {
  let text = '';
  const out = openBytes((bytes) => {
    text += new TextDecoder().decode(bytes);
  });
  write(out);
  flush(out);
  return text;
};

describe('figures', () => {
  const size = fc.double({ min: -5, max: 8, noNaN: true }).map((power) => 10 ** power);
  const figure = fc
    .tuple(size, fc.boolean(), fc.nat(12))
    .map(([value, below, places]) => (below ? -1 : 1) * Number(value.toFixed(places)));

  test('are spelled as everywhere else, whatever the number of digits', () => {
    fc.assert(
      fc.property(figure, fc.integer({ min: 1, max: 17 }), (value, digits) => {
        expect(written((out) => writeSignificant(out, value, digits))).toBe(
          spell(value, { significant: digits, typographic: false }),
        );
      }),
      { numRuns: 10_000 },
    );
  });

  test.each([
    [0, 7],
    [0.001, 1],
    [0.000999999999, 7],
    [999999.95, 7],
    [1e6, 7],
    [0.9999999999, 7],
    [9.9999999999, 9],
    [2.675, 3],
    [1.0000005, 7],
    [-0.0125, 2],
    [123456, 3],
    [100000, 6],
    [5e-324, 7],
    [1.7976931348623157e308, 7],
  ])('%d to %d digits', (value, digits) => {
    expect(written((out) => writeSignificant(out, value, digits))).toBe(
      spell(value, { significant: digits, typographic: false }),
    );
  });

  test('with all their digits are read back bit for bit', () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, noDefaultInfinity: true }), (value) => {
        expect(Number(written((out) => writeExact(out, value)))).toBe(value === 0 ? 0 : value);
      }),
    );
  });

  test('count rows to the last', () => {
    fc.assert(
      fc.property(fc.maxSafeNat(), (count) => {
        expect(written((out) => writeCount(out, count))).toBe(String(count));
      }),
    );
    for (const count of [0, 9, 10, 999_999_999, 1e9, 1e9 + 1, 1e18 / 1e3])
      expect(written((out) => writeCount(out, count))).toBe(String(count));
  });
});

test('what is written comes out whole, however often the buffer is handed on', () => {
  const rows = Array.from({ length: 60_000 }, (_, at) => `row ${at}`);
  const text = written((out) => {
    for (const row of rows) {
      writeWord(out, row);
      endRow(out);
    }
  });
  expect(text).toBe(`${rows.join('\n')}\n`);
});

describe('stamps', () => {
  const moment = fc.integer({ min: Date.UTC(1000, 0, 1), max: Date.UTC(9999, 11, 31) });

  test('agree with the calendar of the platform', () => {
    fc.assert(
      fc.property(moment, (ms) => {
        const expected = new Date(ms).toISOString().replace('.000Z', 'Z');
        expect(written((out) => writeStamp(out, openCalendar(), ms / 1000))).toBe(expected);
      }),
      { numRuns: 2000 },
    );
  });

  test('one after another are what each is alone', () => {
    const steps = fc.array(fc.oneof(fc.integer({ min: -2, max: 90 }), fc.double({ min: 0, max: 61, noNaN: true })));
    fc.assert(
      fc.property(steps, (each) => {
        const calendar = openCalendar();
        let time = 1773446395;
        for (const step of each) {
          time += step;
          const alone = written((out) => writeStamp(out, openCalendar(), time));
          expect(written((out) => writeStamp(out, calendar, time))).toBe(alone);
        }
      }),
      { numRuns: 500 },
    );
  });

  test('in turn, over days and back', () => {
    const calendar = openCalendar();
    for (const text of ['2026-02-28T23:59:59Z', '2026-03-01T00:00:00Z', '2024-02-29T12:00:00Z', '1969-12-31T23:59:59Z'])
      expect(written((out) => writeStamp(out, calendar, Date.parse(text) / 1000))).toBe(text);
  });

  test('have three digits of a second, or six, or none; what is rounded up carries over', () => {
    const stamp = (time: number) => written((out) => writeStamp(out, openCalendar(), time));
    expect(stamp(0.5)).toBe('1970-01-01T00:00:00.500Z');
    expect(stamp(0.000001)).toBe('1970-01-01T00:00:00.000001Z');
    expect(stamp(59.99999999)).toBe('1970-01-01T00:01:00Z');
    expect(stamp(86399.99999999)).toBe('1970-01-02T00:00:00Z');
  });
});
