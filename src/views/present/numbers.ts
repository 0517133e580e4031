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

/** A plain number digit for digit; one with a power of ten is spelled anew. */
export function plainNumber(written: unknown): Value | undefined {
  const text = typeof written === 'number' || typeof written === 'string' ? String(written).trim() : '';
  const si = Number(text);
  if (text === '' || !Number.isFinite(si)) return undefined;
  if (/^\+?(\d+\.?\d*|\.\d+)$/.test(text)) {
    const number = text.replace(/^\+/, '');
    return printed(number, number, undefined, si);
  }
  return show(si, undefined, { significant: 6, trim: true });
}

function printed(number: string, plain: string, unit: Unit | undefined, si: number): Value {
  if (unit === undefined) return { number, unit: '', text: number, plain, si };
  return { number, unit: unit.print, text: withUnit(number, unit), plain: `${plain} ${unit.symbol}`, si };
}

function withUnit(number: string, unit: Unit | undefined): string {
  if (unit === undefined) return number;
  return `${number}${unit.symbol === 'deg' ? '' : NO_BREAK}${unit.print}`; // a plane angle carries its sign without a space
}

/** Figures of one meter by role: the unit of the display and the one rounding rule. */
export interface Printer {
  readonly units: DisplayUnits;
  /** `percent` and `uncertainty` take a percentage, not a share: 0.7 is printed 0.70 %. */
  readonly value: (si: number, role: Role) => Value;
  readonly print: Print;
}

const plainRoles: readonly Role[] = ['reynolds', 'ratio', 'coefficient', 'factor', 'count', 'number'];

export function printer(units: DisplayUnits): Printer {
  const unitOf = (role: Role): Unit | undefined => (isPlain(role) ? undefined : units[role]);
  const shareOf = (si: number, role: Role): number => (role === 'percent' || role === 'uncertainty' ? si / 100 : si);
  const value = (si: number, role: Role): Value => {
    const unit = unitOf(role);
    return { ...show(shareOf(si, role), unit, roundingOf(role, unit?.symbol ?? '')), si };
  };
  const text = (si: number, role: Role, rule: (rounding: Rounding) => Rounding): string => {
    const unit = unitOf(role);
    const number = shareOf(si, role);
    const rounding = rule(roundingOf(role, unit?.symbol ?? ''));
    return withUnit(spelled(unit === undefined ? number : fromSI(number, unit), rounding, true), unit);
  };
  return {
    units,
    value,
    print: {
      figure: (si, role) => text(si, role, (rounding) => rounding),
      limit: (si, role) => text(si, role, ofLimit),
    },
  };
}

const isPlain = (role: Role): role is Exclude<Role, keyof DisplayUnits> => plainRoles.includes(role);
