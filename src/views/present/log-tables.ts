/** The tables of a converted log: account of every row, least and most, days. */
import type { AccountRecord, Extreme, ShownRow } from '../../core/result/log-record.ts';
import { accountWordsOf } from '../words/log-accounts.ts';
import { extremeLabels, resultWords } from '../words/logs.ts';
import type { Role } from '../words/print.ts';
import type { LogContext } from './log-context.ts';
import type { AccountRow, DayRow, ExtremeRow } from './log-model.ts';
import { show } from './numbers.ts';
import { duration } from './stamps.ts';

/** The account of every row; the clean rows stand first. */
export function accountRows(at: LogContext): readonly AccountRow[] {
  const { record, value, count } = at;
  return record.accounts.map(({ code, fate, rows, seconds, mass_kg, first }: AccountRecord) => ({
    code,
    ...accountWordsOf(code),
    fate: resultWords.fates[fate],
    rows: count(rows),
    share: value((100 * rows) / record.rows, 'percent'),
    ...(seconds > 0 ? { time: duration(seconds) } : {}),
    ...(mass_kg === undefined ? {} : { mass: value(mass_kg, 'mass') }),
    first: first.map((shown) => firstText(at, shown)),
  }));
}

function firstText({ count, stamp }: LogContext, { row, time_s, text, problem }: ShownRow): string {
  const told = [
    time_s === undefined ? '' : stamp(time_s),
    text === undefined ? '' : `‘${text}’`,
    problem === undefined ? '' : problem.replaceAll('-', ' '),
  ];
  const said = told.filter(Boolean).join(', ');
  return said === '' ? count(row).number : `${count(row).number} (${said})`;
}

/** The least and the most of each quantity with their moments; none where no row was converted. */
export function extremeRows({ record, value, stamp }: LogContext): readonly ExtremeRow[] {
  const { extremes } = record;
  if (extremes === undefined) return [];
  const one = (key: keyof typeof extremeLabels, role: Role, { least, leastAt_s, most, mostAt_s }: Extreme) => ({
    key,
    label: extremeLabels[key],
    least: value(least, role),
    leastAt: stamp(leastAt_s),
    most: value(most, role),
    mostAt: stamp(mostAt_s),
  });
  return [
    one('massFlow', 'massFlow', extremes.massFlow_kg_s),
    one('differential', 'differential', extremes.differential_Pa),
    one('pressure', 'pressure', extremes.pressure_Pa),
    one('temperature', 'temperature', extremes.temperature_K),
  ];
}

/** Day by day. Flagged is the time of every account but the clean one. */
export function dayRows({ record, value }: LogContext): readonly DayRow[] {
  return record.days.map((day) => {
    const { date, from_s, total_kg, baseVolume_m3, meanMassFlow_kg_s: mean, extremes, flowing_s, gap_s } = day;
    const flagged = Object.values(day.reasons_s).reduce((sum, seconds) => sum + seconds, 0);
    return {
      key: `${date} ${show(from_s, undefined, { decimals: 0 }).plain}`,
      date,
      mass: value(total_kg, 'mass'),
      ...(baseVolume_m3 === undefined ? {} : { baseVolume: value(baseVolume_m3, 'volume') }),
      ...(mean === undefined ? {} : { mean: value(mean, 'massFlow') }),
      ...(extremes === undefined
        ? {}
        : {
            least: value(extremes.massFlow_kg_s.least, 'massFlow'),
            most: value(extremes.massFlow_kg_s.most, 'massFlow'),
          }),
      flowing: duration(flowing_s),
      flagged: duration(flagged),
      gap: duration(gap_s),
    };
  });
}
