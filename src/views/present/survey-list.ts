/** A survey as the list of the project shows it: names, verdict, what stands in the way. */
import type { MeterText, Project, TraverseText } from '../../core/document/project.ts';
import type { PlannedTraverse, TraverseResult } from '../../core/result/record.ts';
import { readShort, surveyLabel } from '../words/surveys.ts';
import { meterVerdict, notSolved } from '../words/verdicts.ts';
import { type Context, contextOf } from './context.ts';
import type { PresentedProblem, Verdict } from './model.ts';
import { printer } from './numbers.ts';
import { presentProblem } from './problem.ts';
import { type DisplayUnits, unit, written } from './units.ts';

export interface ListedSurvey {
  readonly tag: string;
  readonly service: string;
  readonly title: string; // 'Rectangular duct, log-Tchebycheff'
  readonly problems: readonly PresentedProblem[];
  readonly verdict: { readonly worst: Verdict | 'refused' | 'unchecked'; readonly words: string };
  /** How far it is read; undefined where there is no plan. */
  readonly progress: { readonly measured: number; readonly points: number } | undefined;
}

/** A result, or the plan of a survey whose fluid is not known yet. */
type Listed = TraverseResult | PlannedTraverse;

export function listSurvey(traverse: TraverseText, project: Project, result: Listed): ListedSurvey {
  const own = isGroup(traverse) ? traverse : {};
  const plan = result.status === 'refused' ? (result.besides ?? result.planned) : result;
  return {
    tag: result.tag,
    service: textOf(own.service),
    title: surveyLabel(textOf(own.section?.shape), textOf(own.rule)),
    problems:
      result.status === 'refused'
        ? result.problems.map((problem) => presentProblem(problem, surveyContext(traverse, project).print))
        : [],
    verdict: verdictOf(result),
    progress: plan === undefined ? undefined : { measured: plan.measured, points: plan.points },
  };
}

/** A survey is judged once it is read to the end. */
function verdictOf(result: Listed): ListedSurvey['verdict'] {
  if (result.status === 'refused') return { worst: 'refused', words: notSolved };
  const { measured, points, checks } = result;
  if (result.status === 'planned' || measured < points)
    return { worst: 'unchecked', words: readShort(measured, points) };
  return meterVerdict(checks.map(({ verdict }) => verdict));
}

/** Figures of a survey in its own units: differentials as they were read, air by the cubic metre an hour or foot a minute. */
export function surveyContext(traverse: TraverseText | undefined, project: Project): Context {
  const at = contextOf(unitsLike(traverse), project);
  const usual: Partial<DisplayUnits> =
    at.display === 'US'
      ? {
          volumeFlow: unit('ft3/min', 'volume flow'),
          velocity: unit('ft/min', 'velocity'),
          massFlow: unit('lb/min', 'mass flow'),
          baseVolumeFlow: unit('base ft3/min', 'base volume flow'),
        }
      : { massFlow: unit('kg/s', 'mass flow') };
  const units = { ...at.units, ...usual };
  return { ...at, ...printer(units), units };
}

/** A meter whose units are those of the traverse: differentials as they were read, pascal before anything is. */
export function unitsLike(traverse: TraverseText | undefined): MeterText {
  if (!isGroup(traverse)) return {};
  const { readings, state, section, fluid } = traverse;
  const lines = Array.isArray(readings) ? readings.flat() : [];
  const differential = lines.find((reading) => written(reading, ['pressure difference']) !== undefined) ?? '0 Pa';
  const bore = section?.diameter ?? section?.width;
  return {
    differential,
    ...(isGroup(state) ? { upstream: state } : {}),
    ...(isGroup(fluid) ? { fluid } : {}),
    ...(typeof bore === 'string' ? { pipe: { bore } } : {}),
  };
}

const isGroup = <Group>(group: Group | undefined): group is Group =>
  typeof group === 'object' && group !== null && !Array.isArray(group);

const textOf = (written: unknown): string => (typeof written === 'string' ? written : '');
