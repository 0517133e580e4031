/** SI figures and written quantities as printed values. */
import { spell } from '../../core/quantity/digits.ts';
import type { Quantity } from '../../core/quantity/text.ts';
import { fromSI, type Unit } from '../../core/quantity/units.ts';
import type { Print, Role } from '../words/print.ts';
import type { Value } from './model.ts';
import { ofLimit, type Rounding, roundingOf } from './rounding.ts';
import type { DisplayUnits } from './units.ts';

const NO_BREAK = '\u00a0';

/** An SI figure in a unit, by a rounding rule; without a unit it is a plain number. */
export function show(si: number, unit: Unit | undefined, rounding: Rounding): Value {
  const value = unit === undefined ? si : fromSI(si, unit);
  return printed(spelled(value, rounding, true), spelled(value, rounding, false), unit, si);
}

/** The one place where a figure of a view is rounded and spelled. */
export function spelled(value: number, { trim = false, ...rounding }: Rounding, typographic: boolean): string {
  if (!trim) return spell(value, { ...rounding, typographic });
  const kept = Number(spell(value, { ...rounding, typographic: false })); // rounded, its zeros forgotten
  const { significant: _, decimals: __, ...notation } = rounding;
  return spell(kept, { ...notation, typographic });
}

/** What the user wrote, digit for digit, with the sign and the unit as they are printed. */
export function asWritten({ number, unit, si }: Quantity): Value {
  return printed(number.trim().replace('-', '\u2212').replace(/^\+/, ''), number.trim().replace(/^\+/, ''), unit, si);
}

function printed(number: string, plain: string, unit: Unit | undefined, si: number): Value {
  if (unit === undefined) return { number, unit: '', text: number, plain, si };
  const gap = unit.symbol === 'deg' ? '' : NO_BREAK; // a plane angle carries its sign without a space
  return { number, unit: unit.print, text: `${number}${gap}${unit.print}`, plain: `${plain} ${unit.symbol}`, si };
}

/** Figures of one meter by role: the unit of the display and the one rounding rule. */
export interface Printer {
  readonly units: DisplayUnits;
  /** `percent` and `uncertainty` take a percentage, not a share: 0.7 is printed 0.70 %. */
  readonly value: (si: number, role: Role) => Value;
  readonly print: Print;
}

const plainRoles: readonly Role[] = ['reynolds', 'ratio', 'coefficient', 'factor', 'number'];

export function printer(units: DisplayUnits): Printer {
  const rounded = (si: number, role: Role, rule: (rounding: Rounding) => Rounding): Value => {
    if (isPlain(role)) return show(si, undefined, rule(roundingOf(role, '')));
    const unit = units[role];
    const rounding = rule(roundingOf(role, unit.symbol));
    if (role !== 'percent' && role !== 'uncertainty') return show(si, unit, rounding);
    return { ...show(si / 100, unit, rounding), si };
  };
  const value = (si: number, role: Role): Value => rounded(si, role, (rounding) => rounding);
  return {
    units,
    value,
    print: {
      figure: (si, role) => value(si, role).text,
      limit: (si, role) => rounded(si, role, ofLimit).text,
    },
  };
}

const isPlain = (role: Role): role is Exclude<Role, keyof DisplayUnits> => plainRoles.includes(role);
