/** Everything the sheets of a survey show, as text: the form for the field, and the survey once it is read. */
import type { Project, TraverseText } from '../../core/document/project.ts';
import type { RefusedTraverse, TraverseResult } from '../../core/result/record.ts';
import { fieldLabel } from '../words/fields.ts';
import { stated as asStated, dash, whole } from '../words/sheet.ts';
import { formFacts, sheetOfSurvey as words } from '../words/survey-sheet.ts';
import { ductCautions, probeLabel } from '../words/surveys.ts';
import type { Row } from './model.ts';
import { headOf, isAsked, type Printing, type RefusedSheet, type SheetHead, writtenIn } from './sheet.ts';
import { type CheckBlock, checkBlocks, type TermTable } from './sheet-tables.ts';
import { type KeyOf, numbering, type SheetRow, type SourceLine, sheetRow } from './sources.ts';
import { presentSurvey } from './survey.ts';
import { listSurvey } from './survey-list.ts';
import type { PresentedSurvey } from './survey-model.ts';

export interface SurveySheet {
  readonly status: 'survey';
  readonly head: SheetHead;
  readonly survey: PresentedSurvey;
  readonly answer: string;
  readonly results: readonly SheetRow[];
  readonly plan: readonly SheetRow[];
  readonly fluid: readonly SheetRow[];
  readonly quality: readonly SheetRow[];
  readonly checks: readonly CheckBlock[];
  readonly terms: TermTable;
  readonly sources: readonly SourceLine[];
  /** What the form says of the plan before anything is read. */
  readonly facts: readonly { readonly label: string; readonly text: string }[];
}

/** The form to take to the duct: the plan, which needs no fluid. */
export type FieldForm = Pick<SurveySheet, 'head' | 'survey' | 'facts'>;

/** A survey without a result; its form where the points can be planned all the same. */
export interface RefusedSurveySheet extends RefusedSheet {
  readonly form?: FieldForm & {
    /** Nothing is read, and nothing is wrong: the fluid in the duct is only not stated yet. */
    readonly alone: boolean;
  };
}

export type PresentedSurveySheet = SurveySheet | RefusedSurveySheet;

/** One for each survey, or for the one that is asked. */
export function presentSurveySheets({
  project,
  results,
  only,
  stale = false,
}: Printing): readonly PresentedSurveySheet[] {
  return results.traverses.flatMap((result, index) => {
    const traverse = project.traverses?.[index];
    if (traverse === undefined || !isAsked(only, 'traverses', index)) return [];
    return [presentSurveySheet(traverse, project, result, stale)];
  });
}

export function presentSurveySheet(
  traverse: TraverseText,
  project: Project,
  result: TraverseResult,
  stale = false,
): PresentedSurveySheet {
  const { tag, service, title, problems } = listSurvey(traverse, project, result);
  const head = headOf(traverse, project, { tag, service, element: title, standard: '' }, stale);
  if (result.status === 'refused')
    return {
      status: 'refused',
      head,
      type: words.type,
      lead: words.refused,
      problems: problems.map(({ field, sentence }) => ({ field: fieldLabel(field), sentence })),
      inputs: writtenIn(traverse, '').map(([path, text]) => ({ field: fieldLabel(path), text })),
      cautions: ductCautions,
      ...formOf(traverse, project, result, head),
    };
  const survey = presentSurvey(traverse, project, result);
  const sources = numbering();
  const rows = (from: readonly Row[]): readonly SheetRow[] => from.map((row) => sheetRow(row, sources.keyOf));
  return {
    status: 'survey',
    head,
    survey,
    answer: survey.answer.map(({ text }) => text).join(''),
    results: rows(survey.results),
    plan: [{ id: 'section', label: words.section, text: survey.section, key: '' }, ...rows(survey.plan)],
    fluid: [{ id: 'fluid', label: words.fluid, text: survey.fluid, key: '' }, ...rows(survey.state)],
    quality: rows(survey.quality),
    checks: blocksOf(survey, sources.keyOf),
    terms: termsOf(survey, traverse),
    sources: sources.list(),
    facts: factsOf(survey, traverse),
  };
}

function formOf(
  traverse: TraverseText,
  project: Project,
  { planned, problems }: RefusedTraverse,
  head: SheetHead,
): Pick<RefusedSurveySheet, 'form'> {
  if (planned === undefined) return {};
  const survey = presentSurvey(traverse, project, planned);
  const alone = survey.measured === 0 && problems.every(({ code }) => code === 'field-missing');
  return { form: { head, survey, facts: factsOf(survey, traverse), alone } };
}

const blocksOf = ({ checks }: PresentedSurvey, keyOf: KeyOf): readonly CheckBlock[] => checkBlocks({ checks }, keyOf);

/** What the user stated of each term, then what it makes of the flow. */
function termsOf({ terms, results }: PresentedSurvey, { uncertainty }: TraverseText): TermTable {
  const all = results.find(({ id }) => id === 'uncertainty');
  if (all === undefined) return { terms: [], rows: [] };
  const written = (id: string): string => {
    const text = uncertainty?.[id];
    return typeof text === 'string' && text !== '' ? text.replace(/ (?=%)/, '\u00a0') : dash;
  };
  return {
    terms: [...terms.map(({ label }) => label), whole],
    rows: [
      { label: asStated, cells: [...terms.map(({ id }) => written(id)), dash] },
      { label: words.ofFlow, cells: [...terms.map(({ value }) => value.text), all.value.text] },
    ],
  };
}

/** The plan in words, as far as it is written. */
function factsOf(survey: PresentedSurvey, traverse: TraverseText): SurveySheet['facts'] {
  const { probe, port } = traverse;
  const text = (written: unknown): string =>
    typeof written === 'string' || typeof written === 'number' ? String(written) : '';
  const facts: readonly (readonly [label: string, text: string])[] = [
    [formFacts.section, survey.section],
    [formFacts.points, survey.under.split(' · ').slice(1, 3).join(', ')],
    [formFacts.port, text(port)],
    [formFacts.probe, probeLabel(text(probe?.kind))],
    [formFacts.coefficient, text(probe?.coefficient)],
  ];
  return facts
    .filter(([, fact]) => fact !== '')
    .map(([label, fact]) => ({ label, text: fact.replace(/ (?=[a-z]+$)/, '\u00a0') }));
}
