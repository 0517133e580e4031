/** What the readings of a meter come to together: mean, extremes, the error of rooting the mean, counts by finding. */
import type { Verdict } from '../check/finding.ts';
import { as } from '../quantity/brand.ts';
import type { FlowRecord, ReadingRecord, ReadingSummary, SolvedReading } from '../result/readings-record.ts';
import { flowRecord } from './reading.ts';
import { flowAt, type Standing } from './standing.ts';

type Counted = SolvedReading & FlowRecord & { readonly differential_Pa: number };

/** The summary of the rows as solved. Only rows whose flow stands for what flowed enter the mean. */
export function summaryOf(stands: Standing, rows: readonly ReadingRecord[]): ReadingSummary {
  const counted = rows.flatMap((row, index) => (isCounted(row) ? [{ row, index }] : []));
  const flows = counted.map(({ row }) => row);
  const extreme = (sign: 1 | -1) => {
    const [first, ...rest] = counted;
    if (first === undefined) return undefined;
    const most = rest.reduce(
      (best, one) => (sign * one.row.massFlow_kg_s > sign * best.row.massFlow_kg_s ? one : best),
      first,
    );
    return { row: most.index, ...flowsOf(most.row) };
  };
  const [minimum, maximum] = [extreme(-1), extreme(1)];
  const mean = flows.length === 0 ? undefined : meanFlow(flows);
  const rooted = mean === undefined ? undefined : rootedMean(stands, flows, mean.massFlow_kg_s);
  return {
    rows: rows.length,
    refused: rows.filter(({ status }) => status === 'refused').length,
    counted: flows.length,
    ...(mean === undefined ? {} : { mean }),
    ...(minimum === undefined ? {} : { minimum }),
    ...(maximum === undefined ? {} : { maximum }),
    ...(rooted === undefined ? {} : { rooted }),
    flags: flagsOf(rows),
  };
}

const isCounted = (row: ReadingRecord): row is Counted =>
  row.status === 'solved' && row.counted && row.massFlow_kg_s !== undefined && row.differential_Pa !== undefined;

const flowsOf = ({ massFlow_kg_s, volumeFlow_m3_s, baseVolumeFlow_m3_s }: FlowRecord): FlowRecord => ({
  massFlow_kg_s,
  volumeFlow_m3_s,
  ...(baseVolumeFlow_m3_s === undefined ? {} : { baseVolumeFlow_m3_s }),
});

const meanOf = (values: readonly number[]): number => values.reduce((sum, value) => sum + value, 0) / values.length;

function meanFlow(flows: readonly Counted[]): FlowRecord {
  const base = flows.flatMap(({ baseVolumeFlow_m3_s: flow }) => (flow === undefined ? [] : [flow]));
  return {
    massFlow_kg_s: meanOf(flows.map((row) => row.massFlow_kg_s)),
    volumeFlow_m3_s: meanOf(flows.map((row) => row.volumeFlow_m3_s)),
    ...(base.length === flows.length ? { baseVolumeFlow_m3_s: meanOf(base) } : {}),
  };
}

/** The flow of the mean differential at the mean of the states; absent where that makes none. */
function rootedMean(stands: Standing, flows: readonly Counted[], mean: number): ReadingSummary['rooted'] {
  const differential = as<'pressure difference'>(meanOf(flows.map((row) => row.differential_Pa)));
  if (!(differential > 0 && mean > 0)) return undefined;
  const flow = flowAt(stands, meanMoment(stands, flows), differential);
  if (!flow.ok) return undefined;
  const { operation, meter } = flow.value;
  const error = 100 * (operation.massFlow / mean - 1);
  return { differential_Pa: differential, ...flowRecord(operation.massFlow, meter.state), error_percent: error };
}

/** Mean pressure and temperature of the rows; the meter's own where every row stands there. */
function meanMoment({ solution, upstream }: Standing, flows: readonly Counted[]) {
  const { pressure, temperature } = solution.meter.state;
  const same = flows.every((row) => row.pressure_Pa === pressure && row.temperature_K === temperature);
  if (same || upstream.downstream === true) return {};
  return {
    pressure: as<'absolute pressure'>(meanOf(flows.map((row) => row.pressure_Pa))),
    ...(upstream.temperature === undefined
      ? {}
      : { temperature: as<'temperature'>(meanOf(flows.map((row) => row.temperature_K))) }),
  };
}

/** How many rows have each finding, the gravest first and then the most frequent. */
function flagsOf(rows: readonly ReadingRecord[]): ReadingSummary['flags'] {
  const counts = new Map<string, { id: string; verdict: Verdict; count: number }>();
  for (const row of rows) {
    if (row.status === 'refused') continue;
    const found = row.checks.filter(({ verdict }) => verdict !== 'inside');
    for (const key of new Set(found.map(({ id, verdict }) => `${verdict} ${id}`))) {
      const [verdict = '', id = ''] = key.split(' ');
      const before = counts.get(key) ?? { id, verdict: verdict as Verdict, count: 0 };
      counts.set(key, { ...before, count: before.count + 1 });
    }
  }
  const rank = ({ verdict }: { readonly verdict: Verdict }) => (verdict === 'outside' ? 0 : 1);
  return [...counts.values()].sort((one, other) => rank(one) - rank(other) || other.count - one.count);
}
