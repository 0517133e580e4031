/** Puts a surveyed traverse together into the record that every view reads. */
import type { Finding } from '../check/finding.ts';
import { uncheckedTraverse } from '../check/traverse-unchecked.ts';
import type { TraverseText } from '../document/project.ts';
import type { TraverseInput } from '../input/traverse.ts';
import type { Section } from '../input/traverse-section.ts';
import type { Source } from '../quantity/source.ts';
import { biasOnPowerLaw } from '../traverse/bias.ts';
import type { Plan } from '../traverse/plan.ts';
import type { Quality } from '../traverse/quality.ts';
import { suggestionsFor } from '../traverse/suggest.ts';
import type { Survey, SurveyLine, SurveyPoint } from '../traverse/survey.ts';
import type { TraverseBudget } from '../uncertainty/traverse.ts';
import { sourcesOnce, stateRecord } from './assemble.ts';
import type { PlannedTraverse, SolvedTraverse } from './record.ts';
import type {
  QualityRecord,
  TraverseFigures,
  TraverseFlowRecord,
  TraverseLineRecord,
  TraversePointRecord,
  TraverseUncertaintyRecord,
} from './traverse-record.ts';
import { traverseWorking } from './traverse-working.ts';

export interface TraverseParts {
  readonly written: TraverseText;
  readonly input: TraverseInput;
  readonly survey: Survey;
  readonly quality: Quality | undefined;
  readonly budget: TraverseBudget | undefined;
  readonly checks: readonly Finding[];
}

const POWER_LAW = 7; // u ~ y^(1/7)

export function assembleTraverse(parts: TraverseParts): SolvedTraverse {
  const { written, input, survey, quality, budget, checks } = parts;
  const { plan, flow } = survey;
  const planned = planRecord(written, input, plan);
  const working = [...survey.state.working, ...traverseWorking(input, survey)];
  return {
    ...planned,
    status: 'solved',
    state: stateRecord(survey.state, []),
    lines: linesOf(survey.lines),
    measured: survey.measured.length,
    ...(flow === undefined ? {} : { flow: flowRecord(flow) }),
    ...(quality === undefined ? {} : { quality: qualityRecord(quality, input, survey) }),
    ...(budget === undefined ? {} : { uncertainty: uncertaintyRecord(budget) }),
    checks,
    unchecked: uncheckedTraverse(input),
    working,
    sources: sourcesOnce(
      sourcesOf(plan, [...working, ...checks, ...planned.suggestions, ...(budget === undefined ? [] : [budget])]),
    ),
  };
}

/** The plan by itself, before the fluid is known: a reading counts as read, its velocity waits. */
export function assemblePlan(written: TraverseText, input: TraverseInput, plan: Plan): PlannedTraverse {
  const planned = planRecord(written, input, plan);
  const measured = input.readings.flat().filter((reading) => reading !== undefined).length;
  const sources = sourcesOnce(sourcesOf(plan, planned.suggestions));
  const none = { checks: [], unchecked: [], working: [] };
  return { ...planned, status: 'planned', lines: linesOf(plan.lines), measured, ...none, sources };
}

/** What the section and the rule alone decide. */
function planRecord(written: TraverseText, input: TraverseInput, plan: Plan) {
  return {
    tag: input.tag,
    ...(written.service === undefined ? {} : { service: written.service }),
    rule: input.rule,
    section: sectionRecord(input.section),
    area_m2: plan.area,
    hydraulicDiameter_m: plan.hydraulicDiameter,
    port_m: input.port,
    points: plan.lines.reduce((sum, { points }) => sum + points.length, 0),
    suggestions: suggestionsFor(input.section, input.straight),
  };
}

function sectionRecord(section: Section): TraverseFigures['section'] {
  if (section.shape === 'circular') return { shape: section.shape, diameter_m: section.diameter };
  const { shape, width, height, ports } = section;
  return { shape, width_m: width, height_m: height, ports };
}

function linesOf(lines: readonly SurveyLine[]): readonly TraverseLineRecord[] {
  let before = 0;
  return lines.map(({ angle, across, points, mean }) => {
    const first = before;
    before += points.length;
    return {
      ...(angle === undefined ? {} : { angle_rad: angle }),
      ...(across === undefined ? {} : { across_m: across }),
      points: points.map((point, at) => pointRecord(point, first + at + 1)),
      ...(mean === undefined ? {} : { meanVelocity_m_s: mean }),
    };
  });
}

function pointRecord(point: SurveyPoint, number: number): TraversePointRecord {
  const { position, depth, weight, moved, differential, velocity } = point;
  return {
    number,
    position_m: position,
    depth_m: depth,
    weight,
    moved,
    ...(differential === undefined ? {} : { differential_Pa: differential }),
    ...(velocity === undefined ? {} : { velocity_m_s: velocity }),
  };
}

function flowRecord(flow: NonNullable<Survey['flow']>): TraverseFlowRecord {
  return {
    meanVelocity_m_s: flow.meanVelocity,
    volumeFlow_m3_s: flow.volumeFlow,
    massFlow_kg_s: flow.massFlow,
    ...(flow.baseVolumeFlow === undefined ? {} : { baseVolumeFlow_m3_s: flow.baseVolumeFlow }),
    reynolds: flow.reynolds,
  };
}

function qualityRecord(quality: Quality, { rule }: TraverseInput, { plan }: Survey): QualityRecord {
  const optional = {
    scatter_percent: quality.scatterPercent,
    lines_percent: quality.linesPercent,
    drift_percent: quality.driftPercent,
    differentialAveraging_percent: quality.differentialAveragingPercent,
    ruleOnPowerLaw_percent: rule === 'single-point' ? undefined : 100 * biasOnPowerLaw(plan.layout, POWER_LAW),
  };
  return {
    ...Object.fromEntries(Object.entries(optional).filter(([, value]) => value !== undefined)),
    meanSoFar_m_s: quality.meanVelocity,
    leastVelocity_m_s: quality.leastVelocity,
    mostVelocity_m_s: quality.mostVelocity,
    strongReadings_percent: quality.strongPercent,
    reversedReadings: quality.reversed,
    stillReadings: quality.still,
  };
}

const uncertaintyRecord = ({ expandedPercent, terms, source }: TraverseBudget): TraverseUncertaintyRecord => ({
  expanded_percent: expandedPercent,
  terms,
  source,
});

const sourcesOf = (plan: Plan, parts: readonly { readonly source: Source }[]): readonly Source[] => [
  plan.source,
  ...(plan.wall === undefined ? [] : [plan.wall.source]),
  ...parts.map(({ source }) => source),
];
