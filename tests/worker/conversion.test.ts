import { gzipSync } from 'node:zlib';
import { describe, expect, test } from 'vitest';
import { openLog } from '../../src/core/log/log.ts';
import { planLog } from '../../src/core/log/look.ts';
import { convert, type Surroundings } from '../../src/worker/conversion.ts';
import { OutputFull } from '../../src/worker/output.ts';
import type { Ending, Progress } from '../../src/worker/protocol.ts';
import { keepingOutput, logOf, ofMeter } from './sample.ts';

const ROWS = 20_000;
const text = logOf(ROWS);

/** A clock that moves on by so many ms whenever it is asked. */
function clock(step: number): () => number {
  let now = 0;
  return () => {
    now += step;
    return now;
  };
}

function around(change: Partial<Surroundings> = {}) {
  const output = keepingOutput();
  const reports: Progress[] = [];
  const announced: number[] = [];
  const surroundings: Surroundings = {
    now: clock(7),
    pause: async () => undefined,
    isCancelled: () => false,
    report: (progress) => void reports.push(progress),
    announce: () => void announced.push(reports.length),
    openOutput: async () => output,
    ...change,
  };
  return { output, reports, announced, surroundings };
}

/** The same log through the core at once. */
function atOnce(log = text): { readonly total: number; readonly out: string } {
  const first = new TextEncoder().encode(log);
  const plan = planLog(ofMeter, { first: first.slice(0, 1 << 16), complete: first.length <= 1 << 16 });
  if (!plan.ok) throw new Error(`expected a plan, got ${JSON.stringify(plan.problems)}`);
  const output = keepingOutput();
  const running = openLog(plan.value, output.write);
  running.push(first);
  return { total: running.finish().total_kg, out: output.text() };
}

const converted = (ending: Ending) => {
  if (ending.kind !== 'converted') throw new Error(`expected a converted log, got ${JSON.stringify(ending)}`);
  return ending.converted;
};
const codes = (ending: Ending): unknown =>
  ending.kind === 'refused' ? ending.troubles.map(({ code }) => code) : ending.kind;

describe('a log that is converted', () => {
  const whole = atOnce();

  test.each([
    ['plain', new Blob([text])],
    ['packed', new Blob([gzipSync(text)])],
  ])('%s, to the same totals and rows as at once', async (_, file) => {
    const { output, surroundings } = around();
    const { record, output: bytes } = converted(await convert(ofMeter, file, surroundings));
    expect([record.rows, record.total_kg]).toEqual([ROWS, whole.total]);
    expect(output.text()).toBe(whole.out);
    expect(bytes.size).toBe(whole.out.length);
    expect(output.discarded).toBe(false);
  });

  test('also where the browser fills no buffer of ours', async () => {
    const given = new Blob([text]);
    const plainStream = (): ReadableStream<Uint8Array<ArrayBuffer>> => {
      const bytes = new TextEncoder().encode(text);
      let at = 0;
      return new ReadableStream({
        pull: (to) => {
          if (at >= bytes.length) to.close();
          else to.enqueue(bytes.slice(at, at + 50_000));
          at += 50_000;
        },
      });
    };
    const file = { size: given.size, slice: given.slice.bind(given), stream: plainStream } as Blob;
    const { output, surroundings } = around();
    expect(converted(await convert(ofMeter, file, surroundings)).record.total_kg).toBe(whole.total);
    expect(output.text()).toBe(whole.out);
  });

  test('says so before it builds a surface', async () => {
    const { announced, surroundings } = around();
    await convert(ofMeter, new Blob([text]), surroundings);
    expect(announced).toEqual([0]);
  });

  test('tells its progress at most ten times a second, up to the end of the file', async () => {
    const file = new Blob([text]);
    const now = clock(7);
    const at: number[] = [];
    const { reports, surroundings } = around({ now });
    const report = (progress: Progress): void => {
      at.push(now());
      surroundings.report(progress);
    };
    await convert(ofMeter, file, { ...surroundings, report });
    expect(reports.length).toBeGreaterThan(3);
    for (const [place, time] of at.entries()) expect(time - (at[place - 1] ?? -100)).toBeGreaterThanOrEqual(100);
    for (const { bytes, ofBytes, rows, rowsPerSecond } of reports) {
      expect(bytes).toBeLessThanOrEqual(ofBytes);
      expect([rows <= ROWS, rowsPerSecond > 0]).toEqual([true, true]);
    }
    const left = reports.map(({ secondsLeft }) => secondsLeft);
    expect(left.at(0)).toBeUndefined();
    expect(left.at(-1)).toBeGreaterThanOrEqual(0);
  });
});

