/** SI figures and written quantities as printed values. */
import { spell } from '../../core/quantity/digits.ts';
import type { Quantity } from '../../core/quantity/text.ts';
import { fromSI, type Unit } from '../../core/quantity/units.ts';
import type { Print, Role } from '../words/print.ts';
import type { Value } from './model.ts';
import { type Rounding, roundingOf } from './rounding.ts';
import type { DisplayUnits } from './units.ts';

const NO_BREAK = '\u00a0';

/** An SI figure in a unit, by a rounding rule; without a unit it is a plain number. */
export function show(si: number, unit: Unit | undefined, rounding: Rounding): Value {
  const value = unit === undefined ? si : fromSI(si, unit);
  const number = spell(value, { ...rounding, typographic: true });
  const plain = spell(value, { ...rounding, typographic: false });
  return valueOf(number, plain, unit, si);
}

/** What the user wrote, digit for digit, with the sign and the unit as they are printed. */
export function asWritten({ number, unit, si }: Quantity): Value {
  return valueOf(number.trim().replace('-', '\u2212').replace(/^\+/, ''), number.trim().replace(/^\+/, ''), unit, si);
}

function valueOf(number: string, plain: string, unit: Unit | undefined, si: number): Value {
  if (unit === undefined) return { number, unit: '', text: number, plain, si };
  const gap = unit.symbol === 'deg' ? '' : NO_BREAK; // a plane angle carries its sign without a space
  return { number, unit: unit.print, text: `${number}${gap}${unit.print}`, plain: `${plain} ${unit.symbol}`, si };
}

/** Figures of one meter by role: the unit of the display and the one rounding rule. */
export interface Printer {
  readonly units: DisplayUnits;
  readonly value: (si: number, role: Role) => Value;
  readonly text: Print;
}

const plainRoles: readonly Role[] = ['reynolds', 'ratio', 'coefficient', 'factor', 'number'];

/** `percent` and `uncertainty` take a percentage, not a share: 0.7 is printed 0.70 %. */
export function printer(units: DisplayUnits): Printer {
  const value = (si: number, role: Role): Value => {
    if (isPlain(role)) return show(si, undefined, roundingOf(role, ''));
    const unit = units[role];
    const rounding = roundingOf(role, unit.symbol);
    if (role !== 'percent' && role !== 'uncertainty') return show(si, unit, rounding);
    return { ...show(si / 100, unit, rounding), si };
  };
  return { units, value, text: (si, role) => value(si, role).text };
}

const isPlain = (role: Role): role is Exclude<Role, keyof DisplayUnits> => plainRoles.includes(role);
