/** Two good traverses for tests to vary, and the results of varying them. */
import type { Project, TraverseText } from '../../../src/core/document/project.ts';
import type { SolvedTraverse } from '../../../src/core/result/record.ts';
import { solveTraverse } from '../../../src/core/run/traverse.ts';

/** Two diameters of six points. */
export const round: TraverseText = {
  tag: 'SA-401',
  section: { shape: 'circular', diameter: '600 mm' },
  rule: 'log-linear',
  lines: 2,
  pointsPerLine: 6,
  port: '40 mm',
  straight: { before: '21 D', after: '6 D' },
  probe: { kind: 'pitot-static', coefficient: 1, head: '8 mm' },
  fluid: { kind: 'air', relativeHumidity: '50 %' },
  state: { pressure: '250 Pa(g)', temperature: '22 degC' },
  readings: [
    ['61 Pa', '74 Pa', '85 Pa', '86 Pa', '75 Pa', '60 Pa'],
    ['58 Pa', '72 Pa', '83 Pa', '88 Pa', '77 Pa', '63 Pa'],
  ],
};

/** Five lines of five points in a duct of 900 mm by 600 mm. */
export const rectangular: TraverseText = {
  ...round,
  tag: 'SA-402',
  section: { shape: 'rectangular', width: '900 mm', height: '600 mm' },
  rule: 'log-tchebycheff',
  lines: 5,
  pointsPerLine: 5,
  readings: Array.from({ length: 5 }, (_, line) =>
    Array.from({ length: 5 }, (__, point) => `${60 + 5 * line + 3 * point} Pa`),
  ),
};

export const answer = (traverse: unknown, project: Pick<Project, 'site' | 'base'> = {}) =>
  solveTraverse(traverse as TraverseText, 0, project);

export const solved = (traverse: unknown, project: Pick<Project, 'site' | 'base'> = {}): SolvedTraverse => {
  const result = answer(traverse, project);
  if (result.status === 'refused') throw new Error(JSON.stringify(result.problems));
  return result;
};

/** Codes and fields of a refusal, `code at field`. */
export const refusal = (traverse: unknown): string[] => {
  const result = answer(traverse);
  return result.status === 'solved' ? [] : result.problems.map(({ code, field }) => `${code} at ${field}`);
};

export const flowOf = (traverse: unknown, project: Pick<Project, 'site' | 'base'> = {}) => {
  const { flow } = solved(traverse, project);
  if (flow === undefined) throw new Error('expected a flow, got a traverse that is not read to the end');
  return flow;
};

/** Every reading of a plan set to one text, or to a text that a function makes of its place. */
export function filled(traverse: TraverseText, reading: (at: number, line: number) => string): TraverseText {
  const plan = solved({ ...traverse, readings: [] });
  const readings = plan.lines.map(({ points }, line) => points.map(({ position_m }) => reading(position_m, line)));
  return { ...traverse, readings };
}

/** A stated fluid: a liquid, or a gas with an isentropic exponent. */
export const stated = (density: number, exponent?: number) => ({
  kind: 'stated',
  density: `${density} kg/m3`,
  viscosity: '18 uPa.s',
  ...(exponent === undefined ? {} : { isentropicExponent: exponent }),
});
