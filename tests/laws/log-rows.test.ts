/** What the reader of logs must keep, whatever stands in the log and wherever its bytes are cut. */
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { LogText } from '../../src/core/document/v/1-log.ts';
import { readSite } from '../../src/core/input/site.ts';
import { civilOf, daysOf, isDate } from '../../src/core/log/calendar.ts';
import { type Chunk, TROUBLES } from '../../src/core/log/chunk.ts';
import { mapLog } from '../../src/core/log/columns.ts';
import { readFigure } from '../../src/core/log/figure.ts';
import type { Mapping } from '../../src/core/log/mapping.ts';
import { plainNumber } from '../../src/core/log/plain.ts';
import { openRows, type RowReader } from '../../src/core/log/rows.ts';
import { LONGEST_ROW } from '../../src/core/log/split.ts';
import { localOf, offsetAt, zoneOf } from '../../src/core/log/zone.ts';
import { generator } from './random.ts';

const encode = (text: string): Uint8Array => new TextEncoder().encode(text);

function mappingOf(log: LogText, text: string): Mapping {
  const site = readSite({});
  const mapping = site.ok ? mapLog(log, { first: encode(text), complete: true }, site.value) : site;
  if (!mapping.ok) throw new Error(`expected a mapping, got ${JSON.stringify(mapping.problems)}`);
  return mapping.value;
}

/** Everything that the reader answers, as lists of numbers, and its end. */
function answers(mapping: Mapping, feed: (rows: RowReader) => void, chunkRows = 4096) {
  const found: number[][] = [];
  const take = ({ size, row, time, signal, pressure, trouble, missing }: Chunk): void => {
    for (let at = 0; at < size; at += 1)
      found.push([row, time, signal, pressure ?? signal, trouble, missing].map((column) => column[at] as number));
  };
  const rows = openRows(mapping, take, chunkRows);
  feed(rows);
  return { found, end: rows.finish() };
}

const PASCALS: LogText = { time: 'time', differential: { column: 'dp', unit: 'Pa' } };
const HEAD = 'time,dp\n2026-03-01T00:00:00Z,1.5\n';

describe('figures', () => {
  const doubles = fc.double({ noNaN: true, noDefaultInfinity: true });
  const spellings: readonly ((value: number) => string)[] = [
    (value) => (Object.is(value, -0) ? '-0' : String(value)),
    (value) => (Object.is(value, -0) ? '-0e0' : value.toExponential()),
    (value) => (Object.is(value, -0) ? '-0.0' : value.toExponential(16)),
    (value) => (Object.is(value, -0) ? '-0.00' : value.toPrecision(17)),
  ];

  it('are read back bit for bit, however a double is printed', () => {
    fc.assert(
      fc.property(doubles, fc.constantFrom(...spellings), (value, spell) => {
        expect(readFigure(spell(value), { decimal: '.', group: '' })).toBe(value);
      }),
      { numRuns: 5000 },
    );
  });

  it('go through the rows of a log bit for bit', () => {
    const values = fc.sample(doubles, { numRuns: 3000, seed: 7 }).map((value) => value + 0);
    const lines = values.map((value, at) => `2026-03-01T00:00:01Z,${spellings[at % 4]?.(value)}\n`);
    const text = `${HEAD}${lines.join('')}`;
    const { found } = answers(mappingOf(PASCALS, HEAD), (rows) => rows.push(encode(text)));
    expect(found.slice(1).map((row) => (row[2] as number) + 0)).toEqual(values.map((value) => value + 0));
  });

  it('of at most 15 digits come out of the quick way as out of the platform', () => {
    const random = generator(3);
    const into = new Float64Array(1);
    const wrong: string[] = [];
    let left = 0; // that should have been quick
    for (let turn = 0; turn < 100_000; turn += 1) {
      const digits = String(Math.floor(random() * 10 ** (1 + Math.floor(random() * 15))));
      const point = Math.floor(random() * (digits.length + 1));
      const power = random() < 0.5 ? '' : `e${Math.floor(random() * 40) - 20}`;
      const text = `${digits.slice(0, point) || '0'}.${digits.slice(point) || '0'}${power}`;
      const end = plainNumber(encode(`${text}\n`), 0, 46, into);
      if (end < 0) left += digits.length > 13 || power !== '' ? 0 : 1;
      else if (into[0] !== Number(text)) wrong.push(text);
    }
    expect([wrong, left]).toEqual([[], 0]);
  });
});

