/** What a fluid model is: a kind of the document's fluid, its own fields, and the state it makes of what they say. */
import type { AbsolutePressure, Temperature } from '../quantity/kinds.ts';
import type { Measure } from '../quantity/measure.ts';
import { fail, gather, type Outcome, ok } from '../quantity/outcome.ts';
import type { FluidState } from './contract.ts';

/** A field of the model in the document's fluid. A quantity may be stated in each of its measures. */
export type FluidField =
  | {
      readonly name: string;
      readonly type: 'quantity';
      readonly measures: readonly [Measure, ...Measure[]];
      readonly required: boolean;
    }
  | { readonly name: string; readonly type: 'choice'; readonly choices: readonly string[]; readonly required: boolean }
  | { readonly name: string; readonly type: 'number'; readonly required: boolean }
  /** A share from 0 to 1, as '30 %' or as a plain number. */
  | { readonly name: string; readonly type: 'share'; readonly required: boolean }
  /** One of a long list of names; `names` holds the key of every spelling, under its plain name. */
  | {
      readonly name: string;
      readonly type: 'name';
      readonly names: ReadonlyMap<string, string>;
      readonly required: false;
    }
  /** A list of rows, each with a quantity in every column. */
  | {
      readonly name: string;
      readonly type: 'rows';
      readonly columns: readonly { readonly name: string; readonly measures: readonly [Measure, ...Measure[]] }[];
      readonly required: boolean;
    }
  /** A group of names with a share of 1 each, as '94 %' or as a plain number; which names it knows the model says. */
  | { readonly name: string; readonly type: 'fractions'; readonly required: boolean }
  /** True or false; absent is false. */
  | { readonly name: string; readonly type: 'flag' };

/** One line of a group of shares. */
export interface Fraction {
  readonly name: string;
  readonly value: number;
}

/** One row of a list, by column. */
export type Row = Readonly<Record<string, Amount>>;

/** A quantity as read: SI, above zero, a pressure always absolute. */
export interface Amount {
  readonly measure: Measure;
  readonly si: number;
}

/** What the fields of a model say, by name. A field that was left empty is absent. */
export interface Parsed {
  readonly quantities: Readonly<Partial<Record<string, Amount>>>;
  readonly numbers: Readonly<Partial<Record<string, number>>>;
  readonly choices: Readonly<Partial<Record<string, string>>>;
  readonly rows: Readonly<Partial<Record<string, readonly Row[]>>>;
  readonly fractions: Readonly<Partial<Record<string, readonly Fraction[]>>>;
  readonly flags: Readonly<Partial<Record<string, boolean>>>;
}

/** A pressure and a temperature; SI. */
export interface State {
  readonly pressure: AbsolutePressure;
  readonly temperature: Temperature;
}

/** The state at the upstream tapping, the project's base state, and where a problem with either is to be shown. */
export interface Conditions extends State {
  readonly base: State;
  readonly paths: Paths;
}

/** Where in the document a problem with a figure is shown. */
export interface Paths {
  readonly pressure: string;
  readonly temperature: string;
  /** Path of one of the model's own fields. */
  readonly own: (name: string) => string;
}

/**
 * Where a formulation changes or bends: between two neighbouring pressures, Pa, and temperatures, K, every figure runs
 * smoothly as long as the phase stays.
 */
export interface Seams {
  readonly pressure: readonly number[];
  readonly temperature: readonly number[];
}

/** One kind of fluid. */
export interface FluidModel {
  readonly kind: string;
  readonly fields: readonly FluidField[];
  /**
   * Finds pressure and temperature where the fluid itself ties one to the other and one or none was given. A model
   * without it needs both.
   */
  readonly complete?: (parsed: Parsed, known: Partial<State>, paths: Paths) => Outcome<State>;
  readonly state: (parsed: Parsed, conditions: Conditions) => Outcome<FluidState>;
  /** Absent where there are none. */
  readonly seams?: (parsed: Parsed) => Seams;
}

/** Pressure and temperature where both must be given. Problem field-missing for each that is not. */
export function bothOf({ pressure, temperature }: Partial<State>, paths: Paths): Outcome<State> {
  if (pressure !== undefined && temperature !== undefined) return ok({ pressure, temperature });
  const missing = (value: number | undefined, path: string) =>
    value === undefined ? fail('field-missing', path) : ok(value);
  return gather(missing(pressure, paths.pressure), missing(temperature, paths.temperature));
}

/** A name as people write it: case, blanks, commas and hyphens do not count. */
export const plainName = (text: string): string => text.toLowerCase().replace(/[^a-z0-9]+/g, '');
