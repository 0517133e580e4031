/** What a liquid is once its name and concentration are settled: its properties at any temperature, with their ranges. */
import type { Source } from '../../quantity/source.ts';
import type { Working } from '../../quantity/working.ts';

/** A property along the temperature; SI. */
export interface Property {
  readonly at: (T: number) => number;
  /** Where its source holds, K. */
  readonly min: number;
  readonly max: number;
  /** How far beyond it may be continued, K; zero where a phase ends there. */
  readonly below: number;
  readonly above: number;
  readonly source: Source;
  /** Expanded relative uncertainty at 95 %, where the source gives one. */
  readonly share?: number;
  /** Code of the sentence that says where the figure comes from, see views/words. */
  readonly remark: string;
}

/** What the density at atmospheric pressure is multiplied by at p and T, and the pressures it holds for, Pa absolute. */
export interface PressureFactor {
  readonly symbol: string;
  readonly at: (p: number, T: number) => number;
  readonly max: number;
  readonly furthest: number;
  readonly source: Source;
  readonly words: string;
}

/** A liquid, whatever its formulation. */
export interface Liquid {
  readonly name: string;
  /** Density at the reference pressure, kg/m3. */
  readonly density: Property;
  /** Pa.s; absent where it has to be stated. */
  readonly viscosity?: Property;
  /** Pa; absent where none is known. */
  readonly vapourPressure?: Property;
  /** True where the vapour pressure is that of the liquid itself and not a bound: below it there is no liquid. */
  readonly boils: boolean;
  /** Bulk modulus of a typical liquid of this family, Pa; absent where the density holds at the line pressure. */
  readonly bulkModulus?: number;
  /** A correction for pressure of its own, in place of the bulk modulus. */
  readonly pressure?: PressureFactor;
  /** Working of the density at the reference pressure, where it is a formula. */
  readonly working?: (T: number) => readonly Working[];
  /** Share of the solute at which the formulation is known to be off, with what it says. */
  readonly doubt?: { readonly id: string; readonly value: number; readonly max: number; readonly source: Source };
}

/** Practice: a smooth formulation may be continued this far beyond its range, with a finding. */
export const furthestBeyond = 10; // K

/** Density by the linear bulk modulus: ρ = ρ_s (1 + (p - p_s)/K). Custom of the trade. */
export const compressed = (rho: number, p: number, ps: number, K: number): number => rho * (1 + (p - ps) / K);
