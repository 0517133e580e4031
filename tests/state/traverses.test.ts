/** Traverses beside the meters: edited, kept, undone and solved as they are. */
import { beforeEach, describe, expect, test } from 'vitest';
import type { Project } from '../../src/core/document/project.ts';
import { createWorkbench } from '../../src/state/create.ts';
import { withShape } from '../../src/state/plans.ts';
import { readingAt, withReadings } from '../../src/state/readings.ts';
import { textOf } from '../../src/state/text.ts';
import type { Workbench, WorkbenchStore } from '../../src/state/workbench.ts';
import { type CountingCore, countingCore, project as meters, source } from './sample.ts';

const project: Project = {
  ...meters,
  traverses: [{ tag: 'FP-101', section: { diameter: '600 mm' } }, { tag: 'FP-102' }],
};

let core: CountingCore;
let store: WorkbenchStore;
const at = (): Workbench => store.getState();
const survey = (index = at().traverseSelected) => at().project.traverses?.[index];

beforeEach(() => {
  core = countingCore();
  store = createWorkbench(core);
  at().open(project, JSON.stringify(project));
});

describe('traverses', () => {
  test('are added, copied, moved and deleted beside the meters', () => {
    at().addTraverse();
    expect(survey()).toMatchObject({ tag: 'FP-103', rule: 'log-tchebycheff', fluid: { kind: 'air' } });
    at().duplicateTraverse(0);
    expect(survey()?.tag).toBe('FP-101 copy');
    at().moveTraverse(1, 0);
    expect([survey()?.tag, at().traverseSelected]).toEqual(['FP-101 copy', 0]);
    at().deleteTraverse(0);
    expect(at().deleted).toEqual({ tag: 'FP-101 copy', list: 'traverses' });
    expect(at().project.meters).toBe(project.meters);
    for (let step = 0; step < 4; step += 1) at().undo();
    expect([at().project, at().canUndo]).toEqual([project, false]);
  });

  test('a project without a list of them gets one, and undo takes it away', () => {
    at().open(meters, source);
    expect(at().traverseSelected).toBe(-1);
    at().addTraverse({ tag: 'FP-1' });
    expect(at().results.traverses.map(({ tag }) => tag)).toEqual(['FP-1']);
    at().undo();
    expect(textOf(at())).toBe(source);
  });

  test('an edit goes to the list it names, and takes that list to hand', () => {
    at().write('service', 'Supply air', 'traverses');
    expect([survey()?.service, at().project.meters[0]?.service, at().hand]).toEqual([
      'Supply air',
      undefined,
      'traverses',
    ]);
    at().write('service', 'Feed water');
    expect([at().project.meters[0]?.service, at().hand]).toEqual(['Feed water', 'meters']);
    at().undo();
    at().undo();
    expect(at().project).toBe(project);
  });

  test('are found anew alone, and the last solved one stays', () => {
    const [key = ''] = at().traverseKeys;
    [core.solved, core.surveyed] = [0, 0];
    at().write('section.diameter', '', 'traverses');
    expect([core.solved, core.surveyed]).toEqual([0, 1]);
    expect(at().results.traverses[0]?.status).toBe('refused');
    expect(at().lastSurveyed[key]?.tag).toBe('FP-101');
    at().write('pipe.bore', '1');
    expect([core.solved, core.surveyed]).toEqual([1, 1]);
    at().writeProject('site.atmosphere', '1 bar(a)');
    expect([core.solved, core.surveyed]).toEqual([4, 3]);
  });
});

describe('a change of shape', () => {
  test('writes the shape and a plan that it has as one step of undo', () => {
    at().addTraverse();
    const before = survey();
    at().writeAll(withShape(planOf(before), 'circular'), 'traverses');
    expect(survey()).toMatchObject({
      section: { shape: 'circular' },
      rule: 'log-linear',
      lines: 2,
      pointsPerLine: 6,
    });
    expect(withShape(planOf(survey()), 'circular')).toEqual([['section.shape', 'circular']]);
    at().undo();
    expect(survey()).toEqual(before);
  });
});

const planOf = (traverse: ReturnType<typeof survey>) => ({
  rule: traverse?.rule,
  lines: traverse?.lines,
  pointsPerLine: traverse?.pointsPerLine,
});

describe('readings', () => {
  test('leave the points before them open, and nothing behind them', () => {
    at().writeReadings([{ line: 1, point: 2, text: '61 Pa' }]);
    expect(survey()?.readings).toEqual([[], ['', '', '61 Pa']]);
    at().settle();
    at().writeReadings([{ line: 1, point: 2, text: '' }]);
    expect(survey()).not.toHaveProperty('readings');
  });

  test('a later point leaves the earlier ones where they are', () => {
    at().writeReadings([{ line: 0, point: 0, text: '61 Pa' }]);
    at().writeReadings([{ line: 0, point: 3, text: '70 Pa' }]);
    expect(survey()?.readings).toEqual([['61 Pa', '', '', '70 Pa']]);
    at().writeReadings([{ line: 0, point: 0, text: '' }]);
    expect(survey()?.readings).toEqual([['', '', '', '70 Pa']]);
  });

  test('one point is one step however often it is typed, a block is one step', () => {
    for (const text of ['6', '61', '61 Pa']) at().writeReadings([{ line: 0, point: 0, text }]);
    at().writeReadings([{ line: 0, point: 1, text: '70 Pa' }]);
    at().writeReadings([
      { line: 0, point: 1, text: '71 Pa' },
      { line: 1, point: 0, text: '80 Pa' },
    ]);
    expect(survey()?.readings).toEqual([['61 Pa', '71 Pa'], ['80 Pa']]);
    at().undo();
    expect(survey()?.readings).toEqual([['61 Pa', '70 Pa']]);
    at().undo();
    expect(survey()?.readings).toEqual([['61 Pa']]);
    at().undo();
    expect(at().project).toBe(project);
  });

  test('what a file holds in their place is read as far as it is text', () => {
    expect(readingAt([['1', 2], 'x'], 0, 0)).toBe('1');
    expect([readingAt([['1', 2]], 0, 1), readingAt('x', 0, 0), readingAt(undefined, 3, 3)]).toEqual(['', '', '']);
    expect(withReadings('x', [{ line: 0, point: 0, text: '5 Pa' }])).toEqual([['5 Pa']]);
  });
});
