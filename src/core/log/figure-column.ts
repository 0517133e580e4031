/** The columns of figures in the mapping of a log: place, decimal mark, and the way from the unit to SI. */
import { at, type Form } from '../input/form.ts';
import { readUnit } from '../quantity/spelling.ts';
import { type Measure, toSI, type Unit } from '../quantity/units.ts';
import { type Desk, figuresOf, findColumn } from './find-column.ts';
import type { FigureColumn, SignalKind } from './mapping.ts';

const SIGNALS: readonly Measure[] = ['current', 'voltage', 'share', 'share of span'];
/** The unit that a signal is handed over in: mA, V, per cent. */
const KINDS: Readonly<Record<string, readonly [kind: SignalKind, unit: number]>> = {
  current: ['current', 1e-3],
  voltage: ['voltage', 1],
  share: ['percent', 1e-2],
  'share of span': ['percent', 1e-2],
};

export function signalColumn(desk: Desk): (FigureColumn & { kind: SignalKind }) | undefined {
  const { form } = desk;
  const hasDifferential = has(form, 'log.differential');
  if (hasDifferential === has(form, 'log.signal'))
    return form.report(hasDifferential ? 'log-signal-twice' : 'log-signal-missing', 'log.differential');
  if (hasDifferential) {
    const differential = figureColumn(desk, 'log.differential', ['pressure difference']);
    return differential && { ...differential, kind: 'differential' };
  }
  const found = figureColumn(desk, 'log.signal', SIGNALS);
  const [kind, unit] = KINDS[found?.measure ?? ''] ?? ['percent', 1];
  return found && { ...found, factor: found.factor / unit, kind };
}

const has = ({ group }: Form, path: string): boolean => at(group, path) !== undefined;

/** A column of figures with its unit; undefined when the document names none, or when it has a problem. */
export function figureColumn(
  desk: Desk,
  path: string,
  measures: readonly Measure[],
  atmosphere = 0,
): (FigureColumn & { readonly measure: Measure }) | undefined {
  const { form } = desk;
  if (!has(form, path)) return undefined;
  const found = findColumn(desk, `${path}.column`);
  const spelling = form.word(`${path}.unit`);
  if (spelling === undefined) return form.report('field-missing', `${path}.unit`);
  const unit = readUnit(spelling, measures, `${path}.unit`);
  if (!unit.ok) form.problems.push(...unit.problems);
  const figures = found && figuresOf(desk, found.column, path);
  if (!(unit.ok && found && figures)) return undefined;
  const after = unit.value.measure === 'gauge pressure' ? atmosphere : 0;
  return { at: found.at, figures, ...scaleOf(unit.value), after, measure: unit.value.measure };
}

/** The zero and the step of a unit, as doubles. */
function scaleOf({ offset, ...scale }: Unit): { readonly before: number; readonly factor: number } {
  return { before: Number(offset ?? 0), factor: toSI('1', scale) };
}
