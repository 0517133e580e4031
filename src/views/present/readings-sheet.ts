/** The readings of a meter as a sheet shows them: the instrument as written, one row for each reading, what they come to. */
import type { MeterText, Project } from '../../core/document/project.ts';
import type { Solved } from '../../core/result/record.ts';
import { fieldLabel } from '../words/fields.ts';
import { choiceLabel, instrumentLabel } from '../words/instruments.ts';
import { readWords as words } from '../words/readings.ts';
import { presentReadings } from './readings.ts';
import { asRead } from './readings-answer.ts';
import type { Drawn, PresentedReadings, ReadingColumn, ReadingRow } from './readings-model.ts';

export interface ReadingTable {
  readonly kind: string;
  readonly drawn: Drawn;
  readonly answer: string;
  /** The instrument as it is written. */
  readonly instrument: readonly { readonly label: string; readonly text: string }[];
  readonly heads: readonly { readonly label: string; readonly unit: string }[];
  readonly rows: readonly (readonly string[])[];
  readonly together: readonly string[];
  readonly problems: readonly string[];
  readonly notes: readonly string[];
}

const FIGURES: readonly ReadingColumn[] = [
  'differential',
  'flow',
  'velocity',
  'reynolds',
  'coefficient',
  'uncertainty',
];
const TYPED = ['time', 'value', 'lowRange', 'upstream', 'throat', 'pressure', 'temperature'] as const;

/** As a part of a sheet: nothing where nothing was read. */
export function readingTable(meter: MeterText, project: Project, result: Solved): { readonly readings?: ReadingTable } {
  if ((result.readings?.rows.length ?? 0) === 0) return {};
  return { readings: tableOf(meter, presentReadings(meter, project, result)) };
}

function tableOf(meter: MeterText, readings: PresentedReadings): ReadingTable {
  const { rows, units, kind, together, problems, notes, cautions, blank } = readings;
  const typed = TYPED.filter((name) => rows.some(({ written }) => written[name] !== undefined));
  const shown =
    rows.find(({ figures }) => figures.reynolds !== undefined) ?? rows.find(({ drawn }) => drawn !== undefined);
  return {
    kind,
    drawn: shown?.drawn ?? blank,
    answer: shown?.answer.map(({ text }) => text).join('') ?? '',
    instrument: instrumentRows(meter, kind),
    heads: [
      ...typed.map((name) => ({ label: words[name], unit: '' })),
      ...FIGURES.map((id) => ({ label: words[id], unit: units[id] })),
      { label: words.note, unit: '' },
    ],
    rows: rows.map((row) => cellsOf(row, typed)),
    together,
    problems: problems.map(({ sentence }) => sentence),
    notes: [...notes, ...cautions],
  };
}

const cellsOf = ({ written, figures, note }: ReadingRow, typed: readonly string[]): readonly string[] => [
  ...typed.map((name) => (name === 'time' ? (written.time ?? '') : asRead(written[name]))),
  ...FIGURES.map((id) => figures[id]?.number ?? ''),
  note.words,
];

/** Every field that is written, in the words of the form. */
function instrumentRows({ instrument }: MeterText, kind: string): ReadingTable['instrument'] {
  const rows = textsIn(instrument, 'instrument').filter(([path]) => path !== 'instrument.kind');
  const first = { label: fieldLabel('instrument.kind'), text: instrumentLabel(kind) };
  return [first, ...rows.map(([path, text]) => ({ label: fieldLabel(path), text: valueText(text) }))];
}

const valueText = (text: string): string => choiceLabel(text) ?? asRead(text);

function textsIn(node: unknown, path: string): readonly (readonly [path: string, text: string])[] {
  if (typeof node === 'string') return [[path, node]];
  if (typeof node !== 'object' || node === null) return [];
  return Object.entries(node).flatMap(([key, inner]) => textsIn(inner, `${path}.${key}`));
}
