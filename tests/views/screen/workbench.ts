/** A workbench with one meter to be turned round, solved by the real core. */

import type { MeterText } from '../../../src/core/document/project.ts';
import { solveSite } from '../../../src/core/run/site.ts';
import { solveTraverse } from '../../../src/core/run/traverse.ts';
import { solveMeter } from '../../../src/core/run.ts';
import { createWorkbench } from '../../../src/state/create.ts';

export const feedWater: MeterText = {
  tag: 'FE-1101',
  fluid: { kind: 'water' },
  upstream: { pressure: '7 bar(g)', temperature: '85 degC' },
  pipe: { bore: '102.26 mm' },
  element: { kind: 'orifice-plate', tappings: 'flange' },
  duty: { maximum: '60 t/h', normal: '40 t/h' },
  differential: '250 mbar',
  find: 'bore',
};

export function openMeter(meter: MeterText = feedWater) {
  const store = createWorkbench({ solveMeter, solveTraverse, solveSite });
  store.getState().open({ format: 'headwright', version: 1, meters: [meter] }, '');
  const solved = () => {
    const result = store.getState().results.results[0];
    if (result?.status !== 'solved') throw new Error(`expected a solved meter, got ${JSON.stringify(result)}`);
    return result;
  };
  return { store, solved, meter: () => store.getState().project.meters[0] as MeterText };
}
