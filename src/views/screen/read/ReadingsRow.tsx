/** One row of the table of readings: its boxes, what it makes, and how it stands. */
import type { ReadingColumn, ReadingRow } from '../../present/readings-model.ts';
import { readWords as words } from '../../words/readings.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { Cell } from '../fluid/Cell.tsx';
import { isTable } from '../fluid/paste.ts';
import { fileCell, shownCell } from '../fluid/rows.ts';
import { useWrite, useWriteAll } from '../hand.tsx';
import { textAt } from '../text.ts';
import { VerdictMark } from '../VerdictMark.tsx';
import type { ReadColumn, Units } from './columns.ts';
import styles from './Read.module.css';
import { FIRST, MORE } from './ReadingsHead.tsx';

interface Props {
  readonly at: number;
  readonly row: unknown;
  readonly columns: readonly ReadColumn[];
  readonly units: Units;
  readonly found: ReadingRow | undefined;
  readonly current: boolean;
  /** The empty row below the others, which a first letter makes one of them. */
  readonly last: boolean;
  readonly setCurrent: (row: number) => void;
  readonly paste: (text: string, row: number, column: number) => void;
}

export function ReadingsRow({ at, row, columns, units, found, current, last, setCurrent, paste }: Props) {
  const writeAll = useWriteAll();
  return (
    <tr data-current={current} data-row={at} onFocus={() => setCurrent(at)}>
      {columns.map((column, place) => (
        <td key={column.name} className={column.kind === undefined ? styles.time : styles.typed}>
          <Box {...{ at, row, column, units }} paste={(text) => paste(text, at, place)} />
        </td>
      ))}
      <Figures ids={FIRST} found={found} />
      <td className={styles.note}>
        {found && !last && <VerdictMark verdict={found.note.verdict} words={found.note.words} />}
      </td>
      <Figures ids={MORE} found={found} />
      <td>
        {!last && (
          <button
            type="button"
            className={buttons.remove}
            aria-label={words.remove(at)}
            onClick={() => writeAll([[`readings.${at}`, undefined]])}
          >
            ×
          </button>
        )}
      </td>
    </tr>
  );
}

interface FiguresProps extends Pick<Props, 'found'> {
  readonly ids: readonly ReadingColumn[];
}

const Figures = ({ ids, found }: FiguresProps) =>
  ids.map((id) => (
    <td key={id} className={styles.figure} data-figure={id}>
      {found?.figures[id]?.number ?? ''}
    </td>
  ));

interface BoxProps {
  readonly at: number;
  readonly row: unknown;
  readonly column: ReadColumn;
  readonly units: Units;
  readonly paste: (text: string) => void;
}

function Box({ at, row, column, units, paste }: BoxProps) {
  const write = useWrite();
  const settle = useWorkbench((state) => state.settle);
  const path = `readings.${at}.${column.name}`;
  const text = textAt(row, column.name);
  const unit = units[column.name];
  const label = words.cell(column.label, at);
  if (column.kind === undefined || unit === undefined)
    return (
      <input
        type="text"
        autoComplete="off"
        spellCheck={false}
        data-field={path}
        aria-label={label}
        value={text}
        onChange={(event) => write(path, event.target.value)}
        onPaste={(event) => {
          const pasted = event.clipboardData.getData('text/plain');
          if (!isTable(pasted)) return;
          event.preventDefault();
          paste(pasted);
        }}
        onBlur={settle}
      />
    );
  return (
    <Cell
      path={path}
      label={label}
      text={text}
      shown={(own) => shownCell(own, column, unit)}
      file={(typed) => fileCell(typed, column, unit)}
      write={(own) => write(path, own)}
      settle={settle}
      paste={paste}
    />
  );
}