describe('a log cut anywhere', () => {
  /** Rows of every kind of trouble, put together at random. */
  const parts = [
    '2026-03-01T00:00:00Z,1.5,a\n',
    '2026-03-01T00:00:01Z,1.5,"a, ""b""\r\nc"\r\n',
    '2026-03-01 00:00:02,−1 234.5,\r',
    '"2026-03-01T00:00:03Z","1,234.5",x\n',
    '2026-03-01T00:00:04Z,1.5,"open\n',
    '2026-03-01T00:00:05Z,1.5,"a"b\r\n',
    '\n\r\n\r',
    'time,dp,note\n',
    '2026-03-01T00:00:06Z,\0,x\n',
    ',,\n',
    'x,1,2,3,4\r\n',
    '2026-03-29 02:30:00,1.5,°\n',
    '2026-10-25 02:30:00,1.5,🌊\n',
    `2026-03-01T00:00:07Z,1.5,${'x'.repeat(300)}\n`,
    `2026-03-01T00:00:08Z,1.5,"${'y\n'.repeat(20)}"\n`,
  ];
  const log: LogText = { ...PASCALS, zone: 'Europe/Oslo', decimal: '.' };
  const mapping = mappingOf(log, 'time,dp,note\n2026-03-01T00:00:00Z,1.5,a\n');
  const texts = fc.array(fc.constantFrom(...parts), { maxLength: 40 }).map((rows) => `time,dp,note\n${rows.join('')}`);
  const places = fc.array(fc.nat({ max: 2000 }), { maxLength: 12 });

  it('reads the same', () => {
    fc.assert(
      fc.property(texts, places, fc.integer({ min: 1, max: 9 }), (text, cuts, chunk) => {
        const bytes = encode(text);
        const whole = answers(mapping, (rows) => rows.push(bytes));
        const inside = cuts.filter((cut) => cut < bytes.length).sort((one, other) => one - other);
        const edges = [0, ...inside, bytes.length];
        const inPieces = (rows: RowReader): void => {
          for (const [at, edge] of edges.slice(1).entries()) rows.push(bytes.slice(edges[at], edge));
        };
        expect(answers(mapping, inPieces, chunk)).toEqual(whole);
      }),
      { numRuns: 500 },
    );
  });

  it('and gives every row one number and one account', () => {
    fc.assert(
      fc.property(texts, (text) => {
        const { found, end } = answers(mapping, (rows) => rows.push(encode(text)));
        expect(found.map(([row]) => row)).toEqual(found.map((_, at) => at + 1));
        expect(end.rows).toBe(found.length);
        expect(found.flat().every(Number.isFinite)).toBe(true);
        expect(found.every(([, , , , trouble = -1]) => TROUBLES[trouble] !== undefined)).toBe(true);
      }),
    );
  });
});

it('the quick and the careful way read plain rows to the same bits', () => {
  const random = generator(9);
  const stamp = (): string => {
    const text = new Date(Date.UTC(2026, 0, 1) + Math.floor(random() * 3e10)).toISOString();
    const zone = ['Z', '+01:00', '-05:30', ''][Math.floor(random() * 4)] ?? '';
    return `${text.slice(0, random() < 0.5 ? 19 : 23)}${zone}`;
  };
  const rows = Array.from({ length: 5000 }, () => [stamp(), String(random() * 10 ** Math.floor(random() * 9))]);
  const text = (quote: string): string =>
    `time,dp\n${rows.map((row) => row.map((field) => quote + field + quote).join(',')).join('\n')}\n`;
  const mapping = mappingOf({ ...PASCALS, zone: 'Europe/Oslo' }, HEAD);
  const [plain, quoted] = ['', '"'].map((quote) => answers(mapping, (all) => all.push(encode(text(quote)))).found);
  expect(plain).toHaveLength(5000);
  expect(quoted).toEqual(plain);
});

