import fc from 'fast-check';
import { beforeEach, describe, expect, test } from 'vitest';
import { decode, encode } from '../../src/core/document/codec.ts';
import { createWorkbench, HISTORY_LIMIT } from '../../src/state/create.ts';
import { textOf } from '../../src/state/text.ts';
import type { Workbench, WorkbenchStore } from '../../src/state/workbench.ts';
import { type CountingCore, countingCore, project, source } from './sample.ts';

let core: CountingCore;
let store: WorkbenchStore;
const at = (): Workbench => store.getState();

beforeEach(() => {
  core = countingCore();
  store = createWorkbench(core);
  at().open(project, source);
});

describe('results', () => {
  test('follow the project in the same change', () => {
    store.subscribe((state) => {
      expect(state.results.results).toHaveLength(state.project.meters.length);
      expect(state.keys).toHaveLength(state.project.meters.length);
      state.project.meters.forEach((meter, index) => {
        if (meter.tag !== undefined) expect(state.results.results[index]?.tag).toBe(meter.tag);
      });
    });
    at().write('tag', 'FE-7');
    at().duplicateMeter(0);
    at().deleteMeter(1);
    at().undo();
    at().undo();
    expect(at().results.results.map(({ tag }) => tag)).toEqual(['FE-7', 'FE-1102', 'meter 3']);
  });

  test('are found anew for the meter that changed alone', () => {
    at().open({ ...project, meters: Array.from({ length: 500 }, (_, index) => ({ tag: `FE-${index}` })) }, '');
    core.solved = 0;
    at().write('pipe.bore', '1');
    expect(core.solved).toBe(1);
    at().moveMeter(0, 499);
    at().deleteMeter(10);
    expect(core.solved).toBe(1);
    at().writeProject('title', 'Another');
    expect(core.solved).toBe(1);
    at().writeProject('site.atmosphere', '1 bar(a)');
    expect(core.solved).toBe(500);
  });

  test('the last solved one stays beside a refused one, and goes with its meter', () => {
    const [key = ''] = at().keys;
    at().write('pipe.bore', '');
    expect(at().results.results[0]?.status).toBe('refused');
    expect(at().lastSolved[key]?.pipe_m).toBe(102.26);
    at().deleteMeter(0);
    expect(at().lastSolved[key]).toBeUndefined();
  });

  test('what is no meter is solved where it stands', () => {
    const odd = decode('{"format":"headwright","version":1,"meters":[null,"x",{"tag":"FE-1"}]}');
    if (!odd.ok) throw new Error('expected a project');
    at().open(odd.value, '');
    expect(at().results.results.map(({ tag }) => tag)).toEqual(['meter 1', 'meter 2', 'FE-1']);
    at().write('tag', 'FE-2');
    expect(at().project.meters[0]).toEqual({ tag: 'FE-2' });
  });
});

