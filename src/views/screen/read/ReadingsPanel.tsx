/** The table of readings: typed, pasted or filled down, each row with what it makes, and what the rows come to. */
import { type KeyboardEvent, useState } from 'react';
import type { Unit } from '../../../core/quantity/units.ts';
import type { PresentedReadings } from '../../present/readings-model.ts';
import { readWords as words } from '../../words/readings.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { convertedCell, rowsIn } from '../fluid/rows.ts';
import { focusField } from '../focus.ts';
import { useWriteAll, useWritten } from '../hand.tsx';
import { CopyTable } from '../panel/CopyTable.tsx';
import { Panel } from '../panel/Panel.tsx';
import { textAt } from '../text.ts';
import { readColumns, type Units, unitsOf } from './columns.ts';
import { asCsv, readingCells, saveText } from './export.ts';
import styles from './Read.module.css';
import { ReadingsHead } from './ReadingsHead.tsx';
import { ReadingsRow } from './ReadingsRow.tsx';
import { filledDown, fromAbove, pastedRows } from './rows.ts';

const PATH = 'readings';
const CELL = /^readings\.(\d+)\.(\w+)$/;

interface Props {
  readonly kind: string;
  readonly tag: string;
  readonly readings: PresentedReadings | undefined;
  readonly current: number;
  readonly setCurrent: (row: number) => void;
}

export function ReadingsPanel({ kind, tag, readings, current, setCurrent }: Props) {
  const table = useReadTable(kind);
  const { rows, columns, units, replace } = table;
  const [said, say] = useState('');
  const cells = readings === undefined ? [] : readingCells(readings, columns, units);
  const paste = (text: string, row: number, column: number): void => {
    const pasted = pastedRows(text, rows, { row, column }, columns, units);
    replace(pasted.rows);
    say(words.pasted(pasted.taken));
  };
  return (
    <Panel id="readings" title={words.table} aside={rows.length > 0 && <Orders cells={cells} tag={tag} />}>
      <p className={styles.hint}>{words.hint}</p>
      <div className={styles.scroll}>
        <Grid {...{ table, readings, current, setCurrent, paste }} />
      </div>
      <Sentences readings={readings} />
      <p className={styles.hint} aria-live="polite">
        {said}
      </p>
    </Panel>
  );
}

type Cells = ReturnType<typeof readingCells>;

const Orders = ({ cells, tag }: { readonly cells: Cells; readonly tag: string }) => (
  <div className={styles.aside}>
    <CopyTable cells={cells} />
    <button type="button" className={buttons.quiet} onClick={() => saveText(asCsv(cells), `${tag || 'readings'}.csv`)}>
      {words.csv}
    </button>
  </div>
);

interface GridProps extends Pick<Props, 'readings' | 'current' | 'setCurrent'> {
  readonly table: Table;
  readonly paste: (text: string, row: number, column: number) => void;
}

function Grid({ table, readings, current, setCurrent, paste }: GridProps) {
  const { rows, columns, units, replace, chooseUnit } = table;
  return (
    <table className={styles.table} onKeyDown={(event) => onKey(event, table)}>
      <ReadingsHead
        {...{ columns, units, chooseUnit }}
        found={readings?.units}
        fill={(name) => replace(filledDown(rows, name))}
      />
      <tbody>
        {[...rows, undefined].map((row, at) => (
          <ReadingsRow
            // biome-ignore lint/suspicious/noArrayIndexKey: a row is its place in the list
            key={at}
            {...{ at, row, columns, units, setCurrent, paste }}
            found={readings?.rows[at]}
            current={at === current}
            last={at === rows.length}
          />
        ))}
      </tbody>
    </table>
  );
}

/** Mean, error of rooting the mean, flags; then the sentences of the rows that cannot be used. */
function Sentences({ readings }: { readonly readings: PresentedReadings | undefined }) {
  if (readings === undefined) return null;
  const problems = readings.problems.filter(({ field }) => field.startsWith(`${PATH}.`) || field === PATH);
  return (
    <>
      {readings.together.length > 0 && <p className={styles.together}>{readings.together.join(' ')}</p>}
      {problems.map(({ field, sentence }) => (
        <p key={`${field} ${sentence}`} className={styles.problem}>
          {sentence}
        </p>
      ))}
    </>
  );
}

type Table = ReturnType<typeof useReadTable>;

/** The list in the document with its columns and their units, and the edits of it as a whole. */
function useReadTable(kind: string) {
  const list = useWritten(PATH);
  const signal = useWritten('instrument.signal');
  const lowRange = useWritten('instrument.lowRange');
  const display = useWorkbench((state) => state.project.display ?? 'SI');
  const settle = useWorkbench((state) => state.settle);
  const writeAll = useWriteAll();
  const [chosen, setChosen] = useState<Units>({});
  const rows = rowsIn(list);
  const columns = readColumns(
    kind,
    typeof signal === 'string' ? signal : '',
    kind === 'transmitter' && isGroup(lowRange),
  );
  const units = unitsOf(rows, columns, chosen, display);
  const chooseUnit = (name: string, unit: Unit): void => {
    setChosen({ ...chosen, [name]: unit });
    const column = columns.find((one) => one.name === name);
    if (column?.kind === undefined) return;
    writeAll(rows.map((row, at) => [`${PATH}.${at}.${name}`, convertedCell(textAt(row, name), column, unit)]));
  };
  const replace = (next: readonly unknown[]): void => writeAll([[PATH, next.length === 0 ? undefined : next]]);
  const write = (path: string, text: string): void => writeAll([[path, text]]);
  return { rows, columns, units, chooseUnit, replace, write, settle };
}

const isGroup = (value: unknown): boolean => typeof value === 'object' && value !== null;

/** Enter goes down the column, with Shift up; Ctrl + D takes the cell above. */
function onKey(event: KeyboardEvent, { rows, write, settle }: Table): void {
  const { target } = event;
  if (!(target instanceof HTMLInputElement)) return;
  const [, row, name = ''] = CELL.exec(target.dataset.field ?? '') ?? [];
  if (row === undefined) return;
  if (event.key === 'Enter') {
    event.preventDefault();
    event.stopPropagation();
    settle();
    focusField(`${PATH}.${Math.max(0, Number(row) + (event.shiftKey ? -1 : 1))}.${name}`);
  }
  if (event.key.toLowerCase() === 'd' && (event.ctrlKey || event.metaKey)) {
    event.preventDefault();
    const above = fromAbove(rows, name, Number(row));
    if (above !== '') write(`${PATH}.${row}.${name}`, above);
  }
}
