/** A table of dimensions or lengths, each with the number of its source. */
import type { FigureRow } from '../present/sheet-tables.ts';
import { Block } from './Block.tsx';
import styles from './content.module.css';
import { SymbolText } from './SymbolText.tsx';
import tables from './table.module.css';

interface FiguresProps {
  readonly title: string;
  readonly rows: readonly FigureRow[];
  readonly heads: readonly string[];
}

export function Figures({ title, rows, heads }: FiguresProps) {
  return (
    <Block title={title}>
      <table className={tables.table}>
        {heads.length > 0 && (
          <thead>
            <tr>
              {heads.map((head) => (
                <th key={head} scope="col">
                  {head}
                </th>
              ))}
              <td />
            </tr>
          </thead>
        )}
        <tbody>
          {rows.map((row) => (
            <Figure key={row.id} row={row} />
          ))}
        </tbody>
      </table>
    </Block>
  );
}

function Figure({ row: { label, symbol, cells, key, note, chosen } }: { readonly row: FigureRow }) {
  return (
    <tr className={chosen ? styles.chosen : undefined}>
      <th scope="row">
        {label} {symbol && <SymbolText text={symbol} />}
        {note && <small> ({note})</small>}
      </th>
      {cells.map((cell, at) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: a cell is known by its column
        <td key={at} className={tables.figure}>
          {cell}
        </td>
      ))}
      <td className={tables.key}>{key}</td>
    </tr>
  );
}
