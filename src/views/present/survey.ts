/** One survey, ready to print: every row, sentence and picture that the views show. */
import type { Project, TraverseText } from '../../core/document/project.ts';
import type { PlannedTraverse, SolvedTraverse } from '../../core/result/record.ts';
import { cautions } from '../words/cautions.ts';
import { fluidLabel } from '../words/fluids.ts';
import { provenanceNotes } from '../words/provenance.ts';
import {
  completeAnswer,
  ductCautions,
  gridText,
  openAnswer,
  pointsRead,
  practiceLabel,
  ruleInLine,
  surveyMeanings,
  surveyWords as words,
} from '../words/surveys.ts';
import { checkGroups } from './checks.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { Row, Segment, WorkingGroup } from './model.ts';
import { stateRows } from './state.ts';
import { certaintyOf, planRows, qualityRows, resultRows, termRows } from './survey-figures.ts';
import { listSurvey, surveyContext } from './survey-list.ts';
import type { PresentedSurvey, SurveySuggestion } from './survey-model.ts';
import { linesOf, profileOf, sectionText, unitsOf } from './survey-points.ts';
import { workingRow } from './working.ts';

type Planned = SolvedTraverse | PlannedTraverse;

/** A survey that has its plan. */
export function presentSurvey(traverse: TraverseText, project: Project, result: Planned): PresentedSurvey {
  const at = surveyContext(traverse, project);
  const lines = linesOf(at, result, traverse.readings);
  const weights = result.lines.flatMap(({ points }) => points.map(({ weight }) => weight));
  const kind = typeof traverse.fluid?.kind === 'string' ? traverse.fluid.kind : '';
  const phase = result.status === 'solved' ? result.state.phase : undefined;
  const name = typeof traverse.fluid?.name === 'string' ? traverse.fluid.name : '';
  return {
    ...listSurvey(traverse, project, result),
    status: result.status,
    answer: answerOf(at, result),
    under: underOf(at, result),
    measured: result.measured,
    points: result.points,
    fromPort: result.port_m > 0,
    units: unitsOf(at),
    lines,
    section: sectionText(at, result, traverse.section ?? {}),
    shape: { section: result.section, lines, weighted: new Set(weights).size > 1 },
    profile: profileOf(at, result),
    results: resultRows(at, result),
    quality: qualityRows(at, result),
    plan: planRows(at, result),
    state: result.status === 'solved' ? ductState(at, result) : [],
    fluid: fluidLabel(kind, phase, name),
    overridable: kind !== 'stated',
    terms: termRows(at, result),
    certainty: certaintyOf(result),
    suggestions: suggestionsOf(result),
    checks: checkGroups(at, result).map((group) => ({
      ...group,
      meaning: surveyMeanings[group.assumption] ?? group.meaning,
    })),
    working: workingOf(result),
    notes: provenanceNotes(result.sources),
    cautions: cautionsOf(traverse, kind, phase),
  };
}

function answerOf(at: Context, { flow, measured, points }: Planned): readonly Segment[] {
  const figures = {
    volumeFlow: flow && at.value(flow.volumeFlow_m3_s, 'volumeFlow').text,
    meanVelocity: flow && at.value(flow.meanVelocity_m_s, 'velocity').text,
    progress: pointsRead(measured, points),
  };
  return (flow === undefined ? openAnswer : completeAnswer).map((piece): Segment => {
    if (typeof piece === 'string') return { text: piece, role: 'words' };
    const text = figures[piece.found];
    if (text === undefined) throw new Error(`expected a figure of the answer, got none for ${piece.found}`);
    return { text, role: piece.found === 'progress' ? 'given' : 'found' };
  });
}

/** Tag, rule, grid, uncertainty. */
function underOf(at: Context, { tag, rule, lines, uncertainty, points }: Planned): string {
  const [first = 0, ...others] = lines.map((line) => line.points.length);
  const grid = others.every((count) => count === first) ? gridText(lines.length, first) : `${points} points`;
  const sure = uncertainty && `±${at.value(uncertainty.expanded_percent, 'uncertainty').text}, 95\u00a0%`;
  const open = uncertainty?.terms.some(({ stated, percentOfFlow }) => !stated && percentOfFlow === 0);
  const parts = [tag, ruleInLine(rule), grid, sure && `${open ? 'at least ' : ''}${sure}`];
  return parts.filter(Boolean).join(' · ');
}

const ductState = (at: Context, result: SolvedTraverse): readonly Row[] =>
  stateRows(at, result).map((row) =>
    row.id === 'pressure' ? { ...row, label: words.staticPressure, symbol: 'p' } : row,
  );

function workingOf({ working }: Planned): readonly WorkingGroup[] {
  return [{ id: 'meter', title: words.working, rows: working.map(workingRow) }];
}

function suggestionsOf({ suggestions, rule, lines }: Planned): readonly SurveySuggestion[] {
  return suggestions.map((one) => ({
    key: one.practice,
    text: words.suggestion(practiceLabel(one.practice), ruleInLine(one.rule), gridText(one.lines, one.pointsPerLine)),
    rule: one.rule,
    lines: one.lines,
    pointsPerLine: one.pointsPerLine,
    cited: cited(one.source),
    chosen: one.rule === rule && lines.length === one.lines && lines[0]?.points.length === one.pointsPerLine,
  }));
}

/** Those of ducts; of the general ones those that a liquid of a gauge or steam bring. */
function cautionsOf({ manometer }: TraverseText, fluid: string, phase = ''): readonly string[] {
  const liquid = manometer?.liquid;
  const service = { fluid, phase, ...(typeof liquid === 'string' ? { gaugeLiquid: liquid } : {}) };
  const general = cautions({ fluid: '', phase: '' });
  return [...ductCautions, ...cautions(service).filter((text) => !general.includes(text))];
}
