/** The dimensions of the element with their tolerances, in mm or inches and degrees. */
import { spell } from '../../core/quantity/digits.ts';
import { fromSI, type Unit } from '../../core/quantity/units.ts';
import type { Solved } from '../../core/result/record.ts';
import { dimensionName } from '../words/dimensions.ts';
import { boundsText } from '../words/findings.ts';
import { cited } from './cited.ts';
import type { Context } from './context.ts';
import type { DimensionRow } from './model.ts';

type Dimension = Solved['dimensions'][number];

export const dimensionRows = (at: Context, result: Solved): readonly DimensionRow[] =>
  result.dimensions.map((dimension) => ({
    id: dimension.id,
    label: dimensionName(dimension.id),
    ...(dimension.symbol === undefined ? {} : { symbol: dimension.symbol }),
    text: dimensionText(dimension, at.units.bore),
    ...(dimension.nominal === undefined ? {} : { nominal: dimension.nominal }),
    cited: cited(dimension.source),
  }));

/** '25.4 ± 0.5 mm' where the tolerance is the same both ways, else the bounds, else the nominal value. */
function dimensionText(dimension: Dimension, length: Unit): string {
  const { min, max, nominal } = dimension;
  if (nominal !== undefined && min !== undefined && max !== undefined && even(min, nominal, max)) {
    const [middle, unit] = split(print(nominal, dimension.unit, length));
    const [play] = split(print(max - nominal, dimension.unit, length));
    return `${middle} ± ${play}${unit}`;
  }
  const bounds = boundsText({ ...(min === undefined ? {} : { min }), ...(max === undefined ? {} : { max }) }, (value) =>
    print(value, dimension.unit, length),
  );
  if (bounds !== '') return bounds;
  if (nominal === undefined) throw new Error(`expected a figure of the dimension ${dimension.id}, got none`);
  return print(nominal, dimension.unit, length);
}

const even = (min: number, nominal: number, max: number): boolean =>
  almost(max - nominal, nominal - min, 1e-9 * (max - min));
const almost = (a: number, b: number, within: number): boolean => a - b <= within && b - a <= within;

/** Small lengths, as a roughness or an edge radius, keep the unit of the bore: one unit on a drawing. */
function print(value: number, unit: Dimension['unit'], length: Unit): string {
  const rounding = { significant: 3, typographic: true };
  if (unit === 'm') return `${spell(fromSI(value, length), { ...rounding, plainFrom: 1e-5 })}\u00a0${length.print}`;
  if (unit === 'deg') return `${spell(value, { typographic: true })}°`;
  return spell(value, { ...rounding, plainFrom: 1e-5 });
}

/** Number and unit apart, the unit with its gap. */
function split(text: string): readonly [number: string, unit: string] {
  const gap = text.search(/[\u00a0°]/);
  return gap < 0 ? [text, ''] : [text.slice(0, gap), text.slice(gap)];
}
