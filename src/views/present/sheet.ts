/** Everything one printed sheet shows, as text: rows with the number of their source, tables, names and fingerprint. */
import type { MeterText, Project } from '../../core/document/project.ts';
import type { MeterResult, Results, Solved } from '../../core/result/record.ts';
import { cautions } from '../words/cautions.ts';
import { fieldLabel } from '../words/fields.ts';
import { computedWith, notCurrent } from '../words/sheet.ts';
import { contextOf } from './context.ts';
import { inputsHash } from './hash.ts';
import { presentMeter } from './meter.ts';
import type { PresentedMeter, PresentedSizing } from './model.ts';
import { type SectionText, sectionText } from './sheet-section.ts';
import { type DutyTable, dutyTable, elementRows, fluidRows, pipeSheetRows, type TermTable, termTable } from './sheet-tables.ts';
import { numbering, type SheetRow, type SourceLine } from './sources.ts';
import { version } from './version.ts';

/** What is to be printed: a project and its results, meter by meter. */
export interface Printing {
  readonly project: Project;
  readonly results: Results;
  /** Index of the one meter to print; every meter unless given. */
  readonly only?: number;
  /** True while the results belong to earlier inputs; every sheet then says so. */
  readonly stale?: boolean;
}

/** Names and fingerprint, for head and title block. */
export interface SheetHead {
  readonly project: string;
  readonly tag: string;
  readonly service: string;
  readonly element: string;
  readonly standard: string;
  readonly revision: string;
  readonly preparedBy: string;
  readonly checkedBy: string;
  readonly status: string; // 'computed with Headwright 0.1.0, inputs 1f2e3d4c5b6a'
  readonly warning: string; // '' while the figures belong to the inputs
}

export interface RefusedSheet {
  readonly status: 'refused';
  readonly head: SheetHead;
  readonly problems: readonly { readonly field: string; readonly sentence: string }[];
  /** What was written, so that the reason can be found on the paper. */
  readonly inputs: readonly { readonly field: string; readonly text: string }[];
  readonly cautions: readonly string[];
}

export interface SizingSheet {
  readonly status: 'solved';
  readonly head: SheetHead;
  readonly meter: PresentedSizing;
  readonly answer: string;
  readonly section: SectionText;
  readonly fluid: readonly SheetRow[];
  readonly pipe: readonly SheetRow[];
  readonly element: readonly SheetRow[];
  readonly duty: DutyTable;
  readonly terms: TermTable;
  readonly sources: readonly SourceLine[];
}

export type PresentedSheet = SizingSheet | RefusedSheet;

/** One sheet for each meter, or for the one that is asked. */
export function presentSheets({ project, results, only, stale = false }: Printing): readonly PresentedSheet[] {
  return results.results.flatMap((result, index) => {
    const meter = project.meters[index];
    if (meter === undefined || (only !== undefined && only !== index)) return [];
    return [presentSheet(meter, project, result, stale)];
  });
}

export function presentSheet(meter: MeterText, project: Project, result: MeterResult, stale = false): PresentedSheet {
  const presented = presentMeter(meter, project, result);
  const head = headOf(meter, project, presented, stale);
  if (result.status === 'refused' || !isSizing(presented)) return refusedSheet(head, meter, presented);
  return sizingSheet(head, meter, project, result, presented);
}

const isSizing = (meter: PresentedMeter | PresentedSizing): meter is PresentedSizing => meter.status === 'solved';

function headOf(meter: MeterText, project: Project, presented: PresentedMeter, stale: boolean): SheetHead {
  const { title, revision, preparedBy, checkedBy } = project;
  const { tag, service, element, standard } = presented;
  return {
    project: textOf(title),
    tag,
    service,
    element,
    standard,
    revision: textOf(revision),
    preparedBy: textOf(preparedBy),
    checkedBy: textOf(checkedBy),
    status: computedWith(version, inputsHash(meter, project)),
    warning: stale ? notCurrent : '',
  };
}

function sizingSheet(
  head: SheetHead,
  meter: MeterText,
  project: Project,
  result: Solved,
  presented: PresentedSizing,
): SizingSheet {
  const at = contextOf(meter, project);
  const sources = numbering();
  return {
    status: 'solved',
    head,
    meter: presented,
    answer: presented.answer.map(({ text }) => text).join(''),
    section: sectionText(at, result, presented),
    fluid: fluidRows(at, project, result, presented, sources.keyOf),
    element: elementRows(at, result, presented, sources.keyOf),
    pipe: pipeSheetRows(presented, sources.keyOf),
    duty: dutyTable(presented, sources.keyOf),
    terms: termTable(presented),
    sources: sources.list(),
  };
}

function refusedSheet(head: SheetHead, meter: MeterText, { problems }: PresentedMeter): RefusedSheet {
  return {
    status: 'refused',
    head,
    problems: problems.map(({ field, sentence }) => ({ field: fieldLabel(field), sentence })),
    inputs: writtenIn(meter, '').map(([path, text]) => ({ field: fieldLabel(path), text })),
    cautions: cautions({ fluid: '', phase: '' }),
  };
}

/** Every text and number of a meter, by path. */
function writtenIn(node: unknown, path: string): readonly (readonly [path: string, text: string])[] {
  if (typeof node === 'string' || typeof node === 'number') return [[path, String(node)]];
  if (typeof node !== 'object' || node === null) return [];
  return Object.entries(node).flatMap(([key, inner]) => writtenIn(inner, path === '' ? key : `${path}.${key}`));
}

const textOf = (written: unknown): string => (typeof written === 'string' ? written : '');
