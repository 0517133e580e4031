/** Rows of quantities with their units, typed or pasted. */
import { useState } from 'react';
import type { Display } from '../../../core/document/project.ts';
import { type Unit, unitOf } from '../../../core/quantity/units.ts';
import { pasteWords } from '../../words/fluid-forms.ts';
import { useWorkbench } from '../binding.tsx';
import buttons from '../button.module.css';
import { useWriteAll, useWritten } from '../hand.tsx';
import { textAt } from '../text.ts';
import styles from './inputs.module.css';
import { Problems } from './Problems.tsx';
import { RowsTable } from './RowsTable.tsx';
import { columnUnit, convertedCell, rowsIn, type TableColumn } from './rows.ts';
import { TablePaste } from './TablePaste.tsx';

interface Props {
  readonly path: string;
  readonly columns: readonly TableColumn[];
}

type Units = Readonly<Record<string, Unit>>;

export function RowsEditor({ path, columns }: Props) {
  const list = useWritten(path);
  const display = useWorkbench((state) => state.project.display ?? 'SI');
  const writeAll = useWriteAll();
  const [chosen, setChosen] = useState<Units>({});
  const [pasted, setPasted] = useState<string>();
  const rows = rowsIn(list);
  const units = unitsOf(rows, columns, chosen, display);

  const chooseUnit = (column: TableColumn, unit: Unit): void => {
    setChosen({ ...chosen, [column.name]: unit });
    writeAll(
      rows.map((row, at) => [`${path}.${at}.${column.name}`, convertedCell(textAt(row, column.name), column, unit)]),
    );
  };

  if (pasted !== undefined)
    return (
      <TablePaste text={pasted} close={() => setPasted(undefined)} {...{ path, columns, units }} took={setChosen} />
    );
  return (
    <>
      <RowsTable {...{ path, columns, units, chooseUnit }} paste={setPasted} />
      <Problems below={path} />
      <button type="button" className={`${buttons.framed} ${styles.order}`} onClick={() => setPasted('')}>
        {pasteWords.open}
      </button>
    </>
  );
}

/** The unit of each column: as chosen, as its rows are written, else the usual one of the display. */
function unitsOf(rows: readonly unknown[], columns: readonly TableColumn[], chosen: Units, display: Display): Units {
  return Object.fromEntries(
    columns.map((column) => {
      const usual = unitOf(column.kind.unit[display], column.kind.measures);
      const unit = chosen[column.name] ?? columnUnit(rows, column) ?? usual;
      if (unit === undefined) throw new Error(`expected a unit of ${column.name}, got ${column.kind.unit[display]}`);
      return [column.name, unit];
    }),
  );
}
