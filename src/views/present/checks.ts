/** The checks under the assumptions of Bernoulli's equation that they guard. */
import type { Solved } from '../../core/result/record.ts';
import { assumptions } from '../words/assumptions.ts';
import { findingText, uncheckedText } from '../words/findings.ts';
import { meterVerdict, verdictWords } from '../words/verdicts.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { CheckGroup, CheckRow, Finding } from './model.ts';

/** Assumptions with neither a check nor one that is open are left out. */
export function checkGroups(
  at: Pick<Context, 'print'>,
  result: Pick<Solved, 'checks' | 'unchecked'>,
): readonly CheckGroup[] {
  const rows = result.checks.map((finding) => ({ assumption: finding.assumption, row: checkRow(at, finding) }));
  return assumptions.flatMap(({ assumption, title, meaning }) => {
    const own = rows.filter((row) => row.assumption === assumption).map(({ row }) => row);
    const open = result.unchecked
      .filter((one) => one.assumption === assumption)
      .map(({ needs }) => uncheckedText(needs));
    if (own.length === 0 && open.length === 0) return [];
    const verdict = own.length === 0 ? 'unchecked' : meterVerdict(own.map((row) => row.verdict)).worst;
    return [{ assumption, title, meaning, verdict, rows: own, open }];
  });
}

export function checkRow(at: Pick<Context, 'print'>, finding: Finding): CheckRow {
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
