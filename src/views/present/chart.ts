/** The curve of flow against differential, in display units. */
import { fromSI } from '../../core/quantity/units.ts';
import type { CurvePoint, Solved } from '../../core/result/record.ts';
import { aboveReynolds, belowReynolds, chartSummary, dutyAt, outsideRange } from '../words/charts.ts';
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
    outside: outside.map(({ from, to, label }) => ({
      from: fromSI(from, differential),
      to: fromSI(to, differential),
      label,
    })),
    summary: chartSummary(
      duty.map(({ cells }) => dutyAt(cells.flow.text, cells.differential.text)),
      outside.map(({ from, to, label }) =>
        outsideRange(at.print.figure(from, 'differential'), at.print.figure(to, 'differential'), label),
      ),
    ),
  };
}

interface Range {
  readonly from: number; // Pa
  readonly to: number;
  readonly label: string;
}

/** Runs of points outside the Reynolds limits, from the origin or the last point inside to the next one inside. */
function outsideRanges({ curve, reynoldsLimits: { min } }: Solved): readonly Range[] {
  const ranges: { from: number; to: number; label: string }[] = [];
  let before: CurvePoint | undefined;
  for (const point of curve) {
    const open = ranges.at(-1);
    if (!point.inside && (before === undefined || before.inside)) {
      const label = min !== undefined && point.reynoldsPipe < min ? belowReynolds : aboveReynolds;
      ranges.push({ from: before?.differential_Pa ?? 0, to: point.differential_Pa, label });
    } else if (open !== undefined && before?.inside === false) {
      open.to = point.differential_Pa;
    }
    before = point;
  }
  return ranges;
}
