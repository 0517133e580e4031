/** Sums -> what they say of a day or of the whole log. */
import { sumOf } from '../numeric/neumaier.ts';
import type { Extreme, PeriodRecord } from '../result/log-record.ts';
import { accounts, FIRST_REFUSED } from './account.ts';
import { EXTREME, extremeOf, integral, type Period, SUM } from './period.ts';

/** The record of a period; `baseDensity` in kg/m3 where the fluid has one. */
export function periodRecord(period: Period, baseDensity: number | undefined): PeriodRecord {
  const { rows, seconds } = period;
  const mass = integral(period, SUM.mass);
  const flowing = integral(period, SUM.flowing);
  const lasted = integral(period, SUM.seconds);
  const counted = rows.reduce((sum, count) => sum + count, 0);
  const converted = rows.slice(0, FIRST_REFUSED).reduce((sum, count) => sum + count, 0);
  return {
    rows: counted,
    converted,
    total_kg: mass,
    volume_m3: integral(period, SUM.volume),
    ...(baseDensity === undefined ? {} : { baseVolume_m3: mass / baseDensity }),
    seconds: lasted,
    flowing_s: flowing,
    still_s: Math.max(0, lasted - flowing),
    gap_s: period.gapSeconds,
    gaps: period.gaps,
    ...(lasted > 0 ? meansOf(period, mass, lasted) : {}),
    ...(converted > 0 ? { extremes: extremesOf(period) } : {}),
    reasons_s: Object.fromEntries(
      accounts.flatMap(({ code, fate }, at) => {
        const time = seconds[at] as number;
        return fate === 'converted' || time === 0 ? [] : [[code, time]];
      }),
    ),
  };
}

function meansOf(period: Period, mass: number, lasted: number) {
  const differential = integral(period, SUM.differential) / lasted;
  const root = integral(period, SUM.root) / lasted;
  const [pressure, temperature] =
    mass > 0
      ? [integral(period, SUM.flowPressure) / mass, integral(period, SUM.flowTemperature) / mass]
      : [integral(period, SUM.pressure) / lasted, integral(period, SUM.temperature) / lasted];
  return {
    meanMassFlow_kg_s: mass / lasted,
    meanDifferential_Pa: differential,
    meanRoot_rootPa: root,
    meanPressure_Pa: pressure,
    meanTemperature_K: temperature,
    ...(root > 0 && differential > 0 ? { rootingError_percent: 100 * (Math.sqrt(differential) / root - 1) } : {}),
  };
}

function extremesOf(period: Period) {
  const of = (column: number): Extreme => {
    const [least = 0, leastAt_s = 0, most = 0, mostAt_s = 0] = extremeOf(period, column);
    return { least, leastAt_s, most, mostAt_s };
  };
  return {
    massFlow_kg_s: of(EXTREME.flow),
    differential_Pa: of(EXTREME.differential),
    pressure_Pa: of(EXTREME.pressure),
    temperature_K: of(EXTREME.temperature),
  };
}

/** Mass in kg that passed while an account lasted. */
export const massOf = ({ mass }: Period, account: number): number => sumOf(mass, account);
