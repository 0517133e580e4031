/** The curve of flow against differential, in display units. */
import { fromSI } from '../../core/quantity/units.ts';
import type { Solved } from '../../core/result/record.ts';
import { aboveReynolds, belowReynolds, chartSummary, dutyAt, outsideRange } from '../words/charts.ts';
import { rulesOf } from '../words/elements.ts';
import { type Context, flowOf, maximumOf } from './context.ts';
import type { Chart, ChartPoint, DutyRow } from './model.ts';
import { flowRole } from './units.ts';

export function chartOf(at: Context, result: Solved, duty: readonly DutyRow[]): Chart {
  const { flow, differential } = at.units;
  const maximum = maximumOf(result);
  const perMass = (flowOf(maximum, flowRole(flow)) ?? maximum.massFlow_kg_s) / maximum.massFlow_kg_s;
  const unit = flowOf(maximum, flowRole(flow)) === undefined ? at.units.massFlow : flow;
  const points = result.curve.map((point): ChartPoint => {
    const middle = fromSI(point.massFlow_kg_s * perMass, unit);
    const half = (middle * point.expanded_percent) / 100;
    return {
      differential: fromSI(point.differential_Pa, differential),
      flow: middle,
      low: middle - half,
      high: middle + half,
      inside: point.inside,
    };
  });
  const outside = outsideRanges(result);
  const limited = result.reynoldsLimits.source !== undefined;
  return {
    points,
    duty: duty.map(({ name, label, cells }) => ({
      name,
      label,
      differential: fromSI(cells.differential.si, differential),
      flow: fromSI(cells.flow.si, unit),
    })),
    differentialUnit: differential.print,
    flowUnit: unit.print,
    banded: result.curve.some((point) => point.expanded_percent > 0),
    limited,
    outside: outside.map(({ from, to, label }) => ({
      from: fromSI(from, differential),
      to: fromSI(to, differential),
      label,
    })),
    summary: summaryOf(at, result, duty, outside),
  };
}

function summaryOf(at: Context, result: Solved, duty: readonly DutyRow[], outside: readonly Range[]): string {
  const figure = (si: number): string => at.print.figure(si, 'differential');
  return chartSummary(
    duty.map(({ cells }) => dutyAt(cells.flow.text, cells.differential.text)),
    outside.map(({ from, to, label }) => outsideRange(figure(from), figure(to), label)),
    result.reynoldsLimits.source === undefined ? undefined : rulesOf(result.element),
  );
}

interface Range {
  readonly from: number; // Pa
  readonly to: number;
  readonly label: string;
}

/** Less of the span than this shows nothing on the axis, and matters only where a duty point lies in it. */
const VISIBLE = 0.002;

/** The differentials below and above the Reynolds limits, as far as the span reaches into them. */
function outsideRanges({ element, reynoldsLimits: limits, span_Pa, points, curve }: Solved): readonly Range[] {
  const rules = rulesOf(element);
  const { maxDifferential_Pa: high } = limits;
  const least = Math.min(...Object.values(points).map((point) => point.differential_Pa));
  const most = Math.max(span_Pa, ...Object.values(points).map((point) => point.differential_Pa));
  const low = limits.minDifferential_Pa ?? (isBelow(limits.min, curve) ? most : undefined);
  const seen = low !== undefined && (low > VISIBLE * span_Pa || least < low);
  return [
    ...(seen ? [{ from: 0, to: Math.min(low, most), label: belowReynolds(rules) }] : []),
    ...(high !== undefined && high < most ? [{ from: high, to: most, label: aboveReynolds(rules) }] : []),
  ];
}

/** The whole curve below a least Reynolds number that no differential reaches. */
const isBelow = (least: number | undefined, curve: Solved['curve']): boolean =>
  least !== undefined && curve.every(({ reynoldsPipe }) => reynoldsPipe < least);