describe('undo', () => {
  test('takes edits of one field in a row as one step', () => {
    for (const text of ['1', '12', '120 mm']) at().write('pipe.bore', text);
    at().write('service', 'Feed water');
    at().undo();
    expect(at().project.meters[0]?.pipe?.bore).toBe('120 mm');
    at().undo();
    expect(at().project).toBe(project);
    expect([at().canUndo, at().canRedo]).toEqual([false, true]);
    at().redo();
    at().redo();
    expect(at().project.meters[0]).toMatchObject({ pipe: { bore: '120 mm' }, service: 'Feed water' });
    expect(at().canRedo).toBe(false);
  });

  test('several values written together are one step that stands by itself', () => {
    at().write('pipe.bore', '1');
    at().writeAll([
      ['pipe.bore', '2 mm'],
      ['find', 'flow'],
    ]);
    at().write('pipe.bore', '3 mm');
    at().undo();
    expect(at().project.meters[0]).toMatchObject({ pipe: { bore: '2 mm' }, find: 'flow' });
    at().undo();
    expect(at().project.meters[0]).toMatchObject({ pipe: { bore: '1' } });
    at().undo();
    expect(at().project).toBe(project);
  });

  test('settling, selecting and undoing end the step', () => {
    at().write('service', 'a');
    at().settle();
    at().write('service', 'ab');
    at().select(1);
    at().select(0);
    at().write('service', 'abc');
    at().undo();
    at().write('service', 'abd');
    at().undo();
    expect(at().project.meters[0]?.service).toBe('ab');
    at().undo();
    expect(at().project.meters[0]?.service).toBe('a');
  });

  test('typed and taken back again leaves no step and the file as it was', () => {
    at().write('service', 'a');
    at().write('service', '');
    expect(at().project).toBe(project);
    expect(at().canUndo).toBe(false);
    at().writeProject('title', 'Tern');
    at().writeProject('title', 'Tern Island works');
    expect(at().canUndo).toBe(false);
    expect(textOf(at())).toBe(source);
  });

  test('shows the meter that it changed, forward and back', () => {
    at().write('service', 'Feed water');
    at().select(2);
    at().undo();
    expect(at().selected).toBe(0);
    at().select(2);
    at().redo();
    expect(at().selected).toBe(0);
  });

  test('brings a deleted meter back with its key; other changes end the offer', () => {
    const { keys } = at();
    at().deleteMeter(1);
    expect(at().deleted).toEqual({ tag: 'FE-1102', list: 'meters' });
    at().undo();
    expect([at().keys, at().deleted, at().selected]).toEqual([keys, undefined, 1]);
    at().deleteMeter(0);
    at().write('service', 'x');
    expect(at().deleted).toBeUndefined();
  });

  test('goes back two hundred steps', () => {
    for (let step = 0; step < HISTORY_LIMIT + 50; step += 1) {
      at().write('service', String(step));
      at().settle();
    }
    let steps = 0;
    for (; at().canUndo; steps += 1) at().undo();
    expect(steps).toBe(HISTORY_LIMIT);
    expect(at().project.meters[0]?.service).toBe('49');
  });

  test('opening begins a new history', () => {
    at().write('service', 'x');
    at().open(project, source);
    expect([at().canUndo, at().canRedo, at().selected]).toEqual([false, false, 0]);
  });
});

describe('the list', () => {
  test('a new meter has the next free tag and is selected', () => {
    at().addMeter();
    expect(at().project.meters[3]).toMatchObject({ tag: 'FE-1103', find: 'bore', fluid: { kind: 'water' } });
    expect(at().selected).toBe(3);
  });

  test('a copy stands below under a free tag and keeps what is unknown', () => {
    at().duplicateMeter(0);
    at().duplicateMeter(1);
    expect(at().project.meters.map(({ tag }) => tag)).toEqual([
      'FE-1101',
      'FE-1101 copy',
      'FE-1101 copy 2',
      'FE-1102',
      undefined,
    ]);
    expect(at().project.meters[1]?.keptForLater).toEqual({ depth: [1, 2] });
    expect(new Set(at().keys).size).toBe(5);
  });

  test('the selected meter stays selected when the list moves about it', () => {
    at().select(1);
    const key = at().keys[1];
    at().moveMeter(0, 2);
    expect(at().keys[at().selected]).toBe(key);
    at().deleteMeter(2);
    expect(at().keys[at().selected]).toBe(key);
  });

  test('the last meter may go; writing then changes nothing', () => {
    for (let left = 3; left > 0; left -= 1) at().deleteMeter(0);
    expect([at().selected, at().project.meters.length]).toEqual([-1, 0]);
    const before = at().project;
    at().write('tag', 'x');
    at().moveMeter(0, 1);
    at().duplicateMeter(-1);
    expect(at().project).toBe(before);
    at().undo();
    expect(at().selected).toBe(0);
  });
});

describe('text', () => {
  test('is that of the file, byte for byte, until it says something else', () => {
    expect(textOf(at())).toBe(source);
    at().write('service', 'Feed water');
    expect(textOf(at())).toBe(encode(at().project));
    at().undo();
    expect(textOf(at())).toBe(source);
  });

  test('format, version and the lists are not written as values', () => {
    for (const path of ['format', 'version', 'meters', 'meters.0.tag', 'traverses.0.rule']) {
      expect(() => at().writeProject(path, 'x')).toThrow('expected a path beside the lists');
    }
  });
});

