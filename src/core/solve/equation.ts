/** The flow equation of ISO 5167-1 and what all three unknowns share. */
import type { Discharge, Expansibility, Geometry, Primary } from '../element/contract.ts';
import { approachFactor } from '../element/shared/approach.ts';
import { exponentOf } from '../element/shared/expansibility.ts';
import type { FluidState } from '../fluid/contract.ts';
import type { Length, MassFlow, PressureDifference, Velocity } from '../quantity/kinds.ts';

/** A meter with everything known but the flow and the differential, made by `meterOf`. */
export interface Meter {
  readonly primary: Primary;
  readonly geometry: Geometry;
  readonly state: FluidState;
  /** C of this geometry and the expansibility of this ratio and exponent, prepared once for every flow. */
  readonly held: Held;
  readonly expansibility: Expansibility;
  /** q_m/C at 1 Pa without expansion, kg/s. */
  readonly unitFlow: number;
}

/** One flow through one meter. */
export interface Operation {
  readonly massFlow: MassFlow;
  readonly differential: PressureDifference;
  readonly coefficient: number;
  readonly epsilon: number;
  readonly reynolds: number; // Re_D
  /** Reynolds number at which C was held, when the flow lies below the floor of the element. */
  readonly heldAt?: number;
  /** Evaluations of C (flow, bore) or of the expansibility (differential) that the solution took. */
  readonly evaluations: number;
}

/** The discharge coefficient, never evaluated below the floor of the element. */
export interface Held {
  readonly floor: number;
  readonly at: Discharge;
}

/** C of an element of one geometry; below the Reynolds number of its floor it keeps the value it has there. */
export const heldDischarge = (primary: Primary, geometry: Geometry): Held => {
  const floor = primary.reynoldsFloor(geometry);
  const discharge = primary.discharge(geometry);
  return { floor, at: (reynolds) => discharge(Math.max(reynolds, floor)) };
};

/** Expansibility factor against x; 1 for a liquid. */
export const expansibilityOf = (primary: Primary, ratio: number, state: FluidState): Expansibility =>
  state.expands ? primary.expansibility(ratio, exponentOf(state)) : () => 1;

/** Pipe Reynolds number of a mass flow: 4 q_m/(pi mu D), ISO 5167-1:2003, 3.3.2. */
export const reynoldsOf = (massFlow: number, viscosity: number, pipe: number): number =>
  (4 * massFlow) / (Math.PI * viscosity * pipe); // ISO 5167-1:2003, 3.3.2

/** q_m/(C epsilon): E (pi/4) d2 sqrt(2 dp rho), ISO 5167-1:2022, Formula (1). */
export const idealFlow = (geometry: Geometry, differential: number, density: number): number =>
  approachFactor(geometry.ratio) * (Math.PI / 4) * geometry.bore ** 2 * Math.sqrt(2 * differential * density); // Formula (1)

/** The meter of an element with its metal and its fluid at the line; a flow through it costs no more preparation. */
export const meterOf = (primary: Primary, geometry: Geometry, state: FluidState): Meter => ({
  primary,
  geometry,
  state,
  held: heldDischarge(primary, geometry),
  expansibility: expansibilityOf(primary, geometry.ratio, state),
  unitFlow: idealFlow(geometry, 1, state.density),
});

/** Permanent pressure loss of one flow, Pa; undefined where nothing says it. */
export const lossOf = ({ primary, geometry }: Meter, operation: Operation): number | undefined => {
  const share = primary.lossShare?.(geometry, operation.coefficient, operation.reynolds);
  return share === undefined ? undefined : share * operation.differential;
};

/** The same where an earlier question has made sure of it; its absence is our error. */
export const knownLoss = (meter: Meter, operation: Operation): number => {
  const loss = lossOf(meter, operation);
  if (loss === undefined) throw new Error(`solve: expected a loss of ${meter.primary.name}, got none`);
  return loss;
};

/** Mean velocity in a circular section, m/s, of a mass flow in kg/s at a density in kg/m3; `bore` in m. Continuity. */
export const velocityOf = (massFlow: number, density: number, bore: number): Velocity =>
  ((4 * massFlow) / (Math.PI * density * bore ** 2)) as Velocity; // continuity

/** Pipe and bore at one temperature, m, with their ratio. */
export const geometryOf = (pipe: Length, bore: Length): Geometry => ({ pipe, bore, ratio: bore / pipe });

/** The operation, with the Reynolds number at which C was held where it was. A plain record is far quicker than a spread. */
export const withHeld = (held: Held, operation: Operation): Operation =>
  operation.reynolds < held.floor ? { ...operation, heldAt: held.floor } : operation;
