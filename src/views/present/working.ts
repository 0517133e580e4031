/** The working: each formula in symbols, the same with the numbers put in, and the result. */
import type { Given, Working } from '../../core/quantity/working.ts';
import type { Solved } from '../../core/result/record.ts';
import { noteText } from '../words/notes.ts';
import { quantityName } from '../words/quantities.ts';
import { workingGroupTitles } from '../words/rows.ts';
import { dutyNames } from '../words/verdicts.ts';
import { workingTitle } from '../words/working.ts';
import { cited } from './cited.ts';
import { parseFormula } from './formula.ts';
import type { Row, Value, WorkingGroup, WorkingRow } from './model.ts';
import { spelled } from './numbers.ts';
import { nearOne, workingRounding } from './rounding.ts';
import { substitute } from './substitute.ts';
import { unitText } from './unit-text.ts';

/** First what belongs to the meter, then each flow. */
export function workingGroups(result: Solved): readonly WorkingGroup[] {
  const group = (id: WorkingGroup['id'], rows: readonly Working[]): WorkingGroup => ({
    id,
    title: workingGroupTitles[id],
    rows: rows.map(workingRow),
  });
  const flows = dutyNames.flatMap((name) => {
    const point = result.points[name];
    return point === undefined ? [] : [group(name, point.working)];
  });
  return [group('meter', result.working), ...flows];
}

export function workingRow({ id, symbol, formula, given, value, unit, source, remark }: Working): WorkingRow {
  const tree = formula === undefined ? undefined : parseFormula(formula);
  const numbers = Object.fromEntries(given.map((item) => [item.symbol, givenFigure(item).number]));
  return {
    id,
    title: workingTitle(symbol === 'K' ? 'K' : id),
    symbol: parseFormula(symbol),
    ...(tree === undefined ? {} : { formula: tree, substituted: substitute(tree, numbers) }),
    value: figure(value, unit),
    given: given.map(givenRow),
    cited: cited(source),
    ...(remark === undefined ? {} : { remark: noteText(remark) }),
  };
}

const givenRow = (item: Given): Row => ({
  id: item.symbol,
  label: quantityName(item.words),
  symbol: item.symbol,
  value: givenFigure(item),
});

const givenFigure = ({ value, unit, words }: Given): Value =>
  figure(value, unit, words === 'pressure-ratio' ? nearOne : workingRounding);

/** A figure of a formula in the formula's own unit, which is SI: no display changes it. */
function figure(value: number, unit: string, rounding = workingRounding): Value {
  const number = spelled(value, rounding, true);
  const plain = spelled(value, rounding, false);
  const print = unitText(unit);
  if (unit === '') return { number, unit: '', text: number, plain, si: value };
  return { number, unit: print, text: `${number}\u00a0${print}`, plain: `${plain} ${unit}`, si: value };
}
