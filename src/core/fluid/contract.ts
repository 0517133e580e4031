/**
 * What a fluid model answers with: the state at the upstream tapping, everything the meter equations ask of a fluid.
 * A model knows physics, not the form: only state.ts reads the document's fluid.
 */
import type { Bounds } from '../numeric/bounds.ts';
import type { AbsolutePressure, Density, DynamicViscosity, MolarMass, Temperature } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';
import type { Working } from '../quantity/working.ts';

/** A gas by composition or by statement is `gas`; water has a vapour, and above its critical point neither. */
export type Phase = 'liquid' | 'vapour' | 'supercritical' | 'gas';

/** A limit of the fluid's own formulation that the state leaves. Checks turn it into a finding with the same id. */
export interface Caution {
  readonly id: string;
  readonly verdict: 'caution' | 'outside';
  readonly value: number;
  readonly unit: string;
  readonly limit: { readonly min?: number; readonly max?: number };
  readonly source: Source;
  /** True where it says that another phase may be there; else it is about the range of the formulation. */
  readonly ofPhase?: boolean;
  /** What the sentence needs beside value and limit. */
  readonly detail?: Readonly<Record<string, string | number>>;
}

/** Expanded relative uncertainty of a figure at 95 %, as its formulation states it. */
export interface StatedUncertainty {
  readonly share: number; // 0.001 is 0.1 %
  readonly source: Source;
}

/** Pressures, Pa absolute, and temperatures, K; a bound that its source does not give is absent. */
export interface FigureRange {
  readonly pressure?: Bounds;
  readonly temperature?: Bounds;
}

/** The figures that can have a range. */
export type RangedFigure =
  | 'density'
  | 'viscosity'
  | 'isentropicExponent'
  | 'compressibility'
  | 'vapourPressure'
  | 'baseDensity';

/** Everything that the meter equations ask of a fluid, with where it comes from. */
export interface FluidState {
  readonly pressure: AbsolutePressure;
  readonly temperature: Temperature;
  readonly density: Density;
  readonly viscosity: DynamicViscosity;
  readonly phase: Phase;
  /** True where the expansibility factor applies; false makes it 1 (a liquid). */
  readonly expands: boolean;
  /** w2 rho / p; absent for a stated liquid. */
  readonly isentropicExponent?: number;
  readonly compressibility?: number; // p/(rho R T)
  readonly molarMass?: MolarMass;
  readonly speedOfSound?: number; // m/s
  /** Fall of temperature with pressure at constant enthalpy, negative where a gas warms as it expands. */
  readonly jouleThomson?: number; // K/Pa
  /** Pressure at which the liquid boils at its temperature; absent where it has none or none is known. */
  readonly vapourPressure?: AbsolutePressure;
  /** Saturation temperature at the pressure, below the critical pressure. */
  readonly saturationTemperature?: Temperature;
  /** Density at the project's base state; absent where the fluid has none there (steam). */
  readonly baseDensity?: Density;
  /** Mass fraction of vapour where both phases stand side by side; the density is that of the mixture. */
  readonly quality?: number;
  /** Figures that the user put in place of the model's, by the names of `sources`. */
  readonly overridden?: readonly (keyof FluidState['sources'])[];
  /** Where the model answers outside its range or on a custom of the trade; each becomes a finding. */
  readonly cautions?: readonly Caution[];
  /** True where the phase was settled by the user against the state or within tolerance of saturation. */
  readonly phaseForced?: boolean;
  /** Uncertainties that the formulations state, where they state one. */
  readonly uncertainties?: {
    readonly density?: StatedUncertainty;
    readonly viscosity?: StatedUncertainty;
    readonly speedOfSound?: StatedUncertainty;
  };
  /** Where the formulation of each figure holds, with the uncertainty above where it states one. */
  readonly ranges?: Readonly<Partial<Record<RangedFigure, FigureRange>>>;
  /** The formulation of each figure. */
  readonly sources: {
    readonly density: Source;
    readonly viscosity: Source;
    readonly isentropicExponent?: Source;
    readonly vapourPressure?: Source;
    readonly baseDensity?: Source;
  };
  readonly working: readonly Working[];
}
