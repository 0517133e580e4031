/** What a fluid model is: a kind of the document's fluid, its own fields, and the state it makes of what they say. */
import type { AbsolutePressure, Temperature } from '../quantity/kinds.ts';
import type { Measure } from '../quantity/measure.ts';
import type { Outcome } from '../quantity/outcome.ts';
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
  | { readonly name: string; readonly type: 'number'; readonly required: boolean };

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
}

export interface State {
  readonly pressure: AbsolutePressure;
  readonly temperature: Temperature;
}

/** The state at the upstream tapping, the project's base state, and where a problem with either is to be shown. */
export interface Conditions extends State {
  readonly base: State;
  readonly paths: {
    readonly pressure: string;
    readonly temperature: string;
    /** Path of one of the model's own fields. */
    readonly own: (name: string) => string;
  };
}

export interface FluidModel {
  readonly kind: string;
  readonly fields: readonly FluidField[];
  readonly state: (parsed: Parsed, conditions: Conditions) => Outcome<FluidState>;
}
