/** The figures of a survey as rows: result, quality of the readings, plan, terms of the uncertainty. */
import type { TraverseFigures } from '../../core/result/traverse-record.ts';
import type { Role } from '../words/print.ts';
import { surveyRows, termNamesOfTraverse, uncertaintyOpen, unstatedTerm } from '../words/surveys.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { Row } from './model.ts';

type Id = keyof typeof surveyRows;

/** A row where the figure is there. */
function rowOf(at: Context, id: Id, si: number | undefined, role: Role, more: Partial<Row> = {}): readonly Row[] {
  return si === undefined ? [] : [{ id, label: surveyRows[id], value: at.value(si, role), ...more }];
}

/** Flow and mean; until all is read the mean so far. */
export function resultRows(at: Context, { flow, quality, uncertainty }: TraverseFigures): readonly Row[] {
  if (flow === undefined) return rowOf(at, 'meanSoFar', quality?.meanSoFar_m_s, 'velocity');
  return [
    ...rowOf(at, 'meanVelocity', flow.meanVelocity_m_s, 'velocity', { symbol: 'V', working: 'traverse-mean' }),
    ...rowOf(at, 'volumeFlow', flow.volumeFlow_m3_s, 'volumeFlow', { symbol: 'q_V', working: 'duct-volume-flow' }),
    ...rowOf(at, 'massFlow', flow.massFlow_kg_s, 'massFlow', { symbol: 'q_m', working: 'mass-flow' }),
    ...rowOf(at, 'baseVolumeFlow', flow.baseVolumeFlow_m3_s, 'baseVolumeFlow', {
      symbol: 'q_Vb',
      working: 'base-volume-flow',
    }),
    ...rowOf(at, 'reynolds', flow.reynolds, 'reynolds', { symbol: 'Re' }),
    ...rowOf(at, 'uncertainty', uncertainty?.expanded_percent, 'uncertainty', {
      symbol: 'U',
      ...(uncertainty === undefined ? {} : { cited: cited(uncertainty.source) }),
    }),
  ];
}

export function qualityRows(at: Context, { quality }: TraverseFigures): readonly Row[] {
  if (quality === undefined) return [];
  return [
    ...rowOf(at, 'least', quality.leastVelocity_m_s, 'velocity'),
    ...rowOf(at, 'most', quality.mostVelocity_m_s, 'velocity'),
    ...rowOf(at, 'scatter', quality.scatter_percent, 'percent'),
    ...rowOf(at, 'lines', quality.lines_percent, 'percent'),
    ...rowOf(at, 'strong', quality.strongReadings_percent, 'percent'),
    ...rowOf(at, 'reversed', quality.reversedReadings, 'count'),
    ...rowOf(at, 'still', quality.stillReadings, 'count'),
    ...rowOf(at, 'drift', quality.drift_percent, 'percent'),
    ...rowOf(at, 'averaging', quality.differentialAveraging_percent, 'percent'),
    ...rowOf(at, 'ruleError', quality.ruleOnPowerLaw_percent, 'percent'),
  ];
}

export function planRows(at: Context, { area_m2, hydraulicDiameter_m, port_m }: TraverseFigures): readonly Row[] {
  return [
    ...rowOf(at, 'area', area_m2, 'area', { symbol: 'A' }),
    ...rowOf(at, 'hydraulicDiameter', hydraulicDiameter_m, 'length', { symbol: 'D_h' }),
    ...rowOf(at, 'port', port_m > 0 ? port_m : undefined, 'length'),
  ];
}

/** The terms of the uncertainty, the largest first; what is not stated says what stands in for it. */
export function termRows(at: Context, { uncertainty }: TraverseFigures): readonly Row[] {
  const terms = uncertainty?.terms ?? [];
  return terms
    .toSorted((one, other) => other.percentOfFlow - one.percentOfFlow)
    .map(({ name, percentOfFlow, stated }) => ({
      id: name,
      label: termNamesOfTraverse[name],
      value: at.value(percentOfFlow, 'uncertainty'),
      ...(stated ? {} : { note: unstatedTerm[name] }),
    }));
}

/** What the uncertainty leaves out. */
export function certaintyOf({ uncertainty }: TraverseFigures): string {
  const open = (uncertainty?.terms ?? []).filter(({ stated, percentOfFlow }) => !stated && percentOfFlow === 0);
  return uncertaintyOpen(open.map(({ name }) => termNamesOfTraverse[name]));
}
