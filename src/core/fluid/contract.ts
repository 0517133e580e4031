/**
 * What a fluid model answers with: the state at the upstream tapping, everything the meter equations ask of a fluid.
 * A model knows physics, not the form: only state.ts reads the document's fluid.
 */
import type { AbsolutePressure, Density, DynamicViscosity, MolarMass, Temperature } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';
import type { Working } from '../quantity/working.ts';

export type Phase = 'liquid' | 'vapour' | 'supercritical' | 'gas';

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
  /** Pressure at which the liquid boils at its temperature; absent where it has none or none is known. */
  readonly vapourPressure?: AbsolutePressure;
  /** Saturation temperature at the pressure, below the critical pressure. */
  readonly saturationTemperature?: Temperature;
  /** Density at the project's base state; absent where the fluid has none there (steam). */
  readonly baseDensity?: Density;
  /** True where the phase was settled by the user against the state or within tolerance of saturation. */
  readonly phaseForced?: boolean;
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
