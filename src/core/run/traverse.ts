/** The flow of a traverse: document -> quantities -> points -> fluid -> velocities -> checks -> result. */
import { checkTraverse } from '../check/traverse.ts';
import type { Project, TraverseText } from '../document/project.ts';
import { stateOf } from '../fluid/state.ts';
import { readSite } from '../input/site.ts';
import { readTraverse } from '../input/traverse.ts';
import { traverseShape } from '../input/traverse-shape.ts';
import { readUpstream } from '../input/upstream.ts';
import { gather, type Outcome, ok, type Problem } from '../quantity/outcome.ts';
import type { PlannedTraverse, SolvedTraverse, TraverseResult } from '../result/record.ts';
import { refused, tagOf } from '../result/refuse.ts';
import { assemblePlan, assembleTraverse } from '../result/traverse.ts';
import { planOf } from '../traverse/plan.ts';
import { qualityOf } from '../traverse/quality.ts';
import { surveyOf } from '../traverse/survey.ts';
import { traverseUncertainty } from '../uncertainty/traverse.ts';

/** One traverse, solved or refused with every reason; its place in the list names it where it has no tag. */
export function solveTraverse(
  traverse: TraverseText,
  index: number,
  project: Pick<Project, 'site' | 'base'>,
): TraverseResult {
  const solved = survey(traverse, project);
  const tag = tagOf(traverse, index);
  if (solved.ok) return { ...solved.value, tag };
  const [first, ...rest] = solved.problems;
  const refusal = refused(tag, [placed(first, index), ...rest.map((problem) => placed(problem, index))]);
  const others = besides(traverse, solved.problems, project);
  if (others !== undefined) return { ...refusal, besides: { ...others, tag } };
  const plan = planned(traverse, solved.problems, project);
  return plan === undefined ? refusal : { ...refusal, planned: { ...plan, tag } };
}

/** The traverse without the readings that stand in the way, so that one slip of the keys does not hide the others. */
function besides(
  traverse: TraverseText,
  problems: readonly Problem[],
  project: Pick<Project, 'site' | 'base'>,
): SolvedTraverse | undefined {
  if (!problems.every(({ field }) => READING.test(field))) return undefined;
  const others = survey(withoutReadings(traverse, problems), project);
  return others.ok ? others.value : undefined;
}

/** The plan where only the fluid, or readings beside it, stand in the way: the points need the section alone. */
function planned(
  traverse: TraverseText,
  problems: readonly Problem[],
  project: Pick<Project, 'site' | 'base'>,
): PlannedTraverse | undefined {
  if (!problems.every(({ field }) => FLUID.test(field) || READING.test(field))) return undefined;
  const shape = traverseShape(withoutReadings(traverse, problems));
  if (!shape.ok || !readSite(project).ok) return undefined;
  const input = readTraverse(shape.value);
  const plan = input.ok ? planOf(input.value) : input;
  return input.ok && plan.ok ? assemblePlan(shape.value, input.value, plan.value) : undefined;
}

const READING = /^readings\.\d+\.\d+$/;
const FLUID = /^(state|fluid)(\.|$)/;

/** The traverse with the readings emptied that have a problem. */
function withoutReadings(traverse: TraverseText, problems: readonly Problem[]): TraverseText {
  const wrong = new Set(problems.map(({ field }) => field));
  if (!problems.some(({ field }) => READING.test(field))) return traverse;
  const readings = (traverse.readings ?? []).map((line, at) =>
    line.map((text, point) => (wrong.has(`readings.${at}.${point}`) ? '' : text)),
  );
  return { ...traverse, readings };
}

/** What is no traverse at all is named by its place in the list. */
const placed = (problem: Problem, index: number): Problem =>
  problem.field === '' ? { ...problem, field: `traverses.${index}` } : problem;

function survey(traverse: TraverseText, project: Pick<Project, 'site' | 'base'>): Outcome<SolvedTraverse> {
  const site = readSite(project); // 1 the site and the base state
  const shape = traverseShape(traverse); // 2 is this a traverse at all
  if (!site.ok || !shape.ok) return gather(site, shape);
  const input = readTraverse(shape.value); // 3 texts to quantities
  const duct = readUpstream(shape.value, site.value, 'state');
  const { base, atmosphere, gravity } = site.value;
  const { fluid = {} } = shape.value;
  const state = duct.ok ? stateOf(fluid, duct.value, base, atmosphere, 'fluid', 'state') : duct; // 4 the fluid in the duct
  const plan = input.ok ? planOf(input.value) : input; // 5 where the points lie
  if (!input.ok || !plan.ok || !state.ok) return gather(plan, state);
  const surveyed = surveyOf(input.value, plan.value, state.value, gravity); // 6 velocities and flow
  if (!surveyed.ok) return surveyed;
  const quality = qualityOf(surveyed.value); // 7 how good the readings are
  const budget = traverseUncertainty(input.value, surveyed.value); // 8 uncertainty of the flow
  const checks = checkTraverse({ input: input.value, survey: surveyed.value, quality }); // 9 checks
  const parts = { input: input.value, survey: surveyed.value, quality, budget, checks };
  return ok(assembleTraverse({ ...parts, written: shape.value })); // 10 the record
}
