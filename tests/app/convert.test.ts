/** `convert` as a user runs it: what it writes and where, what it says, and what it leaves behind when it is stopped. */
import { spawn, spawnSync } from 'node:child_process';
import { appendFileSync, mkdtempSync, readdirSync, readFileSync, rmSync, unlinkSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { gzipSync } from 'node:zlib';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { converted, exampleBytes, logOf, projectOf, steamMeter } from '../core/log/example.ts';

const program = join(fileURLToPath(new URL('../..', import.meta.url)), 'src/app/headwright.mjs');
const folder = mkdtempSync(join(tmpdir(), 'convert-'));
afterAll(() => rmSync(folder, { recursive: true }));

const write = (name: string, content: string | Uint8Array): string => {
  writeFileSync(join(folder, name), content);
  return name;
};
const headwright = (...words: string[]) =>
  spawnSync(process.execPath, [program, ...words], { cwd: folder, encoding: 'utf8' });
const convert = (log: string, ...more: string[]) =>
  headwright('convert', 'project.json', '--tag', 'FE-2304', '--log', log, '--out', 'out.csv', ...more);
const there = (): string[] => readdirSync(folder).filter((name) => name.includes('out.csv'));

const bytes = exampleBytes({ seconds: 20_000 });
beforeAll(() => {
  write('project.json', JSON.stringify(projectOf(steamMeter)));
  write('log.csv', bytes);
});
beforeEach(() => rmSync(join(folder, 'out.csv'), { force: true }));

describe('a log', () => {
  it('is converted as the core converts it, and its summary says what it came to', () => {
    const { status, stdout, stderr } = convert('log.csv');
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
    const { result, text } = converted(bytes);
    expect(readFileSync(join(folder, 'out.csv'), 'utf8') === text).toBe(true);
    const printed = JSON.parse(stdout) as Record<string, unknown>;
    const flagged = result.accounts.filter(({ code }) => code !== 'converted');
    expect(printed).toMatchObject({
      format: 'headwright-log',
      tag: 'FE-2304',
      rows: result.rows,
      converted: result.converted,
      flagged: Object.fromEntries(flagged.map(({ code, rows }) => [code, rows])),
      total_kg: result.total_kg,
      meanMassFlow_kg_s: result.meanMassFlow_kg_s,
      seconds: result.seconds,
    });
    expect(printed.inputs).toMatch(/^[0-9a-f]{12}$/);
    for (const { message } of printed.accounts as { message: string }[]) expect(message).toMatch(/^[A-Z].+\.$/);
    expect(there()).toEqual(['out.csv']);
  });

  it('may be packed, whatever its name', () => {
    write('packed.csv', gzipSync(bytes));
    const plain = convert('log.csv');
    const text = readFileSync(join(folder, 'out.csv'), 'utf8');
    const packed = convert('packed.csv');
    expect(packed.status).toBe(0);
    expect(packed.stdout).toBe(plain.stdout);
    expect(readFileSync(join(folder, 'out.csv'), 'utf8') === text).toBe(true);
  });

  it('has every digit when that is asked for, and the exact path', () => {
    write('short.csv', bytes.subarray(0, 2000));
    const { status, stdout } = convert('short.csv', '--digits', 'all', '--exact');
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({ path: { kind: 'exact', surfaceRows: 0 } });
    expect(readFileSync(join(folder, 'out.csv'), 'utf8')).toMatch(/,\d+\.\d{10,},converted\n/);
  });

  it('that ends in the middle of a row is converted, and that is said', () => {
    write('cut.csv', bytes.subarray(0, 100_000));
    const { status, stdout } = convert('cut.csv');
    expect(status).toBe(0);
    expect((JSON.parse(stdout) as { remarks: string[] }).remarks.join(' ')).toContain('last row may have been cut');
  });

  it('of which no row can be converted says so', () => {
    write('faults.csv', logOf(['2026-03-14T00:00:00Z,22,39,400', '2026-03-14T00:00:01Z,22,39,400']));
    const { status, stdout } = convert('faults.csv');
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({
      rows: 2,
      converted: 0,
      flagged: { 'signal-fault': 2 },
      total_kg: 0,
      seconds: 0,
    });
    expect(stdout).toContain('No row could be converted.');
  });
});

describe('what cannot be converted is told in one sentence, and nothing is written', () => {
  const sentence = /^[A-Z][^\n]+\.\n$/;

  it.each([
    ['a tag that is not there', ['project.json', '--tag', 'FE-1', '--log', 'log.csv', '--out', 'out.csv'], 'FE-2304'],
    [
      'a log that is not there',
      ['project.json', '--tag', 'FE-2304', '--log', 'none.csv', '--out', 'out.csv'],
      'none.csv',
    ],
    ['a project that is none', ['log.csv', '--tag', 'FE-2304', '--log', 'log.csv', '--out', 'out.csv'], 'JSON'],
    ['a folder as the log', ['project.json', '--tag', 'FE-2304', '--log', '.', '--out', 'out.csv'], 'no file'],
    ['a folder as the output', ['project.json', '--tag', 'FE-2304', '--log', 'log.csv', '--out', '.'], 'no file'],
    [
      'a folder that is not there',
      ['project.json', '--tag', 'FE-2304', '--log', 'log.csv', '--out', 'x/out.csv'],
      'x/out.csv',
    ],
    [
      'the log as the output',
      ['project.json', '--tag', 'FE-2304', '--log', 'log.csv', '--out', 'log.csv'],
      'the log itself',
    ],
  ])('%s', (_what, words, said) => {
    const { status, stdout, stderr } = headwright('convert', ...words);
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(stderr).toMatch(sentence);
    expect(stderr).toContain(said);
    expect(there()).toEqual([]);
    expect(readFileSync(join(folder, 'log.csv')).equals(bytes)).toBe(true);
  });

  it.each([
    [[]],
    [['--tag', 'FE-2304']],
    [['--tag', 'a', '--log', 'b', '--out', 'c', '--digits', '0']],
    [['--tag', 'a', '--tag', 'a', '--log', 'b', '--out', 'c']],
    [['--tag', 'a', '--log', 'b', '--out', 'c', '--loud']],
  ])('words %j', (words) => {
    const { status, stderr } = headwright('convert', 'project.json', ...words);
    expect(status).toBe(2);
    expect(stderr).toContain('convert FILE --tag TAG');
  });

  it('columns that are not there: with field and sentence, exit 1', () => {
    write('other.csv', logOf(['2026-03-14T00:00:00Z,12,39,400'], 'time,mA,bar,degC'));
    const { status, stdout, stderr } = convert('other.csv');
    expect({ status, stderr }).toEqual({ status: 1, stderr: '' });
    const { problem } = JSON.parse(stdout) as { problem: { field: string; message: string } };
    expect(problem.field).toBe('log.signal.column');
    expect(problem.message).toMatch(/^[A-Z].+\.$/);
    expect(there()).toEqual([]);
  });

  it('a packed log that is cut', () => {
    const packed = gzipSync(exampleBytes({ seconds: 60_000 }));
    write('cut.gz', packed.subarray(0, packed.length - 1000));
    const { status, stdout, stderr } = convert('cut.gz');
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(stderr).toMatch(/packed and ends before its end, after \d+ rows: nothing was written\.\n$/);
    expect(there()).toEqual([]);
  });
});

describe('while it runs', () => {
  beforeAll(() => {
    write('long.csv', exampleBytes({ seconds: 1_200_000 }));
    headwright('solve', 'project.json'); // built before the clock runs
  });

  /** Starts a long conversion and does something as soon as it writes. */
  const during = async (
    log: string,
    act: (pid: number) => void,
  ): Promise<{ exit: number | null; stdout: string; stderr: string }> => {
    const words = ['convert', 'project.json', '--tag', 'FE-2304', '--log', log, '--out', 'out.csv'];
    const child = spawn(process.execPath, [program, ...words], { cwd: folder });
    let [stdout, stderr] = ['', ''];
    child.stdout.on('data', (text) => (stdout += String(text)));
    child.stderr.on('data', (text) => (stderr += String(text)));
    const ended = new Promise<number | null>((resolve) => child.on('exit', resolve));
    while (child.exitCode === null && !there().some((name) => name.endsWith('.part')))
      await new Promise((resolve) => setTimeout(resolve, 5));
    act(child.pid ?? 0);
    const exit = await ended;
    return { exit, stdout, stderr };
  };

  it.each([
    ['SIGINT', 130],
    ['SIGTERM', 143],
  ] as const)('%s ends it: nothing is left, what had the name before keeps it', async (signal, expected) => {
    write('out.csv', 'as it was');
    const { exit, stdout, stderr } = await during('long.csv', (pid) => process.kill(pid, signal));
    expect({ exit, stdout }).toEqual({ exit: expected, stdout: '' });
    expect(stderr).toBe('The conversion was interrupted: nothing was written.\n');
    expect(there()).toEqual(['out.csv']);
    expect(readFileSync(join(folder, 'out.csv'), 'utf8')).toBe('as it was');
  });

  it('a log that grows gives no totals', async () => {
    const { exit, stdout, stderr } = await during('long.csv', () =>
      appendFileSync(join(folder, 'long.csv'), '2026-03-31T00:00:00Z,12,39,400\n'),
    );
    expect({ exit, stdout }).toEqual({ exit: 2, stdout: '' });
    expect(stderr).toMatch(/had \d+ bytes and has \d+ now, after \d+ rows: nothing was written\.\n$/);
    expect(there()).toEqual([]);
  });

  it('a log that is removed gives no totals', async () => {
    write('gone.csv', readFileSync(join(folder, 'long.csv')));
    const { exit, stderr } = await during('gone.csv', () => unlinkSync(join(folder, 'gone.csv')));
    expect(exit).toBe(2);
    expect(stderr).toMatch(/is no longer there, after \d+ rows: nothing was written\.\n$/);
    expect(there()).toEqual([]);
  });
});
