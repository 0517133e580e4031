/** A table of quantities that the user fills in: the unit of a column stands above it, rows keep their text. */
import type { Unit } from '../../../core/quantity/units.ts';
import { tableWords as words } from '../../words/fluid-forms.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { useWrite, useWriteAll, useWritten } from '../hand.tsx';
import { textAt } from '../text.ts';
import { Cell } from './Cell.tsx';
import { ColumnUnit } from './ColumnUnit.tsx';
import styles from './inputs.module.css';
import { fileCell, rowsIn, shownCell, type TableColumn } from './rows.ts';

interface Props {
  readonly path: string;
  readonly columns: readonly TableColumn[];
  readonly units: Readonly<Record<string, Unit>>;
  readonly chooseUnit: (column: TableColumn, unit: Unit) => void;
  readonly paste: (table: string) => void;
}

export function RowsTable({ path, columns, units, chooseUnit, paste }: Props) {
  const count = rowsIn(useWritten(path)).length;
  const rows = Array.from({ length: count + 1 }, (_, at) => at); // one more, to be filled
  return (
    <table className={styles.table}>
      <thead>
        <tr>
          {columns.map((column) => (
            <th key={column.name} scope="col">
              {column.label}
              <ColumnUnit column={column} unit={units[column.name]} choose={(unit) => chooseUnit(column, unit)} />
            </th>
          ))}
          <td className={styles.narrow} />
        </tr>
      </thead>
      <tbody>
        {rows.map((at) => (
          <Row key={at} {...{ path, columns, units, at, paste }} last={at === count} />
        ))}
      </tbody>
    </table>
  );
}

interface RowProps extends Omit<Props, 'chooseUnit'> {
  readonly at: number;
  readonly last: boolean;
}

function Row({ path, columns, units, at, last, paste }: RowProps) {
  const row = useWritten(`${path}.${at}`);
  const write = useWrite();
  const writeAll = useWriteAll();
  const settle = useWorkbench((state) => state.settle);
  return (
    <tr>
      {columns.map((column) => {
        const unit = units[column.name];
        const cell = `${path}.${at}.${column.name}`;
        return (
          <td key={column.name}>
            <Cell
              path={cell}
              label={words.row(column.label, at)}
              text={textAt(row, column.name)}
              shown={(text) => (unit ? shownCell(text, column, unit) : text)}
              file={(typed) => (unit ? fileCell(typed, column, unit) : typed)}
              write={(text) => write(cell, text)}
              settle={settle}
              paste={paste}
            />
          </td>
        );
      })}
      <td className={styles.narrow}>
        {!last && (
          <button
            type="button"
            className={buttons.remove}
            aria-label={words.remove(at)}
            onClick={() => writeAll([[`${path}.${at}`, undefined]])}
          >
            ×
          </button>
        )}
      </td>
    </tr>
  );
}
