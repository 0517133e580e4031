/** One meter, ready to print: every row, sentence and curve that the views show. */
import type { MeterText, Project } from '../../core/document/project.ts';
import type { MeterResult, Refused, Solved } from '../../core/result/record.ts';
import { cautions } from '../words/cautions.ts';
import { coefficientWords, elementLabel, rulesOf, variantField } from '../words/elements.ts';
import { fieldLabel } from '../words/fields.ts';
import { fluidLabel, phaseWord } from '../words/fluids.ts';
import { provenanceNotes } from '../words/provenance.ts';
import { unreadNote } from '../words/rows.ts';
import { certaintyNote } from '../words/uncertainty.ts';
import { meterVerdict, notSolved } from '../words/verdicts.ts';
import { answerOf, foundOf, underOf } from './answer.ts';
import { chartOf } from './chart.ts';
import { checkGroups } from './checks.ts';
import { type Context, contextOf, maximumOf } from './context.ts';
import { dimensionRows } from './dimensions.ts';
import { dutyRows } from './duty.ts';
import { headsOf } from './heads.ts';
import { metalRows, pipeRows } from './metal.ts';
import type { PresentedMeter, PresentedSizing, Shape } from './model.ts';
import { presentProblem } from './problem.ts';
import { stateRows } from './state.ts';
import { straightRows } from './straight.ts';
import { workingGroups } from './working.ts';

/** A solved meter with everything, or a refused one with its problems. */
export function presentMeter(
  meter: MeterText,
  project: Project,
  result: MeterResult,
): PresentedMeter | PresentedSizing {
  const at = contextOf(meter, project);
  return result.status === 'refused' ? refusedMeter(at, result) : solvedMeter(at, result);
}

function refusedMeter(at: Context, result: Refused): PresentedMeter {
  const { service, element } = at.meter;
  const kind = textOf(element?.kind);
  const variant = element?.[variantField(kind) ?? '']; // what an earlier kind left in the file is not its own
  return {
    tag: result.tag,
    service: textOf(service),
    element: elementLabel(typeof variant === 'string' ? `${kind}.${variant}` : kind),
    standard: '',
    status: 'refused',
    problems: result.problems.map((problem) => presentProblem(problem, at.print)),
    verdict: { worst: 'refused', words: notSolved },
  };
}

function solvedMeter(at: Context, result: Solved): PresentedSizing {
  const duty = dutyRows(at, result);
  const kind = textOf(at.meter.fluid?.kind);
  return {
    tag: result.tag,
    service: textOf(at.meter.service),
    element: elementLabel(result.element),
    standard: result.standard,
    status: 'solved',
    problems: [],
    verdict: meterVerdict(result.checks.map(({ verdict }) => verdict)),
    find: result.find,
    answer: answerOf(at, result),
    under: underOf(at, result),
    found: foundOf(at, result),
    ...lossOf(at, result),
    coefficient: coefficientWords(result.element),
    fluid: {
      name: fluidLabel(kind, result.state.phase, textOf(at.meter.fluid?.name)),
      phase: phaseWord(result.state.phase),
    },
    state: stateRows(at, result),
    overridable: kind !== 'stated', // those are stated as it is
    throttles: result.state.jouleThomson_K_Pa !== undefined && result.state.phase !== 'liquid',
    pipe: pipeRows(at, result),
    metal: metalRows(at, result),
    duty,
    certainty: certaintyNote(
      openOf(result),
      rulesOf(result.element),
      duty.every(({ cells }) => cells.uncertainty),
    ),
    checks: checkGroups(at, result),
    working: workingGroups(result),
    dimensions: dimensionRows(at, result),
    straight: straightRows(at, result),
    chart: chartOf(at, result, duty),
    shape: shapeOf(result),
    notes: notesOf(result),
    cautions: cautions({ fluid: kind, phase: result.state.phase }),
  };
}

/** The permanent loss and the head lines that it makes, where it is known. */
function lossOf(at: Context, result: Solved): Pick<PresentedSizing, 'loss' | 'heads'> {
  const { permanentLoss_Pa: loss } = maximumOf(result);
  const heads = headsOf(at, result);
  return {
    ...(loss === undefined ? {} : { loss: at.value(loss, 'loss') }),
    ...(heads === undefined ? {} : { heads }),
  };
}

/** What the uncertainty of any flow leaves out, each once. */
const openOf = ({ points }: Solved): readonly string[] => [
  ...new Set(Object.values(points).flatMap((point) => point.uncertainty.open)),
];

/** Notes for the marks of every source that is shown, and what the file keeps for later. */
function notesOf(result: Solved): readonly string[] {
  const sources = [...result.sources, ...result.dimensions, ...result.straightLengths];
  const cited = sources.map((one) => ('source' in one ? one.source : one));
  const unread = result.unread.map((key) => fieldLabel(key).toLowerCase()).join(', ');
  return [...provenanceNotes(cited), ...(unread === '' ? [] : [unreadNote(unread)])];
}

/** The recovered station of the head lines is where the pressure has recovered, where it is more than drawn. */
function shapeOf(result: Solved): Shape {
  const recovered = result.heads.find(({ station, computed }) => station === 'recovered' && computed);
  return {
    element: result.element,
    pipe: result.pipe_m,
    bore: result.bore_m ?? result.pipe_m,
    ratio: result.diameterRatio ?? 1,
    tappingUpstream: result.tappings.upstream_m,
    tappingDownstream: result.tappings.downstream_m,
    recovery_D: recovered?.position_D ?? 0,
  };
}

const textOf = (written: unknown): string => (typeof written === 'string' ? written : '');
