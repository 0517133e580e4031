/** Everything one printed sheet shows, as text: rows with the number of their source, tables, names and fingerprint. */
import type { MeterText, Project, TraverseText } from '../../core/document/project.ts';
import type { MeterResult, Results, Solved } from '../../core/result/record.ts';
import { cautions } from '../words/cautions.ts';
import { type Opening, openingWord } from '../words/elements.ts';
import { fieldLabel } from '../words/fields.ts';
import { computedWith, notCurrent, sheetWords } from '../words/sheet.ts';
import { contextOf } from './context.ts';
import { inputsHash } from './hash.ts';
import { presentMeter } from './meter.ts';
import type { DimensionRow, PresentedMeter, PresentedSizing } from './model.ts';
import { type ReadingTable, readingTable } from './readings-sheet.ts';
import { type DutyTable, dutyTable, elementRows, fluidRows, pipeSheetRows, spanText } from './sheet-figures.ts';
import { drawnDimensions, type SectionText, sectionText } from './sheet-section.ts';
import {
  type CheckBlock,
  checkBlocks,
  dimensionFigures,
  type FigureRow,
  straightFigures,
  type TermTable,
  termTable,
} from './sheet-tables.ts';
import { numbering, type SheetRow, type SourceLine } from './sources.ts';
import { version } from './version.ts';

/** What is to be printed: a project and its results, meter by meter. */
export interface Printing {
  readonly project: Project;
  readonly results: Results;
  /** The one meter or survey to print; all of them unless given. */
  readonly only?: { readonly list: 'meters' | 'traverses'; readonly index: number };
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
  readonly type: string; // of the document
  readonly lead: string;
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
  readonly drawn: readonly DimensionRow[];
  readonly fluid: readonly SheetRow[];
  readonly pipe: readonly SheetRow[];
  readonly element: readonly SheetRow[];
  readonly span: string; // 'span of the differential 250 mbar'
  readonly opening: Opening;
  readonly duty: DutyTable;
  readonly terms: TermTable;
  readonly checks: readonly CheckBlock[];
  readonly dimensions: readonly FigureRow[];
  readonly straight: readonly FigureRow[];
  readonly sources: readonly SourceLine[];
  /** Absent where nothing was read. */
  readonly readings?: ReadingTable;
}

export type PresentedSheet = SizingSheet | RefusedSheet;

/** One sheet for each meter, or for the one that is asked. */
export function presentSheets({ project, results, only, stale = false }: Printing): readonly PresentedSheet[] {
  return results.results.flatMap((result, index) => {
    const meter = project.meters[index];
    if (meter === undefined || !isAsked(only, 'meters', index)) return [];
    return [presentSheet(meter, project, result, stale)];
  });
}

/** Whether an item of a list is to be printed. */
export const isAsked = (only: Printing['only'], list: 'meters' | 'traverses', index: number): boolean =>
  only === undefined || (only.list === list && only.index === index);

export function presentSheet(meter: MeterText, project: Project, result: MeterResult, stale = false): PresentedSheet {
  const presented = presentMeter(meter, project, result);
  const head = headOf(meter, project, presented, stale);
  if (result.status === 'refused' || !isSizing(presented)) return refusedSheet(head, meter, presented);
  return sizingSheet(head, meter, project, result, presented);
}

const isSizing = (meter: PresentedMeter | PresentedSizing): meter is PresentedSizing => meter.status === 'solved';

export function headOf(
  item: MeterText | TraverseText,
  project: Project,
  presented: Pick<PresentedMeter, 'tag' | 'service' | 'element' | 'standard'>,
  stale: boolean,
): SheetHead {
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
    status: computedWith(version, inputsHash(item, project)),
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
    drawn: drawnDimensions(at, presented),
    fluid: fluidRows(at, project, result, presented, sources.keyOf),
    element: elementRows(presented, sources.keyOf),
    span: spanText(at, result),
    pipe: pipeSheetRows(presented, sources.keyOf),
    opening: openingWord(result.element),
    duty: dutyTable(presented, sources.keyOf),
    terms: termTable(presented, meter.uncertainty),
    checks: checkBlocks(presented, sources.keyOf),
    dimensions: dimensionFigures(presented, sources.keyOf),
    straight: straightFigures(presented, sources.keyOf),
    sources: sources.list(),
    ...readingTable(meter, project, result),
  };
}

function refusedSheet(head: SheetHead, meter: MeterText, { problems }: PresentedMeter): RefusedSheet {
  return {
    status: 'refused',
    head,
    type: sheetWords.documentType,
    lead: sheetWords.refused,
    problems: problems.map(({ field, sentence }) => ({ field: fieldLabel(field), sentence })),
    inputs: writtenIn(meter, '').map(([path, text]) => ({ field: fieldLabel(path), text })),
    cautions: cautions({ fluid: '', phase: '' }),
  };
}

/** Every text and number of a meter, by path. */
export function writtenIn(node: unknown, path: string): readonly (readonly [path: string, text: string])[] {
  if (typeof node === 'string' || typeof node === 'number') return [[path, String(node)]];
  if (typeof node !== 'object' || node === null) return [];
  return Object.entries(node).flatMap(([key, inner]) => writtenIn(inner, path === '' ? key : `${path}.${key}`));
}

const textOf = (written: unknown): string => (typeof written === 'string' ? written : '');
