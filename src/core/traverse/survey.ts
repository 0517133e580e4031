/**
 * A traverse with its readings: the velocity at every point, and the flow once every point is read.
 * Standard: ISO 3966, clauses 8, 11 and 12. Symbols: w the weight of a point, v its velocity, A the area; SI.
 */
import type { FluidState } from '../fluid/contract.ts';
import type { Reading, TraverseInput } from '../input/traverse.ts';
import type {
  Acceleration,
  BaseVolumeFlow,
  MassFlow,
  PressureDifference,
  Velocity,
  VolumeFlow,
} from '../quantity/kinds.ts';
import { type Outcome, ok, type Problem } from '../quantity/outcome.ts';
import type { Plan, PlannedLine, PlannedPoint } from './plan.ts';
import { indicatedVelocity, liquidDensity, machOf, manometerDifference, pointVelocity } from './velocity.ts';

export interface Measured extends PlannedPoint {
  readonly differential: PressureDifference;
  readonly velocity: Velocity; // with the corrections that were chosen
}
export type SurveyPoint = PlannedPoint & Partial<Measured>;

export interface SurveyLine extends Omit<PlannedLine, 'points'> {
  readonly points: readonly SurveyPoint[];
  /** Mean of the line by its own weights; absent until all of it is read. */
  readonly mean?: Velocity;
}

export interface Flow {
  readonly meanVelocity: Velocity;
  readonly volumeFlow: VolumeFlow;
  readonly massFlow: MassFlow;
  readonly baseVolumeFlow?: BaseVolumeFlow;
  readonly reynolds: number; // of the hydraulic diameter
}

export interface Survey {
  readonly plan: Plan;
  readonly state: FluidState;
  readonly lines: readonly SurveyLine[];
  /** Points that are read. */
  readonly measured: readonly Measured[];
  readonly complete: boolean;
  /** Absent until every point is read. */
  readonly flow?: Flow;
  readonly reference: readonly PressureDifference[];
}

/** Share of the frontal area of the stem by which a velocity reads high (first estimate, from memory). */
const BLOCKAGE = 0.7;

/** The survey. Problems: manometer-liquid-light, above-sonic. */
export function surveyOf(input: TraverseInput, plan: Plan, state: FluidState, g: Acceleration): Outcome<Survey> {
  const problems = [...lightLiquid(input, state)];
  if (problems.length > 0) return { ok: false, problems: problems as [Problem, ...Problem[]] };
  const lines = plan.lines.map((line, at): SurveyLine => {
    const points = line.points.map((point, place) => {
      const reading = input.readings[at]?.[place];
      if (reading === undefined) return point;
      const differential = differenceOf(reading, input, state, g);
      const sonic = aboveSonic(differential, state, `readings.${at}.${place}`);
      if (sonic !== undefined) problems.push(sonic);
      return { ...point, differential, velocity: corrected(differential, point, input, plan, state) };
    });
    return { ...line, points, ...meanOf(points) };
  });
  if (problems.length > 0) return { ok: false, problems: problems as [Problem, ...Problem[]] };
  const measured = lines.flatMap(({ points }) => points.filter(isMeasured));
  const complete = lines.every(({ points }) => points.every(isMeasured));
  const reference = input.reference.map((reading) => differenceOf(reading, input, state, g));
  const flow = complete ? { flow: flowOf(measured, input, plan, state) } : {};
  return ok({ plan, state, lines, measured, complete, ...flow, reference });
}

const isMeasured = (point: SurveyPoint): point is Measured => point.velocity !== undefined;

function differenceOf(
  reading: Reading,
  { manometer }: TraverseInput,
  state: FluidState,
  g: Acceleration,
): PressureDifference {
  if (reading.of === 'pressure') return reading.value;
  if (manometer === undefined) throw new Error('differenceOf: expected a manometer with a length, got none');
  return manometerDifference(reading.value, manometer, state.density, g);
}

/** Velocity at a point: coefficient, then what the stem and the turbulence add to the reading, where chosen. */
function corrected(
  differential: PressureDifference,
  { position }: PlannedPoint,
  { probe, corrections }: TraverseInput,
  { area }: Plan,
  state: FluidState,
): Velocity {
  const velocity = pointVelocity(indicatedVelocity(differential, state), probe);
  const stem = corrections.blockage ? ((probe.stem ?? 0) * position) / area : 0; // S/A
  const turbulence = corrections.turbulence ?? 0;
  const unblocked = Math.max(0, 1 - BLOCKAGE * stem); // v = v_meas (1 - 0.7 S/A)
  return ((velocity * unblocked) / Math.sqrt(1 + turbulence ** 2)) as Velocity; // the mean of u^2 is U^2 (1 + Tu^2)
}

/** Mean of points by their weights, brought to a sum of 1. */
function meanOf(points: readonly SurveyPoint[]): { readonly mean?: Velocity } {
  if (!points.every(isMeasured)) return {};
  const weights = points.reduce((sum, { weight }) => sum + weight, 0);
  return { mean: (points.reduce((sum, { weight, velocity }) => sum + weight * velocity, 0) / weights) as Velocity };
}

function flowOf(measured: readonly Measured[], { corrections }: TraverseInput, plan: Plan, state: FluidState): Flow {
  const sum = measured.reduce((total, { weight, velocity }) => total + weight * velocity, 0); // sum of w v
  const meanVelocity = sum * (corrections.wall ?? 1);
  const volumeFlow = plan.area * meanVelocity; // q_v = A v
  const massFlow = state.density * volumeFlow; // q_m = ρ q_v
  return {
    meanVelocity: meanVelocity as Velocity,
    volumeFlow: volumeFlow as VolumeFlow,
    massFlow: massFlow as MassFlow,
    ...(state.baseDensity === undefined ? {} : { baseVolumeFlow: (massFlow / state.baseDensity) as BaseVolumeFlow }),
    reynolds: (state.density * meanVelocity * plan.hydraulicDiameter) / state.viscosity,
  };
}

/** A column is pushed only by a liquid heavier than what stands on it. */
function lightLiquid({ manometer, readings }: TraverseInput, { density }: FluidState): readonly Problem[] {
  const used = readings.some((line) => line.some((reading) => reading?.of === 'column'));
  if (manometer === undefined || !used || liquidDensity(manometer) > density) return [];
  const detail = { liquid: liquidDensity(manometer), fluid: density };
  return [{ code: 'manometer-liquid-light', field: 'manometer.liquid', detail }];
}

/** Beyond the speed of sound a shock stands before the head, and none of this holds. */
function aboveSonic(differential: PressureDifference, state: FluidState, field: string): Problem | undefined {
  const kappa = state.expands ? state.isentropicExponent : undefined;
  if (kappa === undefined || differential <= 0) return undefined;
  if (machOf(differential / state.pressure, kappa) <= 1) return undefined;
  return { code: 'above-sonic', field, detail: { differential, pressure: state.pressure } };
}
