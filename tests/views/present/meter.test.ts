import { describe, expect, it } from 'vitest';
import { run } from '../../../src/core/run.ts';
import { presentMeter } from '../../../src/views/present/meter.ts';
import type { PresentedSizing, Value } from '../../../src/views/present/model.ts';
import { feedWater, meters, projectOf, solved } from './meters.ts';
import { sheetText } from './sheet-text.ts';

describe('what is printed', () => {
  it.each(['SI', 'US'] as const)('golden of four meters in %s', async (display) => {
    const text = meters.slice(0, 4).map((meter) => sheetText(solved(meter, display).presented));
    await expect(text.join('\n')).toMatchFileSnapshot(`goldens/${display}.sheet.txt`);
  });
});

const sentence = ({ answer }: PresentedSizing): string =>
  answer.map(({ text }) => text.replaceAll('\u00a0', ' ')).join('');

describe('the answer', () => {
  const written = { ...feedWater, element: { ...feedWater.element, bore: '67.2 mm' } };
  it('names what was found, in each direction', () => {
    expect(sentence(solved(feedWater).presented)).toMatch(/^A 67\.\d\d mm bore reads 250 mbar at 60 t\/h\.$/);
    const differential = solved({ ...written, find: 'differential' }).presented;
    expect(sentence(differential)).toMatch(/^A 67\.2 mm bore reads 2\d\d\.\d mbar at 60 t\/h\.$/);
    expect(differential.answer.filter(({ role }) => role === 'found')).toHaveLength(1);
    const flow = solved({ ...written, find: 'flow' }).presented;
    expect(sentence(flow)).toMatch(/^A 67\.2 mm bore at 250 mbar passes \d\d\.\d\d t\/h\.$/);
  });
  it('calls the smallest section of a nozzle its throat, and an eighty an eighty', () => {
    const [, steam] = meters;
    if (steam === undefined) throw new Error('expected a steam meter, got none');
    expect(sentence(solved(steam).presented)).toMatch(/^A 125 mm throat reads /);
    const eighty = { ...steam, element: { ...steam.element, bore: '110 mm' } };
    expect(sentence(solved(eighty).presented)).toMatch(/^A 110 mm/);
    expect(
      sentence(
        solved({ ...steam, element: { ...steam.element, bore: '80 mm' }, duty: { maximum: '20 t/h' } }).presented,
      ),
    ).toMatch(/^An 80 mm/);
  });
});

/** Every value on the way down. */
function values(node: unknown): Value[] {
  if (typeof node !== 'object' || node === null) return [];
  if ('plain' in node) return [node as Value];
  return Object.values(node).flatMap(values);
}

describe.each(meters.map((meter) => [meter.tag ?? '', meter] as const))('%s', (_, meter) => {
  it.each(['SI', 'US'] as const)('prints in %s without a gap', (display) => {
    const { presented } = solved(meter, display);
    expect(JSON.stringify(presented)).not.toMatch(/NaN|Infinity|undefined|null|\{where\}/);
    for (const { plain, text, number } of values(presented)) {
      expect(plain).toMatch(/^[\x20-\x7e]+$/); // the clipboard gets ASCII
      expect(text.startsWith(number)).toBe(true);
    }
  });
  it('shows the same figures in both systems', () => {
    const figures = (display: 'SI' | 'US') => values(solved(meter, display).presented.duty).map(({ si }) => si);
    const [us, si] = [figures('US'), figures('SI')];
    expect(us).toHaveLength(si.length);
    // A written figure is read from its text, a shown one from the result: the last bit may differ.
    for (const [place, figure] of us.entries()) expect(figure / (si[place] ?? 0)).toBeCloseTo(1, 12);
  });
});

describe('units', () => {
  it('are the written ones where the display has them, else the usual ones of the display', () => {
    const cells = solved({ ...feedWater, duty: { maximum: '132000 lb/h' } }, 'US').presented.duty[0]?.cells;
    expect(cells?.flow.text).toBe('132000\u00a0lb/h');
    expect(cells?.differential.unit).toBe('inH₂O');
    expect(solved(feedWater, 'US').presented.duty[0]?.cells.flow.unit).toBe('lb/h');
    expect(solved({ ...feedWater, duty: { maximum: '132000 lb/h' } }).presented.duty[0]?.cells.flow.unit).toBe('t/h');
    expect(solved({ ...feedWater, differential: '25 kPa' }).presented.loss?.unit).toBe('kPa');
  });
});

describe('a refused meter', () => {
  it('is named by its kind and the variant of that kind alone', () => {
    const named = (element: object): string => {
      const meter = { ...feedWater, element };
      const project = projectOf('SI', meter as never);
      const [result] = run(project).results;
      if (result === undefined) throw new Error('expected a result, got none');
      return presentMeter(meter as never, project, result).element;
    };
    expect(named({ kind: 'averaging-pitot', tappings: 'flange' })).toBe('Averaging pitot');
    expect(named({ kind: 'averaging-pitot', tappings: 'flange', area: 'pipe' })).toContain('K on the pipe area');
  });
  it.each([
    [{}],
    [{ find: 'bore' }],
    [null],
    [17],
    [[]],
    [{ element: null }],
    [{ element: { kind: 5 } }],
    [{ ...feedWater, find: 'differential', duty: {} }],
  ])('is presented with its sentences: %j', (meter) => {
    const project = projectOf('SI', meter as never);
    const [result] = run(project).results;
    if (result === undefined) throw new Error('expected a result, got none');
    const presented = presentMeter(meter as never, project, result);
    expect(presented.status).toBe('refused');
    expect(presented.verdict.words).toBe('not solved');
    expect(presented.problems.length).toBeGreaterThan(0);
    for (const { sentence: text } of presented.problems) expect(text).toMatch(/^\S.+\. [A-Z].+\.$/);
  });
});
