/** The meter at each flow: one row a flow, one unit a column, the source of each figure in the head. */
import type { DutyTable as Table } from '../present/sheet-figures.ts';
import { sheetWords } from '../words/sheet.ts';
import { Block } from './Block.tsx';
import content from './content.module.css';
import { SymbolText } from './SymbolText.tsx';
import tables from './table.module.css';

interface DutyTableProps {
  readonly table: Table;
  readonly span: string;
  readonly certainty: string;
}

export function DutyTable({ table: { columns, rows }, span, certainty }: DutyTableProps) {
  return (
    <Block title={sheetWords.duty} aside={span}>
      <table className={tables.table}>
        <thead>
          <tr>
            <td />
            {columns.map(({ id, label, symbol, measure, key }) => (
              <th key={id} scope="col">
                {label}
                <span className={tables.unit}>
                  <SymbolText text={symbol} />
                  {measure.startsWith(',') ? measure : ` ${measure}`} <small>{key}</small>
                </span>
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ name, label, cells }) => (
            <tr key={name}>
              <th scope="row">{label}</th>
              {cells.map((cell, at) => (
                <td key={columns[at]?.id}>{cell}</td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      {certainty !== '' && <p className={content.exception}>{certainty}</p>}
    </Block>
  );
}
