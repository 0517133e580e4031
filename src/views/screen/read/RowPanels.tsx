/** The row at hand: its checks, and the working of its differential and its flow. */
import type { ReadingRow } from '../../present/readings-model.ts';
import { readWords as words } from '../../words/readings.ts';
import { Clause } from '../Clause.tsx';
import checks from '../panel/Checks.module.css';
import { Panel } from '../panel/Panel.tsx';
import working from '../panel/Working.module.css';
import { WorkingLine } from '../panel/WorkingLine.tsx';
import { VerdictMark } from '../VerdictMark.tsx';

export function RowChecks({ row }: { readonly row: ReadingRow }) {
  if (row.checks.length === 0) return null;
  return (
    <Panel id="row-checks" title={words.checks}>
      <ul>
        {row.checks.map((check) => (
          <li key={check.key} className={checks.row} data-verdict={check.verdict} data-check={check.id}>
            <VerdictMark verdict={check.verdict} words={check.verdictWord} />
            <p className={checks.text}>{check.text}</p>
            <p className={checks.held}>
              <span>{check.limit}</span>
              <Clause cited={check.cited} />
            </p>
          </li>
        ))}
      </ul>
    </Panel>
  );
}

export function RowWorking({ row }: { readonly row: ReadingRow }) {
  if (row.status === 'refused') return null;
  return (
    <Panel id="row-working" title={words.working}>
      <div className={working.group}>
        {row.working.map((line) => (
          <WorkingLine key={`${row.index} ${line.id}`} group="row" row={line} />
        ))}
      </div>
    </Panel>
  );
}