describe('at the limits of a row', () => {
  const mapping = mappingOf(PASCALS, 'time,dp,note\n2026-03-01T00:00:00Z,1.5,a\n');
  const head = 'time,dp,note\n';
  const start = '2026-03-01T00:00:01Z,2.5,';
  const troubles = (text: string, piece: number): readonly (string | undefined)[] => {
    const bytes = encode(text);
    const { found } = answers(mapping, (rows) => {
      for (let at = 0; at < bytes.length; at += piece) rows.push(bytes.slice(at, at + piece));
    });
    return found.map((row) => TROUBLES[row[4] ?? 0]);
  };

  it.each([
    [LONGEST_ROW - 1, 'none'],
    [LONGEST_ROW, 'line-too-long'],
    [LONGEST_ROW + 1, 'line-too-long'],
  ])('a row of %i bytes is read alike in all pieces: %s', (length, trouble) => {
    const text = `${head}${start}${'x'.repeat(length - start.length)}\n${start}\n`;
    for (const piece of [1 << 20, 1 << 16, 4099, 1]) expect(troubles(text, piece)).toEqual([trouble, 'none']);
  });

  it.each([
    [16, 'none'],
    [17, 'quote-open'],
  ])('quoted text of %i line ends is read alike in all pieces: %s', (lines, trouble) => {
    for (const end of ['\n', '\r', '\r\n']) {
      const text = `${head}${start}"${end.repeat(lines)}"\n`;
      const whole = troubles(text, 1 << 20);
      expect(whole[0]).toBe(trouble);
      for (let piece = 1; piece < text.length; piece += 1) expect(troubles(text, piece)).toEqual(whole);
    }
  });
});

describe('calendar and zones', () => {
  it('count days there and back', () => {
    const lost: number[] = [];
    for (let count = -800_000; count < 800_000; count += 97) {
      const { year, month, day } = civilOf(count);
      if (!isDate(year, month, day) || daysOf(year, month, day) !== count) lost.push(count);
    }
    expect(lost).toEqual([]);
  });
  it.each(['Europe/Oslo', 'America/New_York', 'Australia/Lord_Howe', 'Asia/Kathmandu', 'UTC', '+05:45'])(
    'place every moment of a year in %s where the platform does',
    (name) => {
      const zone = zoneOf(name);
      if (!zone) throw new Error(`expected a zone, got none for ${name}`);
      const start = Date.UTC(2026, 0, 1) / 1000;
      const moments = Array.from({ length: 8800 }, (_, at) => start + at * 3593);
      const lost = moments.filter((utc) => {
        const local = utc + offsetAt(zone, utc);
        const { kind, first, second } = localOf(zone, local);
        return kind === 'skipped' || (local - first !== utc && local - second !== utc);
      });
      expect(lost).toEqual([]);
    },
  );
});

describe('a row without an end', () => {
  const TOO_LONG = TROUBLES.indexOf('line-too-long');
  const mapping = mappingOf(PASCALS, HEAD);
  const after = encode('\n2026-03-01T00:00:01Z,2.5\n');

  it('of 200 MB is one row that is too long, in the memory of one window', () => {
    const piece = new Uint8Array(1 << 16).fill(120);
    const before = process.memoryUsage().arrayBuffers;
    let most = 0;
    const { found, end } = answers(mapping, (rows) => {
      rows.push(encode(HEAD));
      for (let at = 0; at < 3200; at += 1) {
        rows.push(piece);
        if (at % 64 === 0) most = Math.max(most, process.memoryUsage().arrayBuffers);
      }
      rows.push(after);
    });
    expect(found.map(([row, , , , trouble]) => [row, trouble])).toEqual([
      [1, 0],
      [2, TOO_LONG],
      [3, 0],
    ]);
    expect(end.samples[0]?.text).toHaveLength(200);
    expect(most - before).toBeLessThan(32e6);
  });

  it('of a million columns is one row that is too long', () => {
    const { found } = answers(mapping, (rows) => {
      rows.push(encode(HEAD));
      rows.push(encode(`2026-03-01T00:00:00Z${',1'.repeat(1e6)}`));
      rows.push(after);
    });
    expect(found.map(([, , signal, , trouble]) => [signal, trouble])).toEqual([
      [1.5, 0],
      [0, TOO_LONG],
      [2.5, 0],
    ]);
  });

  it('of quoted text costs itself alone, byte by byte or at once', () => {
    const text = `${HEAD}"${'x'.repeat(200_000)}\n2026-03-01T00:00:01Z,2.5\n`;
    const once = answers(mapping, (rows) => rows.push(encode(text)));
    const slowly = answers(mapping, (rows) => {
      for (const byte of encode(text)) rows.push(Uint8Array.of(byte));
    });
    expect(slowly).toEqual(once);
    expect(once.found.map((row) => TROUBLES[row[4] ?? 0])).toEqual(['none', 'quote-open', 'none']);
  });
});
