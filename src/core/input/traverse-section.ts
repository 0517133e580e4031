/** The section of a traverse, its rule and its numbers of points, the straight duct on both sides and the port. */
import type { Length } from '../quantity/kinds.ts';
import { at, type Form } from './form.ts';

export type Section =
  | { readonly shape: 'circular'; readonly diameter: Length }
  | {
      readonly shape: 'rectangular';
      readonly width: Length;
      readonly height: Length;
      /** The side over which the lines are spread; the probe goes in along the other. */
      readonly ports: 'width' | 'height';
    };

/** The assumption that turns one velocity into a mean. */
export type Profile =
  | { readonly kind: 'laminar'; readonly at: 'centre' | 'mean-velocity' }
  | { readonly kind: 'power'; readonly at: 'centre' | 'mean-velocity'; readonly exponent: number }
  | { readonly kind: 'stated'; readonly at: 'centre'; readonly meanOverCentre: number };

export const RULES = ['log-linear', 'log-tchebycheff', 'equal-area', 'single-point'] as const;
export const WALL_RULES = ['leave', 'move', 'merge'] as const;
const POWER = 7; // exponent of the usual power law, u ~ y^(1/7) (Prandtl)

/** Reads the group `section`. */
export function readSection(form: Form): Section | undefined {
  const shape = form.choice('section.shape', ['circular', 'rectangular'], true);
  if (shape === undefined) return undefined;
  if (shape === 'circular') {
    const diameter = form.positive('section.diameter', ['length'], true)?.si;
    return diameter === undefined ? undefined : { shape, diameter };
  }
  const width = form.positive('section.width', ['length'], true)?.si;
  const height = form.positive('section.height', ['length'], true)?.si;
  const ports = form.choice('section.ports', ['width', 'height']) ?? 'width';
  return width === undefined || height === undefined ? undefined : { shape, width, height, ports };
}

/** Length of the duct by which straight lengths count: the diameter, or four areas over the perimeter. */
export const hydraulicDiameter = (section: Section): Length =>
  section.shape === 'circular'
    ? section.diameter
    : (((2 * section.width * section.height) / (section.width + section.height)) as Length); // De = 2 L W / (L + W)

/** A whole number; undefined when it is not written. Problem number-out-of-range. */
export function readCount(form: Form, field: string, most: number, required: boolean): number | undefined {
  const value = readWithin(form, field, 1, most, required);
  if (value === undefined || Number.isInteger(value)) return value;
  return form.report('number-out-of-range', field, { written: String(value), least: 1, most });
}

/** A plain number between bounds. Problem number-out-of-range. */
export function readWithin(
  form: Form,
  field: string,
  least: number,
  most: number,
  required = false,
): number | undefined {
  const value = form.number(field, required);
  if (value === undefined || (value >= least && value <= most)) return value;
  return form.report('number-out-of-range', field, { written: String(value), least, most });
}

/** Reads the group `profile`, asked for by the rule of a single point. */
export function readProfile(form: Form): Profile | undefined {
  const kind = form.choice('profile.kind', ['laminar', 'power', 'stated'], true);
  if (kind === undefined) return undefined;
  if (kind === 'stated') {
    const at = form.choice('profile.at', ['centre']) ?? 'centre';
    const meanOverCentre = readWithin(form, 'profile.meanOverCentre', 0.3, 1, true); // laminar 0.5, plug flow 1
    return meanOverCentre === undefined ? undefined : { kind, at, meanOverCentre };
  }
  const where = form.choice('profile.at', ['centre', 'mean-velocity'], true);
  if (where === undefined) return undefined;
  if (kind === 'laminar') return { kind, at: where };
  const exponent = at(form.group, 'profile.exponent') === undefined ? POWER : readExponent(form);
  return exponent === undefined ? undefined : { kind, at: where, exponent };
}

const readExponent = (form: Form): number | undefined => readWithin(form, 'profile.exponent', 4, 20) ?? undefined;

/** Straight duct on one side, in hydraulic diameters; a length is divided by that of the section. */
export function readStraight(form: Form, side: 'before' | 'after', section: Section | undefined): number | undefined {
  const field = `straight.${side}`;
  const length = form.quantity(field, ['bores', 'length']);
  if (length === undefined) return undefined;
  if (length.si < 0) return form.report('negative', field, { written: length.number });
  if (length.measure === 'bores') return length.si;
  return section === undefined ? undefined : length.si / hydraulicDiameter(section);
}
