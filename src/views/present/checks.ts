/** The checks under the assumptions of Bernoulli's equation that they guard. */
import type { Solved } from '../../core/result/record.ts';
import { assumptions } from '../words/assumptions.ts';
import { findingText } from '../words/findings.ts';
import { meterVerdict, verdictWords } from '../words/verdicts.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { CheckGroup, CheckRow, Finding } from './model.ts';

/** Assumptions without a check are left out. */
export function checkGroups(at: Context, result: Solved): readonly CheckGroup[] {
  const rows = result.checks.map((finding) => ({ assumption: finding.assumption, row: checkRow(at, finding) }));
  return assumptions.flatMap(({ assumption, title, meaning }) => {
    const own = rows.filter((row) => row.assumption === assumption).map(({ row }) => row);
    if (own.length === 0) return [];
    return [{ assumption, title, meaning, verdict: meterVerdict(own.map((row) => row.verdict)).worst, rows: own }];
  });
}

function checkRow(at: Context, finding: Finding): CheckRow {
  const { id, verdict, source, at: name } = finding;
  return {
    id,
    key: name === undefined ? id : `${id}.${name}`,
    verdict,
    verdictWord: verdictWords[verdict],
    ...findingText(finding, at.print),
    cited: cited(source),
    ...(name === undefined ? {} : { at: name }),
  };
}
