/** A core that can be counted: a meter is solved when it has a pipe bore, a traverse when its section has a diameter. */
import type { Project } from '../../src/core/document/project.ts';
import type { Refused, Solved, SolvedTraverse } from '../../src/core/result/record.ts';
import type { Core } from '../../src/state/derive.ts';

export interface CountingCore extends Core {
  solved: number;
  surveyed: number;
}

export function countingCore(): CountingCore {
  const core: CountingCore = {
    solved: 0,
    surveyed: 0,
    solveMeter: (meter, index) => {
      core.solved += 1;
      const tag = meter?.tag ?? `meter ${index + 1}`;
      return typeof meter?.pipe?.bore === 'string' ? solved(tag, Number.parseFloat(meter.pipe.bore)) : refused(tag);
    },
    solveSite: () => undefined,
    solveTraverse: (traverse, index) => {
      core.surveyed += 1;
      const tag = traverse?.tag ?? `survey ${index + 1}`;
      return typeof traverse?.section?.diameter === 'string' ? surveyed(tag) : refused(tag);
    },
  };
  return core;
}

// The workbench looks at tag and status alone; the figures of a whole record are the core's business.
const solved = (tag: string, pipe: number): Solved => ({ tag, status: 'solved', pipe_m: pipe }) as Solved;

const surveyed = (tag: string): SolvedTraverse => ({ tag, status: 'solved' }) as SolvedTraverse;

const refused = (tag: string): Refused => {
  const problem = { code: 'missing', field: 'pipe.bore', detail: {} };
  return { tag, status: 'refused', problem, problems: [problem] };
};

export const project: Project = {
  format: 'headwright',
  version: 1,
  title: 'Tern Island works',
  preparedBy: '',
  site: { atmosphere: '101.325 kPa(a)' },
  meters: [
    { tag: 'FE-1101', pipe: { bore: '102.26 mm' }, keptForLater: { depth: [1, 2] } },
    { tag: 'FE-1102', pipe: { bore: '154.05 mm' } },
    { service: 'no tag yet' },
  ],
};

/** As a file may hold it: not as the program itself would write it. */
export const source = JSON.stringify(project);
