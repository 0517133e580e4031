/** The duty points, one row for each flow. */
import type { DutyName } from '../../core/document/project.ts';
import type { PointRecord, Solved } from '../../core/result/record.ts';
import { termName } from '../words/uncertainty.ts';
import { dutyLabels, dutyNames, meterVerdict } from '../words/verdicts.ts';
import { coefficientOf } from './answer.ts';
import type { Context } from './context.ts';
import type { DutyRow, Row } from './model.ts';

export function dutyRows(at: Context, result: Solved): readonly DutyRow[] {
  return dutyNames.flatMap((name) => {
    const point = result.points[name];
    return point === undefined ? [] : [dutyRow(at, result, name, point)];
  });
}

function dutyRow(at: Context, result: Solved, name: DutyName, point: PointRecord): DutyRow {
  const { value } = at;
  const found = result.find === 'flow' && name === 'maximum';
  const { expanded_percent: expanded } = point.uncertainty;
  return {
    name,
    label: dutyLabels[name],
    cells: {
      flow: found ? at.flow(point) : at.givenFlow(at.meter.duty?.[name], point),
      differential: value(point.differential_Pa, 'differential'),
      reynolds: value(point.reynoldsPipe, 'reynolds'),
      coefficient: result.bore_m === undefined ? coefficientOf(at, point) : value(point.C, 'coefficient'),
      expansibility: value(point.epsilon, 'factor'),
      ...(point.permanentLoss_Pa === undefined ? {} : { loss: value(point.permanentLoss_Pa, 'loss') }),
      velocity: value(point.velocityPipe_m_s, 'velocity'),
      ...(expanded === undefined ? {} : { uncertainty: value(expanded, 'uncertainty') }),
    },
    terms: termRows(at, point, result.element),
    verdict: meterVerdict(result.checks.filter((finding) => finding.at === name).map(({ verdict }) => verdict)).worst,
  };
}

/** Shares of the uncertainty, largest first; a term of nothing is left out. */
function termRows(at: Context, point: PointRecord, element: string): readonly Row[] {
  return point.uncertainty.terms
    .filter(({ percentOfFlow }) => percentOfFlow > 0)
    .toSorted((a, b) => b.percentOfFlow - a.percentOfFlow)
    .map(({ name, percentOfFlow }) => ({
      id: name,
      label: termName(name, element),
      value: at.value(percentOfFlow, 'uncertainty'),
    }));
}
