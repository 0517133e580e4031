/** The meter at each flow. Every figure opens its working; the table copies into a spreadsheet. */
import type { DutyColumn, DutyRow, PresentedSizing, Value } from '../../present/model.ts';
import { CopyTable } from './CopyTable.tsx';
import { type Cell, number, words } from './clipboard.ts';
import styles from './DutyTable.module.css';
import { Panel } from './Panel.tsx';
import { openWorking } from './working-place.ts';

/** Columns in the order of reading, and the working line that each figure opens. */
const COLUMNS: readonly { readonly id: DutyColumn; readonly label: string; readonly working: string }[] = [
  { id: 'flow', label: 'Flow', working: 'mass-flow' },
  { id: 'differential', label: 'Differential', working: 'differential' },
  { id: 'reynolds', label: 'Re (pipe)', working: 'reynolds-pipe' },
  { id: 'coefficient', label: 'C', working: 'C' },
  { id: 'expansibility', label: 'ε', working: 'epsilon' },
  { id: 'loss', label: 'Permanent loss', working: 'loss' },
  { id: 'velocity', label: 'Velocity', working: 'velocity' },
  { id: 'uncertainty', label: 'Uncertainty', working: 'uncertainty' },
];

/** The one unit of a column; '' where its rows have none or are written in different ones. */
function unitOf(rows: readonly DutyRow[], column: DutyColumn): string {
  const [first, ...more] = new Set(rows.map((row) => row.cells[column].unit));
  return first === undefined || more.length > 0 ? '' : first;
}

function cellsOf(rows: readonly DutyRow[]): readonly (readonly Cell[])[] {
  const heads = COLUMNS.map(({ id, label }) => words([label, unitOf(rows, id)].filter(Boolean).join(' / ')));
  const figure = (id: DutyColumn, { plain }: Value): Cell =>
    unitOf(rows, id) === '' ? number(plain) : number(plain.split(' ')[0] ?? plain);
  const line = (row: DutyRow): readonly Cell[] => [
    words(row.label),
    ...COLUMNS.map(({ id }) => figure(id, row.cells[id])),
  ];
  return [[words('Duty'), ...heads], ...rows.map(line)];
}

export function DutyTable({ sizing, stale }: { readonly sizing: PresentedSizing; readonly stale: boolean }) {
  const { duty } = sizing;
  return (
    <Panel id="duty" title="At each flow" stale={stale} aside={<CopyTable cells={cellsOf(duty)} />}>
      <div className={styles.scroll}>
        <table className={styles.table}>
          <thead>
            <tr>
              <td />
              {COLUMNS.map(({ id, label }) => (
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
                {COLUMNS.map(({ id, label, working }) => (
                  <td key={id}>
                    <button
                      type="button"
                      title={`${label}: open its working`}
                      onClick={() => openWorking(row.name, working)}
                    >
                      {unitOf(duty, id) === '' ? row.cells[id].text : row.cells[id].number}
                    </button>
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      {sizing.certainty !== '' && <p className={styles.certainty}>{sizing.certainty}</p>}
      <Shares duty={duty} />
    </Panel>
  );
}

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
