/** The whole flow of the calculation: document -> quantities -> fluid -> element -> solve -> checks -> result. */
import { check } from './check/check.ts';
import { straightness } from './check/straight.ts';
import type { MeterText, Project } from './document/project.ts';
import { type Outcome, ok } from './quantity/outcome.ts';
import { assemble } from './result/assemble.ts';
import type { MeterResult, Results, Solved } from './result/record.ts';
import { refused, tagOf } from './result/refuse.ts';
import { lateReadings } from './run/readings.ts';
import { solveSite } from './run/site.ts';
import { type Surroundings, standing } from './run/standing.ts';
import { solveTraverse } from './run/traverse.ts';
import { dutyUncertainty } from './uncertainty/duty.ts';

/** Every meter and every traverse of a project, each on its own. */
export function run(project: Project): Results {
  const site = solveSite(project);
  return {
    ...(site === undefined ? {} : { site }),
    results: project.meters.map((meter, index) => solveMeter(meter, index, project)),
    traverses: (project.traverses ?? []).map((traverse, index) => solveTraverse(traverse, index, project)),
  };
}

/** One meter, solved or refused with every reason; its place in the list names it where it has no tag. */
export function solveMeter(meter: MeterText, index: number, project: Surroundings): MeterResult {
  const solved = size(meter, index, project);
  return solved.ok ? solved.value : refused(tagOf(meter, index), solved.problems);
}

function size(meter: MeterText, index: number, project: Surroundings): Outcome<Solved> {
  const stands = standing(meter, index, project); // 1 to 7 site, shape, element, quantities, fluid, solution
  if (!stands.ok) return stands;
  const { input, solution, site, written } = stands.value;
  const straight = straightness(input, solution); // 8 straight pipe, which the uncertainty of C needs
  if (!straight.ok) return straight;
  const { parts: extra, open } = straight.value;
  const budgets = dutyUncertainty(solution, input.uncertainty, extra, open); // 9 uncertainty of each flow
  const checks = check({ input, solution }, budgets, straight.value.findings); // 10 checks
  const late = lateReadings(stands.value, { parts: extra, open }); // 11 the readings, when a view asks for them
  const parts = { written, input, site, solution, straight: straight.value, budgets, checks, ...late };
  return ok(assemble(parts)); // 12 the record
}
