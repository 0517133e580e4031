/** Verdicts, duty points and the unknown in words. */
import type { Finding } from '../../core/check/finding.ts';
import type { DutyName, Unknown } from '../../core/document/project.ts';

export type Verdict = Finding['verdict'];

export const verdictWords: Readonly<Record<Verdict, string>> = {
  inside: 'inside',
  caution: 'caution',
  outside: 'outside',
};

/** How an assumption stands: its worst verdict, or no check at all. */
export const standingWords: Readonly<Record<Verdict | 'unchecked', string>> = {
  ...verdictWords,
  unchecked: 'not checked',
};

/** The state of a whole meter: 'inside', '1 caution', '2 outside', 'not solved'. */
export function meterVerdict(verdicts: readonly Verdict[]): { readonly worst: Verdict; readonly words: string } {
  const outside = verdicts.filter((verdict) => verdict === 'outside').length;
  if (outside > 0) return { worst: 'outside', words: `${outside} outside` };
  const cautions = verdicts.filter((verdict) => verdict === 'caution').length;
  if (cautions > 0) return { worst: 'caution', words: cautions === 1 ? '1 caution' : `${cautions} cautions` };
  return { worst: 'inside', words: 'inside' };
}

export const notSolved = 'not solved';

export const dutyNames: readonly DutyName[] = ['maximum', 'normal', 'minimum'];

export const dutyLabels: Readonly<Record<DutyName, string>> = {
  maximum: 'maximum',
  normal: 'normal',
  minimum: 'minimum',
};

/** What the differential and the flow of an averaging pitot were found from. */
export const foundFromBar: Readonly<Record<Unknown, string>> = {
  bore: '',
  differential: 'found from flow and K',
  flow: 'found from K and differential',
};

/** What an unknown was found from, beside the shaded field. */
export const foundFrom: Readonly<Record<Unknown, string>> = {
  bore: 'found from flow and differential',
  differential: 'found from flow and bore',
  flow: 'found from bore and differential',
};