describe('a log that is not', () => {
  test('cancelled: nothing is left, and no total is told', async () => {
    let pauses = 0;
    const pause = async (): Promise<void> => {
      pauses += 1;
    };
    const { output, surroundings } = around({ pause, isCancelled: () => pauses >= 2 });
    expect(await convert(ofMeter, new Blob([text]), surroundings)).toEqual({ kind: 'cancelled' });
    expect([pauses, output.discarded]).toEqual([2, true]);
  });

  test('columns that are not there', async () => {
    const { surroundings } = around();
    const ending = await convert(ofMeter, new Blob(['a,b\n1,2\n']), surroundings);
    expect(codes(ending)).toContain('log-column-missing');
  });

  /** The log as a file that is not what it was. */
  const faulty = (change: (file: Blob) => Partial<Blob>): Blob => {
    const file = new Blob([text]);
    const parts = { size: file.size, slice: file.slice.bind(file), stream: file.stream.bind(file) };
    return { ...parts, ...change(file) } as Blob;
  };

  test('a file that is gone while it is read: its place is told, nothing is left', async () => {
    const gone = faulty(() => ({
      stream: () =>
        new ReadableStream({
          type: 'bytes',
          pull: (to) => {
            const bytes = new TextEncoder().encode(text);
            if (sent) to.error(new DOMException('changed', 'NotReadableError'));
            else to.enqueue(bytes.slice(0, 200_000));
            sent = true;
          },
        }) as ReturnType<Blob['stream']>,
    }));
    let sent = false;
    const { output, surroundings } = around();
    const ending = await convert(ofMeter, gone, surroundings);
    expect(codes(ending)).toEqual(['log-file-changed']);
    expect(ending.kind === 'refused' && ending.troubles[0]?.detail.bytes).toBe(200_000);
    expect(output.discarded).toBe(true);
  });

  test('a file that ends before its size', async () => {
    const cut = faulty((file) => ({ size: file.size + 10 }));
    const { output, surroundings } = around();
    expect(codes(await convert(ofMeter, cut, surroundings))).toEqual(['log-file-changed']);
    expect(output.discarded).toBe(true);
  });

  test.each([
    ['cut', gzipSync(text).subarray(0, 100_000)],
    ['damaged', Buffer.concat([gzipSync(text).subarray(0, 90_000), Buffer.alloc(50, 7)])],
  ])('a packed file that is %s', async (_, bytes) => {
    const { output, surroundings } = around();
    expect(codes(await convert(ofMeter, new Blob([bytes]), surroundings))).toEqual(['log-pack-broken']);
    expect(output.discarded).toBe(true);
  });

  test('no room for the output', async () => {
    const full = keepingOutput();
    const write = (): void => {
      throw new OutputFull('log-store-full', { bytes: 8 });
    };
    const { surroundings } = around({ openOutput: async () => Object.assign(full, { write }) });
    expect(codes(await convert(ofMeter, new Blob([text]), surroundings))).toEqual(['log-store-full']);
    expect(full.discarded).toBe(true);
  });

  test('a defect is no trouble of the file', async () => {
    const { surroundings } = around({
      pause: async () => {
        throw new RangeError('ours');
      },
    });
    await expect(convert(ofMeter, new Blob([text]), surroundings)).rejects.toThrow('ours');
  });
});
