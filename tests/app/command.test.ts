/** The command line as a user runs it: what it prints, where, and how it exits. */
import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { afterAll, describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));
const example = join(root, 'public/examples/tern-island.headwright.json');
const folder = mkdtempSync(join(tmpdir(), 'command-'));
afterAll(() => rmSync(folder, { recursive: true }));

const headwright = (...words: string[]) =>
  spawnSync(process.execPath, [join(root, 'src/app/headwright.mjs'), ...words], { cwd: folder, encoding: 'utf8' });

const file = (name: string, text: string): string => {
  writeFileSync(join(folder, name), text);
  return name;
};

interface Printed {
  format: string;
  results: { tag: string; status: string; problem?: { code: string; field: string; message: string } }[];
}

describe('solve', () => {
  it('prints every meter of the example and exits 0', () => {
    const { status, stdout, stderr } = headwright('solve', example);
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
    const printed = JSON.parse(stdout) as Printed;
    const written = JSON.parse(readFileSync(example, 'utf8')) as { meters: { tag: string }[] };
    expect(printed.format).toBe('headwright-results');
    expect(printed.results.map(({ tag, status: said }) => [tag, said])).toEqual(
      written.meters.map(({ tag }) => [tag, 'solved']),
    );
  });

  it('refuses the one bad meter with code, field and sentence, solves the others and exits 1', () => {
    const project = JSON.parse(readFileSync(example, 'utf8')) as { meters: { upstream: object }[] };
    project.meters.push({ ...project.meters[0], upstream: { pressure: '7 bar', temperature: '85 degC' } });
    const { status, stdout, stderr } = headwright('solve', file('one-bad.json', JSON.stringify(project)));
    expect({ status, stderr }).toEqual({ status: 1, stderr: '' });
    const { results } = JSON.parse(stdout) as Printed;
    const refused = results.filter((result) => result.status === 'refused');
    expect(results.length - refused.length).toBe(project.meters.length - 1);
    expect(refused[0]?.problem?.field).toContain('upstream.pressure');
    expect(refused[0]?.problem?.message).toMatch(/^[A-Z].+\.$/);
  });

  it.each([
    ['no JSON', 'meters: none'],
    ['another format', '{"format":"other","version":1,"meters":[]}'],
    ['a newer version', '{"format":"headwright","version":99,"meters":[]}'],
    ['no list of meters', '{"format":"headwright","version":1}'],
    ['nothing', ''],
  ])('says in one sentence that %s is no project and exits 2', (_name, text) => {
    const { status, stdout, stderr } = headwright('solve', file('no-project.json', text));
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(stderr).toMatch(/^[^\n]+\.\n$/);
  });

  it('says that a file cannot be read and exits 2', () => {
    const { status, stdout, stderr } = headwright('solve', 'not-there.json');
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(stderr).toContain('not-there.json');
  });
});

it.each([[[]], [['solve']], [['solve', 'a.json', 'b.json']], [['dissolve', 'a.json']]])(
  'says how it is used when asked for %j',
  (words) => {
    const { status, stdout, stderr } = headwright(...words);
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(stderr).toContain('solve FILE');
  },
);

describe('a fault of the program itself', () => {
  /** Runs as a user does, with a fault planted before the program is loaded. */
  const faulty = (fault: string) =>
    spawnSync(
      process.execPath,
      ['--import', `data:text/javascript,${fault}`, join(root, 'src/app/headwright.mjs'), 'solve', example],
      { cwd: folder, encoding: 'utf8' },
    );

  it.each([
    ['while it solves', "Math.sqrt = () => { throw new Error('planted'); };"],
    [
      'after it has answered',
      "const { write } = process.stdout; process.stdout.write = function (text) { setTimeout(() => { throw new Error('planted'); }); return write.call(this, text); };",
    ],
  ])('%s is told with its place and a sentence, and exits 70', (_name, fault) => {
    expect(headwright('solve', example).status).toBe(0); // built, and sound without the fault
    const { status, stderr } = faulty(fault);
    expect(status).toBe(70);
    expect(stderr).toMatch(/Error: planted\n\s+at /);
    expect(stderr).toMatch(/^Headwright itself has failed; .+\.\n$/m);
  });

  it('prints no results that could be taken for an answer', () => {
    expect(faulty("Math.sqrt = () => { throw new Error('planted'); };").stdout).toBe('');
  });
});

it('stops quietly when its reader has read enough', () => {
  const project = JSON.parse(readFileSync(example, 'utf8')) as { meters: object[] };
  project.meters = Array.from({ length: 8 }, () => project.meters).flat(); // more than a pipe holds
  const path = file('long.json', JSON.stringify(project));
  const command = `"${process.execPath}" "${join(root, 'src/app/headwright.mjs')}" solve "${path}" | head -c 1`;
  const { stdout, stderr } = spawnSync('sh', ['-c', command], { cwd: folder, encoding: 'utf8' });
  expect({ stdout, stderr }).toEqual({ stdout: '{', stderr: '' });
});
