/** One good meter for tests to vary, and the results of varying it. */
import type { MeterText, Project } from '../../src/core/document/project.ts';
import type { Solved } from '../../src/core/result/record.ts';
import { solveMeter } from '../../src/core/run.ts';

export const water: MeterText = {
  tag: 'FE-1101',
  fluid: { kind: 'water' },
  upstream: { pressure: '7 bar(g)', temperature: '85 degC' },
  pipe: { bore: '102.26 mm', material: 'carbon-steel' },
  element: { kind: 'orifice-plate', tappings: 'flange', bore: '62.5 mm', material: 'stainless-316' },
  duty: { maximum: '60 t/h', normal: '40 t/h', minimum: '12 t/h' },
  differential: '250 mbar',
  find: 'flow',
};

export const steam: MeterText = {
  tag: 'FE-2304',
  fluid: { kind: 'water' },
  upstream: { pressure: '39 bar(g)', temperature: '400 degC' },
  pipe: { bore: '193.7 mm' },
  element: { kind: 'isa-1932-nozzle', bore: '125 mm' },
  duty: { maximum: '72 t/h', normal: '55 t/h', minimum: '22 t/h' },
  differential: '500 mbar',
  find: 'flow',
};

export const answer = (meter: unknown, project: Pick<Project, 'site' | 'base'> = {}) =>
  solveMeter(meter as MeterText, 0, project);

export const solved = (meter: unknown, project: Pick<Project, 'site' | 'base'> = {}): Solved => {
  const result = answer(meter, project);
  if (result.status === 'refused') throw new Error(JSON.stringify(result.problems));
  return result;
};

/** A solved meter whose element has a bore. */
export const bored = (meter: unknown) => {
  const result = solved(meter);
  const { bore_m, boreAsMeasured_m, diameterRatio } = result;
  if (bore_m === undefined || boreAsMeasured_m === undefined || diameterRatio === undefined)
    throw new Error(`expected a bore of ${result.element}, got none`);
  return { ...result, bore_m, boreAsMeasured_m, diameterRatio };
};

/** Codes and fields of a refusal, `code at field`. */
export const refusal = (meter: unknown, project: Pick<Project, 'site' | 'base'> = {}): string[] => {
  const result = answer(meter, project);
  return result.status === 'solved' ? [] : result.problems.map(({ code, field }) => `${code} at ${field}`);
};

/** The verdict of a check, by id; undefined where it was not made. */
export const verdict = (meter: unknown, id: string) => solved(meter).checks.find((check) => check.id === id)?.verdict;
