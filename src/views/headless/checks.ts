/** A check as the file contract writes it, its sentence beside its figures. */
import type { Solved } from '../../core/result/record.ts';
import { findingText } from '../words/findings.ts';
import type { Print } from '../words/print.ts';

export interface Asked {
  /** Whether the working of every figure is written too. */
  readonly working?: boolean;
}

export function checkOf(finding: Solved['checks'][number], print: Print): object {
  const { id, assumption, verdict, value, unit, limit, source, at } = finding;
  const { text, limit: bounds } = findingText(finding, print);
  return {
    id,
    assumption,
    verdict,
    value,
    unit,
    limit,
    source: source.clause,
    seen: source.seen,
    ...(at === undefined ? {} : { at }),
    message: bounds === '' ? `${text}.` : `${text}; limit: ${bounds}.`,
  };
}
