import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { serialise } from '../../../src/views/headless/serialise.ts';
import { solveText } from '../../../src/views/headless/solve.ts';
import { feedWater, meters, projectOf, solved } from '../present/meters.ts';

const text = (...list: unknown[]): string => JSON.stringify(projectOf('SI', ...(list as never[])));
const output = (...list: unknown[]) => JSON.parse(solveText(text(...list)).output);

/** Every leaf with its path. */
function leaves(node: unknown, path = ''): [string, unknown][] {
  if (typeof node !== 'object' || node === null) return [[path, node]];
  return Object.entries(node).flatMap(([key, inner]) => leaves(inner, `${path}.${key}`));
}

describe('exit and output', () => {
  it('0: every meter solved', () => {
    const answer = solveText(text(...meters));
    expect(answer).toMatchObject({ exit: 0, error: '' });
    expect(answer.output).toMatch(/^\{\n {2}"format": "headwright-results",\n {2}"version": 1,\n {2}"results": \[\n/);
    expect(answer.output.endsWith('}\n')).toBe(true);
  });
  it('0: no meter at all', () => expect(solveText(text())).toMatchObject({ exit: 0, error: '' }));
  it('1: one refused, the others solved', () => {
    const answer = solveText(
      text(feedWater, { ...feedWater, tag: 'bad', differential: '250' }, 17, null, 'x', [], feedWater),
    );
    expect(answer).toMatchObject({ exit: 1, error: '' });
    const { results } = JSON.parse(answer.output);
    expect(results.map(({ status }: { status: string }) => status)).toEqual([
      'solved',
      'refused',
      'refused',
      'refused',
      'refused',
      'refused',
      'solved',
    ]);
    expect(results[1]).toEqual({
      tag: 'bad',
      status: 'refused',
      problem: {
        code: 'unit-missing',
        field: 'differential',
        message: expect.stringMatching(/^The differential pressure .+\. .+\.$/),
      },
      problems: [expect.objectContaining({ code: 'unit-missing' })],
      inputs: expect.stringMatching(/^[0-9a-f]{12}$/),
    });
  });
  it.each([
    ['', /JSON/],
    ['{', /JSON/],
    ['[]', /format/],
    ['null', /format/],
    ['{"format":"other","version":1,"meters":[]}', /format/],
    ['{"format":"headwright","version":2,"meters":[]}', /newer version/],
    ['{"format":"headwright","meters":[]}', /version/],
    ['{"format":"headwright","version":1}', /list of meters/],
    ['{"format":"headwright","version":1,"meters":{}}', /list of meters/],
  ])('2: no project: %s', (file, reason) => {
    const answer = solveText(file);
    expect(answer).toMatchObject({ exit: 2, output: '' });
    expect(answer.error).toMatch(reason);
    expect(answer.error).not.toContain('\n');
  });
});

describe('the results', () => {
  const keys = [
    'tag',
    'status',
    'find',
    'element',
    'standard',
    'state',
    'bore_m',
    'pipe_m',
    'diameterRatio',
    'boreAsMeasured_m',
    'pipeAsMeasured_m',
    'points',
    'checks',
    'unread',
    'inputs',
  ];
  /** What an element without a bore has no figure for. */
  const ofBore = ['bore_m', 'diameterRatio', 'boreAsMeasured_m'];
  it.each(meters.map((meter) => [meter.tag ?? '', meter] as const))(
    '%s: keys in order, every leaf sound',
    (_, meter) => {
      const { results } = output(meter);
      const bar = meter.element?.kind === 'averaging-pitot';
      expect(Object.keys(results[0])).toEqual(bar ? keys.filter((key) => !ofBore.includes(key)) : keys);
      expect(Object.keys(results[0].points)[0]).toBe('maximum');
      for (const [path, leaf] of leaves(results)) {
        expect(['number', 'string', 'boolean'], path).toContain(typeof leaf);
        if (typeof leaf === 'number') expect(Number.isFinite(leaf), path).toBe(true);
        if (typeof leaf === 'string') expect(leaf, path).not.toMatch(/NaN|Infinity|undefined|\{where\}/);
      }
    },
  );
  it("are the core's own doubles", () => {
    const { result } = solved(feedWater);
    const [printed] = output(feedWater).results;
    expect(printed.boreAsMeasured_m).toBe(result.boreAsMeasured_m);
    expect(printed.points.normal.differential_Pa).toBe(result.points.normal?.differential_Pa);
    expect(printed.points.normal.uncertainty.terms).toEqual(result.points.normal?.uncertainty.terms);
  });
  it('name each check with its clause and a sentence', () => {
    const [check] = output(feedWater).results[0].checks;
    expect(Object.keys(check)).toEqual([
      'id',
      'assumption',
      'verdict',
      'value',
      'unit',
      'limit',
      'source',
      'seen',
      'message',
    ]);
    expect(check.message).toBe(
      'Pipe Reynolds number 1.24\u202f×\u202f10⁵ to 6.22\u202f×\u202f10⁵; limit: at least 7520.',
    );
  });
  it('have the same sentences as the screen', () => {
    const { presented } = solved(feedWater);
    const rows = presented.checks.flatMap((group) =>
      group.rows.map(({ text: line, limit }) => `${line}; limit: ${limit}.`),
    );
    const messages = output(feedWater).results[0].checks.map(({ message }: { message: string }) => message);
    expect(messages.sort()).toEqual(rows.sort());
  });
  it('carry the working when it is asked for', () => {
    const { results } = JSON.parse(solveText(text(feedWater), { working: true }).output);
    expect(results[0].working.length).toBeGreaterThan(5);
    expect(results[0].points.maximum.working.at(-1).id).toBe('uncertainty');
    expect(output(feedWater).results[0]).not.toHaveProperty('working');
    expect(output(feedWater).results[0].points.maximum).not.toHaveProperty('working');
  });
  it('are the same for the same text', () => expect(solveText(text(...meters))).toEqual(solveText(text(...meters))));
});

it('solves the example that is shipped', () => {
  const example = join(import.meta.dirname, '../../../public/examples/tern-island.headwright.json');
  expect(solveText(readFileSync(example, 'utf8')).exit).toBe(0);
});

describe('the serialiser', () => {
  it.each([[{ a: Number.NaN }], [{ a: [1, Number.POSITIVE_INFINITY] }], [{ a: null }], [[1, undefined]]])(
    'refuses %j',
    (value) => expect(() => serialise(value)).toThrow(/expected .* at results.*, got /),
  );
  it('leaves out what is absent', () => expect(serialise({ a: undefined, b: 1 })).toBe('{\n  "b": 1\n}\n'));
});
