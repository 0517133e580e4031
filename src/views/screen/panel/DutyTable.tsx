/** The meter at each flow. Every figure opens its working; the table copies into a spreadsheet. */
import type { ReactNode } from 'react';
import type { DutyColumn, DutyRow, PresentedSizing, Value } from '../../present/model.ts';
import { CopyTable } from './CopyTable.tsx';
import { type Cell, number, words } from './clipboard.ts';
import styles from './DutyTable.module.css';
import { Panel } from './Panel.tsx';
import { openWorking } from './working-place.ts';

/** Columns in the order of reading, and the working line that each figure opens. */
interface Column {
  readonly id: DutyColumn;
  readonly label: string;
  readonly working: string;
}
const COLUMNS: readonly Column[] = [
  { id: 'flow', label: 'Flow', working: 'mass-flow' },
  { id: 'differential', label: 'Differential', working: 'differential' },
  { id: 'reynolds', label: 'Re (pipe)', working: 'reynolds-pipe' },
  { id: 'coefficient', label: 'C', working: 'C' },
  { id: 'expansibility', label: 'ε', working: 'epsilon' },
  { id: 'loss', label: 'Permanent loss', working: 'loss' },
  { id: 'velocity', label: 'Velocity', working: 'velocity' },
  { id: 'uncertainty', label: 'Uncertainty', working: 'uncertainty' },
];

/** The columns that the flows have figures for, with the coefficient under its own symbol. */
const columnsOf = ({ duty, coefficient }: PresentedSizing): readonly Column[] =>
  COLUMNS.filter(({ id }) => duty.some((row) => row.cells[id] !== undefined)).map((column) =>
    column.id === 'coefficient' ? { ...column, label: coefficient.symbol } : column,
  );

/** The one unit of a column; '' where its rows have none or are written in different ones. */
function unitOf(rows: readonly DutyRow[], column: DutyColumn): string {
  const [first, ...more] = new Set(rows.flatMap((row) => row.cells[column]?.unit ?? []));
  return first === undefined || more.length > 0 ? '' : first;
}

function cellsOf(rows: readonly DutyRow[], columns: readonly Column[]): readonly (readonly Cell[])[] {
  const heads = columns.map(({ id, label }) => words([label, unitOf(rows, id)].filter(Boolean).join(' / ')));
  const figure = (id: DutyColumn, value: Value | undefined): Cell => {
    if (value === undefined) return words('');
    return number(unitOf(rows, id) === '' ? value.plain : (value.plain.split(' ')[0] ?? value.plain));
  };
  const line = (row: DutyRow): readonly Cell[] => [
    words(row.label),
    ...columns.map(({ id }) => figure(id, row.cells[id])),
  ];
  return [[words('Duty'), ...heads], ...rows.map(line)];
}

export function DutyTable({ sizing, stale }: { readonly sizing: PresentedSizing; readonly stale: boolean }) {
  const { duty, certainty } = sizing;
  const columns = columnsOf(sizing);
  return (
    <Panel id="duty" title="At each flow" stale={stale} aside={<CopyTable cells={cellsOf(duty, columns)} />}>
      <div className={styles.scroll}>
        <table className={styles.table}>
          <thead>
            <tr>
              <td />
              {columns.map(({ id, label }) => (
                <th key={id} scope="col">
                  {label}
                  {unitOf(duty, id) !== '' && <span className={styles.unit}>/ {unitOf(duty, id)}</span>}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {duty.map((row) => (
              <tr key={row.name}>
                <th scope="row">{row.label}</th>
                {columns.map(({ id, label, working }) => (
                  <td key={id}>
                    <Opens label={label} onClick={() => openWorking(row.name, working)}>
                      {figureText(row.cells[id], unitOf(duty, id))}
                    </Opens>
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {certainty !== '' && <p className={styles.certainty}>{certainty}</p>}
      <Shares duty={duty} />
    </Panel>
  );
}

/** A figure alone where its column says the unit. */
const figureText = (value: Value | undefined, unit: string) => (unit === '' ? value?.text : value?.number);

interface OpensProps {
  readonly label: string;
  readonly onClick: () => void;
  readonly children: ReactNode;
}

/** A figure that opens its working. */
const Opens = ({ label, onClick, children }: OpensProps) => (
  <button type="button" title={`${label}: open its working`} onClick={onClick}>
    {children}
  </button>
);

/** Which input makes the uncertainty of each flow, largest first. */
function Shares({ duty }: { readonly duty: readonly DutyRow[] }) {
  return (
    <details className={styles.shares}>
      <summary>What makes the uncertainty</summary>
      {duty.map((row) => (
        <p key={row.name}>
          <b>{row.label}</b>
          {row.terms.map((term) => (
            <span key={term.id}>
              {term.label} {term.value.text}
            </span>
          ))}
        </p>
      ))}
    </details>
  );
}