type Order = (bench: Workbench) => void;
const index = fc.integer({ min: -1, max: 6 });
const path = fc.constantFrom('tag', 'service', 'pipe.bore', 'upstream.pressure', 'element.calibration.0.reynolds');
const value = fc.constantFrom('', 'a', '12 mm', undefined);
const order: fc.Arbitrary<Order> = fc.oneof(
  fc.tuple(path, value).map(
    ([where, what]): Order =>
      (bench) =>
        bench.write(where, what),
  ),
  fc.tuple(fc.constantFrom('title', 'site.atmosphere'), value).map(
    ([w, v]): Order =>
      (bench) =>
        bench.writeProject(w, v),
  ),
  fc.constantFrom('SI' as const, 'US' as const).map(
    (display): Order =>
      (bench) =>
        bench.setDisplay(display),
  ),
  index.map(
    (i): Order =>
      (bench) =>
        bench.select(i),
  ),
  index.map(
    (i): Order =>
      (bench) =>
        bench.duplicateMeter(i),
  ),
  index.map(
    (i): Order =>
      (bench) =>
        bench.deleteMeter(i),
  ),
  fc.tuple(index, index).map(
    ([i, to]): Order =>
      (bench) =>
        bench.moveMeter(i, to),
  ),
  fc.tuple(path, value).map(
    ([where, what]): Order =>
      (bench) =>
        bench.write(where, what, 'traverses'),
  ),
  fc.tuple(index, index, fc.constantFrom('', '61 Pa', 'x')).map(
    ([line, point, text]): Order =>
      (bench) =>
        bench.writeReadings([{ line: line + 1, point: point + 1, text }]),
  ),
  fc.tuple(index, index).map(
    ([i, to]): Order =>
      (bench) => {
        bench.moveTraverse(i, to);
        bench.selectTraverse(to);
        bench.duplicateTraverse(i);
        bench.deleteTraverse(to);
      },
  ),
  fc.constantFrom<Order>(
    (bench) => bench.addMeter(),
    (bench) => bench.addTraverse(),
    (bench) => bench.undo(),
    (bench) => bench.redo(),
    (bench) => bench.settle(),
  ),
);

function expectStanding(items: readonly unknown[], keys: readonly string[], selected: number, last: object): void {
  expect(keys).toHaveLength(items.length);
  expect(new Set(keys).size).toBe(keys.length);
  expect(selected).toBeGreaterThanOrEqual(items.length > 0 ? 0 : -1);
  expect(selected).toBeLessThan(Math.max(1, items.length));
  expect(Object.keys(last).every((key) => keys.includes(key))).toBe(true);
}

describe('laws', () => {
  test('undo to the start gives the first text, redo to the end the last', () => {
    fc.assert(
      fc.property(fc.array(order, { maxLength: 60 }), (orders) => {
        const bench = createWorkbench(countingCore());
        bench.getState().open(project, source);
        for (const give of orders) give(bench.getState());
        while (bench.getState().canRedo) bench.getState().redo();
        const last = encode(bench.getState().project);
        while (bench.getState().canUndo) bench.getState().undo();
        expect(textOf(bench.getState())).toBe(source);
        while (bench.getState().canRedo) bench.getState().redo();
        expect(encode(bench.getState().project)).toBe(last);
      }),
      { numRuns: 300 },
    );
  });

  test('whatever is done, list, keys, results and selection agree and nothing is changed in place', () => {
    const before = JSON.stringify(project);
    fc.assert(
      fc.property(fc.array(order, { maxLength: 60 }), (orders) => {
        const bench = createWorkbench(countingCore());
        bench.getState().open(project, source);
        for (const give of orders) {
          give(bench.getState());
          const { project: now, results, ...at } = bench.getState();
          const fresh = countingCore();
          expect(results).toEqual({
            results: now.meters.map((meter, i) => fresh.solveMeter(meter, i, now)),
            traverses: (now.traverses ?? []).map((traverse, i) => fresh.solveTraverse(traverse, i, now)),
          });
          expectStanding(now.meters, at.keys, at.selected, at.lastSolved);
          expectStanding(now.traverses ?? [], at.traverseKeys, at.traverseSelected, at.lastSurveyed);
        }
        expect(JSON.stringify(project)).toBe(before);
      }),
      { numRuns: 300 },
    );
  });
});
