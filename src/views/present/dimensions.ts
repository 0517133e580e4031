/** The dimensions of the element with their tolerances, in mm or inches and degrees. */
import { fromSI, type Unit } from '../../core/quantity/units.ts';
import type { Solved } from '../../core/result/record.ts';
import { dimensionName } from '../words/dimensions.ts';
import { boundsText } from '../words/findings.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { DimensionRow } from './model.ts';
import { spelled } from './numbers.ts';
import { ofLimit } from './rounding.ts';

type Dimension = Solved['dimensions'][number];

export const dimensionRows = (at: Context, result: Solved): readonly DimensionRow[] =>
  result.dimensions.map((dimension) => ({
    id: dimension.id,
    label: dimensionName(dimension.id),
    ...(dimension.symbol === undefined ? {} : { symbol: dimension.symbol }),
    text: dimensionText(dimension, dimension.id.endsWith('roughness') ? at.units.roughness : at.units.bore),
    ...(dimension.nominal === undefined ? {} : { nominal: dimension.nominal }),
    cited: cited(dimension.source),
  }));

/** '25.4 ± 0.5 mm' where the tolerance is the same both ways, else the bounds, else the nominal value. */
function dimensionText({ id, min, max, nominal, unit }: Dimension, length: Unit): string {
  const shown = (value: number): number => (unit === 'm' ? fromSI(value, length) : value);
  const ending = unit === 'm' ? `\u00a0${length.print}` : unit === 'deg' ? '°' : '';
  if (nominal !== undefined && min !== undefined && max !== undefined && even(min, nominal, max)) {
    const play = spelled(shown(max - nominal), ofLimit({ significant: 2 }), true);
    const decimals = play.split('.')[1]?.length ?? 0; // as many for the value as for its tolerance
    return `${spelled(shown(nominal), { decimals }, true)} ± ${play}${ending}`;
  }
  const print = (value: number): string => `${spelled(shown(value), ofLimit({ significant: 3 }), true)}${ending}`;
  const bounds = { ...(min === undefined ? {} : { min }), ...(max === undefined ? {} : { max }) };
  const text = boundsText(bounds, print) || (nominal === undefined ? '' : print(nominal));
  if (text === '') throw new Error(`expected a figure of the dimension ${id}, got none`);
  return text;
}

/** The same above and below, but for the last bits of the subtraction. */
function even(min: number, nominal: number, max: number): boolean {
  const lean = max - nominal - (nominal - min);
  const most = 1e-9 * (max - min);
  return lean <= most && -lean <= most;
}
