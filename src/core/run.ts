/** The whole flow of the calculation: document -> quantities -> fluid -> element -> solve -> checks -> result. */
import { check } from './check/check.ts';
import { straightness } from './check/straight.ts';
import type { MeterText, Project } from './document/project.ts';
import { elementOf } from './element/registry.ts';
import { settled } from './element/settle.ts';
import { materialKeys } from './element/shared/growth.ts';
import { stateOf } from './fluid/state.ts';
import { readMeter } from './input/meter.ts';
import { meterShape } from './input/shape.ts';
import { readSite } from './input/site.ts';
import { readUpstream, type Upstream } from './input/upstream.ts';
import { gather, type Outcome, ok } from './quantity/outcome.ts';
import { assemble } from './result/assemble.ts';
import type { MeterResult, Results, Solved } from './result/record.ts';
import { refused, tagOf } from './result/refuse.ts';
import { settle } from './run/settle.ts';
import { solveTraverse } from './run/traverse.ts';
import { dutyUncertainty } from './uncertainty/duty.ts';

type Surroundings = Pick<Project, 'site' | 'base'>;

/** Every meter and every traverse of a project, each on its own. */
export function run(project: Project): Results {
  return {
    results: project.meters.map((meter, index) => solveMeter(meter, index, project)),
    traverses: (project.traverses ?? []).map((traverse, index) => solveTraverse(traverse, index, project)),
  };
}

/** One meter, solved or refused with every reason; its place in the list names it where it has no tag. */
export function solveMeter(meter: MeterText, index: number, project: Surroundings): MeterResult {
  const solved = size(meter, project);
  return solved.ok ? solved.value : refused(tagOf(meter, index), solved.problems);
}

function size(meter: MeterText, project: Surroundings): Outcome<Solved> {
  const site = readSite(project); // 1 the site and the base state
  const shape = meterShape(meter); // 2 is this a meter at all
  if (!site.ok || !shape.ok) return gather(site, shape);
  const element = elementOf(shape.value.element?.kind); // 3 the element, and which fields are its own
  const input = readMeter(shape.value, element.ok ? element.value.fields : [], materialKeys); // 4 texts to quantities
  const upstream = readUpstream(shape.value, site.value);
  const { base, atmosphere } = site.value;
  const stateAt = (at: Upstream) => stateOf(shape.value.fluid ?? {}, at, base, atmosphere);
  const state = upstream.ok ? stateAt(upstream.value) : upstream; // 5 the fluid
  if (!element.ok || !input.ok || !upstream.ok || !state.ok) return gather(element, input, state);
  const { element: metal, uncertainty } = input.value;
  const primary = settled(element.value, metal.own, metal.calibration); // 6 the element with its fields settled
  const task = { input: input.value, primary, upstream: upstream.value, state: state.value, stateAt };
  const solution = settle(task); // 7 the unknown, then every duty point
  if (!solution.ok) return solution;
  const straight = straightness(input.value, solution.value); // 8 straight pipe, which the uncertainty of C needs
  if (!straight.ok) return straight;
  const { parts: extra, open } = straight.value;
  const budgets = dutyUncertainty(solution.value, uncertainty, extra, open); // 9 uncertainty of each flow
  const checks = check({ input: input.value, solution: solution.value }, budgets, straight.value.findings); // 10 checks
  const parts = { input: input.value, solution: solution.value, straight: straight.value, budgets, checks };
  return ok(assemble({ ...parts, written: shape.value, site: site.value })); // 11 the record
}
