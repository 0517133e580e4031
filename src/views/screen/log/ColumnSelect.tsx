/** The choice of a column of the log. */
import type { PresentedLook } from '../../present/log-model.ts';
import styles from './Log.module.css';

export type Columns = PresentedLook['columns'];

/** A column as the document names it: by its name, or by its number where the name says nothing. */
export const nameOf = (columns: Columns, at: number): string | number => {
  const name = columns[at]?.name ?? '';
  return columns.filter((one) => one.name === name).length === 1 ? name : at + 1;
};

/** Place of a column that is named or numbered; -1 for one that is not there. */
const placeOf = (columns: Columns, written: unknown): number =>
  typeof written === 'number' ? written - 1 : columns.findIndex(({ name }) => name === written);

interface SelectProps {
  readonly id: string;
  readonly path: string;
  readonly columns: Columns;
  readonly written: unknown;
  readonly open: string;
  readonly problem: string | undefined;
  readonly choose: (at: number) => void;
}

/** The choice of a column; one that the log does not have is kept and shown as it is written. */
export function ColumnSelect({ id, path, columns, written, open, problem, choose }: SelectProps) {
  const at = placeOf(columns, written);
  const isForeign = written !== undefined && columns[at] === undefined;
  return (
    <select
      id={id}
      className={styles.column}
      data-field={path}
      aria-invalid={problem !== undefined}
      value={isForeign ? 'foreign' : at}
      onChange={(event) => choose(Number(event.target.value))}
    >
      <option value={-1}>{open}</option>
      {isForeign && <option value="foreign">{String(written)}</option>}
      {columns.map((column) => (
        <option key={column.at} value={column.at}>
          {column.name}
        </option>
      ))}
    </select>
  );
}
