/**
 * What became of a row of a log. Every row has exactly one account: converted, converted with a remark, or not converted
 * with the reason. Where several remarks fit, the one that stands first in this list is the account.
 */
import type { Fate } from '../result/log-record.ts';
import { TROUBLES } from './chunk.ts';

export interface Account {
  /** Code of its words. */
  readonly code: string;
  readonly fate: Fate;
}

/** Numbers of the accounts that are given to rows that could be read. */
export const ACCOUNT = {
  converted: 0,
  saturated: 1,
  uncertain: 2,
  negative: 3,
  belowCutOff: 4,
  outsideLimits: 5,
  pressureSubstituted: 6,
  temperatureSubstituted: 7,
  spike: 8,
  frozen: 9,
  hourRepeated: 10,
  fault: 11,
  pressureMissing: 12,
  temperatureMissing: 13,
  notSolved: 14,
  duplicate: 15,
  backward: 16,
} as const;

/** Accounts from here on are those of rows that are not converted. */
export const FIRST_REFUSED = ACCOUNT.fault;
/** Accounts from here on are those of rows without a place in time. */
export const FIRST_UNTIMED = ACCOUNT.duplicate;
/** Accounts from here on are those of rows that could not be read. */
export const FIRST_TROUBLE = 17;

const remarked = (code: string): Account => ({ code, fate: 'remarked' });
const refused = (code: string): Account => ({ code, fate: 'refused' });

/** Every account by its number. */
export const accounts: readonly Account[] = [
  { code: 'converted', fate: 'converted' },
  remarked('signal-saturated'),
  remarked('signal-uncertain'),
  remarked('differential-negative'),
  remarked('below-cut-off'),
  remarked('outside-limits'),
  remarked('pressure-substituted'),
  remarked('temperature-substituted'),
  remarked('spike'),
  remarked('frozen'),
  remarked('hour-repeated'),
  refused('signal-fault'),
  refused('pressure-missing'),
  refused('temperature-missing'),
  refused('not-solved'),
  refused('stamp-repeated'),
  refused('stamp-backward'),
  ...TROUBLES.slice(1).map(refused),
];

/** The account of a row with a trouble of the reader, above 0. */
export const accountOfTrouble = (trouble: number): number => FIRST_TROUBLE - 1 + trouble;
