/** Results as the file contract writes them: SI, the unit in the key, full double precision, sentences beside codes. */
import type { MeterText, Project } from '../../core/document/project.ts';
import type { MeterResult, PointRecord, Refused, Results, Solved } from '../../core/result/record.ts';
import { contextOf } from '../present/context.ts';
import { inputsHash } from '../present/hash.ts';
import { surveyContext } from '../present/survey-list.ts';
import type { Print } from '../words/print.ts';
import type { Problem } from '../words/problems.ts';
import { dutyNames } from '../words/verdicts.ts';
import { type Asked, checkOf } from './checks.ts';
import { readingsOf, writtenProblem } from './readings.ts';
import { traverseOf } from './traverses.ts';

/** The whole output; its keys keep this order. */
export function resultsOf(project: Project, results: Results, asked: Asked): object {
  const none: MeterText = {};
  return {
    format: 'headwright-results',
    version: 1,
    results: results.results.map((result, index) => {
      const meter = project.meters[index] ?? none;
      const { print } = contextOf(meter, project);
      return { ...meterOf(result, print, asked), inputs: inputsHash(meter, project) };
    }),
    traverses: results.traverses.map((traverse, index) => {
      const written = project.traverses?.[index];
      const { print } = surveyContext(written, project);
      const own = traverse.status === 'refused' ? refusedOf(traverse, print) : traverseOf(traverse, print, asked);
      return { ...own, inputs: inputsHash(written ?? {}, project) };
    }),
    ...(results.site === undefined ? {} : { site: results.site }),
  };
}

const meterOf = (result: MeterResult, print: Print, asked: Asked): object =>
  result.status === 'refused' ? refusedOf(result, print) : solvedOf(result, print, asked);

function solvedOf(result: Solved, print: Print, asked: Asked): object {
  const { working = false } = asked;
  const points = dutyNames.flatMap((name) => {
    const point = result.points[name];
    return point === undefined ? [] : [[name, pointOf(point, working)] as const];
  });
  return {
    tag: result.tag,
    status: result.status,
    find: result.find,
    element: result.element,
    standard: result.standard,
    state: result.state,
    bore_m: result.bore_m,
    pipe_m: result.pipe_m,
    diameterRatio: result.diameterRatio,
    boreAsMeasured_m: result.boreAsMeasured_m,
    pipeAsMeasured_m: result.pipeAsMeasured_m,
    points: Object.fromEntries(points),
    ...(result.readings === undefined ? {} : readingsOf(result.readings, print, asked)),
    checks: result.checks.map((finding) => checkOf(finding, print)),
    ...(working ? { working: result.working } : {}),
    unread: result.unread,
  };
}

function pointOf({ working, ...figures }: PointRecord, asked: boolean): object {
  return asked ? { ...figures, working } : figures;
}

/** A meter that was refused, with every reason. */
export function refusedOf({ tag, status, problem, problems }: Refused, print: Print): object {
  const written = (one: Problem) => writtenProblem(one, print);
  return { tag, status, problem: written(problem), problems: problems.map(written) };
}
