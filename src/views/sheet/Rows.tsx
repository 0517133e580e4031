/** Figures one below the other: name, symbol, value, number of the source. */
import type { SheetRow } from '../present/sources.ts';
import { Block } from './Block.tsx';
import { SymbolText } from './SymbolText.tsx';
import tables from './table.module.css';

export function Rows({ title, rows }: { readonly title: string; readonly rows: readonly SheetRow[] }) {
  return (
    <Block title={title}>
      <table className={tables.table}>
        <tbody>
          {rows.map(({ id, label, symbol, text, key, note }) => (
            <tr key={id}>
              <th scope="row">
                {label} {symbol && <SymbolText text={symbol} />}
                {note && <small> ({note})</small>}
              </th>
              <td className={tables.figure}>{text}</td>
              <td className={tables.key}>{key}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </Block>
  );
}
