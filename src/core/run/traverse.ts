/** The flow of a traverse: document -> quantities -> points -> fluid -> velocities -> checks -> result. */
import { checkTraverse } from '../check/traverse.ts';
import type { Project, TraverseText } from '../document/project.ts';
import { stateOf } from '../fluid/state.ts';
import { readSite } from '../input/site.ts';
import { readTraverse } from '../input/traverse.ts';
import { traverseShape } from '../input/traverse-shape.ts';
import { readUpstream } from '../input/upstream.ts';
import { gather, type Outcome, ok, type Problem } from '../quantity/outcome.ts';
import type { SolvedTraverse, TraverseResult } from '../result/record.ts';
import { refused, tagOf } from '../result/refuse.ts';
import { assembleTraverse } from '../result/traverse.ts';
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
  return others === undefined ? refusal : { ...refusal, besides: { ...others, tag } };
}

/** The traverse without the readings that stand in the way, so that one slip of the keys does not hide the others. */
function besides(
  traverse: TraverseText,
  problems: readonly Problem[],
  project: Pick<Project, 'site' | 'base'>,
): SolvedTraverse | undefined {
  const wrong = new Set(problems.map(({ field }) => field));
  if (![...wrong].every((field) => /^readings\.\d+\.\d+$/.test(field))) return undefined;
  const readings = (traverse.readings ?? []).map((line, at) =>
    line.map((text, point) => (wrong.has(`readings.${at}.${point}`) ? '' : text)),
  );
  const others = survey({ ...traverse, readings }, project);
  return others.ok ? others.value : undefined;
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
