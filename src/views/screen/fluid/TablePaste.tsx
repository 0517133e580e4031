/** Rows from a spreadsheet, looked over before they are taken. */
import { useState } from 'react';
import type { Unit } from '../../../core/quantity/units.ts';
import { pasteWords as words } from '../../words/fluid-forms.ts';
import { useWriteAll } from '../hand.tsx';
import { PastePanel } from './PastePanel.tsx';
import styles from './paste.module.css';
import { pastedTable, type Row } from './paste-table.ts';
import type { TableColumn } from './rows.ts';

interface Props {
  readonly path: string;
  readonly columns: readonly TableColumn[];
  readonly units: Readonly<Record<string, Unit>>;
  readonly text: string;
  readonly close: () => void;
  /** The units that the header named, for the columns. */
  readonly took: (units: Readonly<Record<string, Unit>>) => void;
}

export function TablePaste({ path, columns, units, text: pasted, close, took }: Props) {
  const writeAll = useWriteAll();
  const [text, setText] = useState(pasted);
  const asked = columns.map(({ name, kind }) => ({ name, measures: kind.measures }));
  const read = pastedTable(text, asked, units);
  const take = (): void => {
    writeAll([[path, read.rows]]);
    took({ ...units, ...read.units });
    close();
  };
  return (
    <PastePanel
      hint={words.tableHint(columns.map(({ label }) => label.toLowerCase()).join(', '))}
      text={text}
      change={setText}
      unread={read.unread}
      count={read.rows.length}
      take={take}
      close={close}
    >
      <Preview columns={columns} rows={read.rows} />
    </PastePanel>
  );
}

function Preview({ columns, rows }: { readonly columns: readonly TableColumn[]; readonly rows: readonly Row[] }) {
  return (
    <table className={styles.preview}>
      <caption>{words.preview}</caption>
      <thead>
        <tr>
          {columns.map(({ name, label }) => (
            <th key={name} scope="col">
              {label}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row, at) => (
          // The lines of a text have no other name than their place.
          // biome-ignore lint/suspicious/noArrayIndexKey: they never move
          <tr key={at}>
            {columns.map(({ name }) => (
              <td key={name}>{row[name] ?? '\u2013'}</td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
