/** One reading of a meter that stands: its differential, its flow, how sure it is and how it stands against the limits. */
import { checkInstrument, checkReading } from '../check/reading.ts';
import type { Part } from '../element/contract.ts';
import type { FluidState } from '../fluid/contract.ts';
import type { ReadingInput } from '../input/reading.ts';
import type { PressureDifference } from '../quantity/kinds.ts';
import { type Outcome, ok, type Problem } from '../quantity/outcome.ts';
import type { Cell, Settled, Shown } from '../reading/contract.ts';
import { combined } from '../reading/stated.ts';
import { withLate } from '../result/late.ts';
import type { CompensationRecord, FlowRecord, SolvedReading } from '../result/readings-record.ts';
import { pointWorking } from '../result/working.ts';
import { correctionWorking } from '../solve/downstream.ts';
import { velocityOf } from '../solve/equation.ts';
import { metalWorking } from '../solve/metal.ts';
import { type Budget, flowUncertainty, type Open } from '../uncertainty/iso5167.ts';
import { flowAt, type Moment, type MomentFlow, meterAt, type Standing } from './standing.ts';

/** What of the straight pipe the uncertainty of each flow needs. */
export interface Extra {
  readonly parts: readonly Part[];
  readonly open: readonly Open[];
}

export interface Context {
  readonly index: number; // of the row in the list
  readonly extra: Extra;
  readonly inUse?: Cell;
}

export interface SolvedRow {
  readonly record: SolvedReading;
  readonly inUse?: Cell;
}

/** A share of the line pressure that its own rounding hides: the two tappings differ by nothing. */
const NO_DIFFERENCE = Number.EPSILON;

/** Solves one row. Problems: those of the state, of the instrument and of the flow, at the fields of the row. */
export function solveReading(
  stands: Standing,
  instrument: Settled,
  reading: ReadingInput,
  context: Context,
): Outcome<SolvedRow> {
  const row = `readings.${context.index}`;
  const moment = momentOf(reading);
  const meter = meterAt(stands, moment, row); // 1 the state of the moment, which fills the legs
  if (!meter.ok) return meter;
  const { state } = meter.value;
  const conditions = { state, gravity: stands.site.gravity, ...inUseOf(context) };
  const shown = instrument.read(reading, conditions); // 2 the differential
  if (!shown.ok) return shown;
  const { standing, differential } = shown.value;
  const time = reading.time === undefined ? {} : { time: reading.time };
  const flows = differential > NO_DIFFERENCE * state.pressure && (standing === 'as-shown' || standing === 'at-least');
  const flow = flows ? flowAt(stands, moment, differential, row) : undefined; // 3 the flow
  if (flow === undefined) return ok({ record: { ...still(shown.value, state), ...time }, ...inUseOf(shown.value) });
  if (!flow.ok) return placed(flow.problems, row, instrument);
  const record = flowing(stands, shown.value, flow.value, context.extra); // 4 uncertainty, checks, record
  return ok({ record: Object.assign(record, time), ...inUseOf(shown.value) });
}

const inUseOf = ({ inUse }: { readonly inUse?: Cell }) => (inUse === undefined ? {} : { inUse });

/** A gauge upstream gives the line pressure, unless the row states one. */
function momentOf({ pressure, temperature, upstream }: ReadingInput): Moment {
  const own = pressure ?? upstream;
  return {
    ...(own === undefined ? {} : { pressure: own }),
    ...(temperature === undefined ? {} : { temperature }),
  };
}

/** A differential that no flow makes is the fault of what was read. */
function placed([first, ...rest]: readonly [Problem, ...Problem[]], row: string, { asks }: Settled): Outcome<never> {
  const value = `${row}.${asks.gauges === true ? 'throat' : 'value'}`;
  const there = (problem: Problem): Problem =>
    problem.field === 'differential' ? { ...problem, field: value } : problem;
  return { ok: false, problems: [there(first), ...rest.map(there)] };
}

const stateFigures = ({ pressure, temperature, density }: FluidState) => ({
  pressure_Pa: pressure,
  temperature_K: temperature,
  density_kg_m3: density,
});

/** A reading that makes no flow: cut off, at rest, reversed, or no reading at all. */
function still({ standing, differential, cautions, working, picture }: Shown, state: FluidState): SolvedReading {
  const equal = differential >= 0 && differential <= NO_DIFFERENCE * state.pressure;
  const none = standing === 'cut-off' || (standing === 'as-shown' && equal);
  const rest = state.baseDensity === undefined ? {} : { baseVolumeFlow_m3_s: 0 };
  return {
    status: 'solved',
    standing,
    counted: none,
    ...(standing === 'failed' ? {} : { differential_Pa: differential }),
    ...(none ? { massFlow_kg_s: 0, volumeFlow_m3_s: 0, ...rest } : {}),
    ...stateFigures(state),
    checks: checkInstrument(cautions),
    picture,
    working,
  };
}

function flowing(stands: Standing, shown: Shown, { meter, operation, correction }: MomentFlow, extra: Extra) {
  const { input, solution } = stands;
  const { state, geometry } = meter;
  const stated = shown.uncertainty.length === 0 ? undefined : combined(shown.uncertainty);
  const budget = budgetOf(stands, { meter, operation }, stated, extra);
  const here = { ...solution, meter, duty: { maximum: operation } };
  const figures = {
    status: 'solved',
    standing: shown.standing,
    counted: shown.standing === 'as-shown',
    differential_Pa: shown.differential,
    ...flowRecord(operation.massFlow, state),
    ...stateFigures(state),
    C: operation.coefficient,
    epsilon: operation.epsilon,
    reynoldsPipe: operation.reynolds,
    velocityPipe_m_s: velocityOf(operation.massFlow, state.density, geometry.pipe),
    uncertainty: uncertaintyRecord(budget, stated),
    compensation: compensationOf(stands, shown.differential, operation.massFlow, state),
    checks: checkReading({ input, solution: here }, shown.cautions),
    picture: shown.picture,
  } as const;
  return withLate<typeof figures, Pick<SolvedReading, 'working'>>(figures, {
    working: () => [
      ...(correction === undefined ? [] : correctionWorking(correction, state.pressure)),
      ...state.working,
      ...metalWorking(input, solution.boreAsMeasured, state.temperature),
      ...shown.working,
      ...pointWorking(meter, operation, 'flow', budget),
    ],
  });
}

/** Uncertainty of the flow; what the instrument states of itself, Pa, stands in place of what the meter states. */
function budgetOf(
  { input, solution }: Standing,
  { meter, operation }: MomentFlow,
  reading: number | undefined,
  { parts, open }: Extra,
): Budget {
  const own = reading === undefined ? undefined : { of: 'pressure' as const, value: reading as PressureDifference };
  const stated = own === undefined ? input.uncertainty : { ...input.uncertainty, differential: own };
  const budget = flowUncertainty(meter, operation, stated, solution.span, parts);
  return { ...budget, open: [...budget.open, ...open] };
}

function uncertaintyRecord({ expandedPercent, terms, open }: Budget, reading: number | undefined) {
  const ofReading = terms.find(({ name }) => name === 'differential')?.percentOfFlow;
  return {
    expanded_percent: expandedPercent,
    ...(reading === undefined ? {} : { reading_Pa: reading }),
    ...(reading === undefined || ofReading === undefined ? {} : { readingPercentOfFlow: ofReading }),
    open,
  };
}

/** A mass flow on every basis of its state. */
export const flowRecord = (massFlow: number, { density, baseDensity }: FluidState): FlowRecord => ({
  massFlow_kg_s: massFlow,
  volumeFlow_m3_s: massFlow / density,
  ...(baseDensity === undefined ? {} : { baseVolumeFlow_m3_s: massFlow / baseDensity }),
});

/** A percentage that rounding alone leaves is nothing. */
const beyondRounding = (percent: number): number => (Math.abs(percent) < 1e-10 ? 0 : percent);

/** What the mass flow of a root signal grows by from one density to another, at one differential: q_m ~ sqrt(dp rho). */
export const densityFactor = (density: number, design: number): number => Math.sqrt(density / design);

/**
 * A root signal scaled for the design state: q_m = q_m,max sqrt(dp/span), corrected by sqrt(rho/rho_d). At equal dp, C,
 * epsilon, d and D that is exact.
 */
function compensationOf(
  { solution }: Standing,
  differential: number,
  exact: number,
  state: FluidState,
): CompensationRecord {
  const design = solution.meter.state;
  const { massFlow, differential: full } = solution.duty.maximum;
  const indicated = massFlow * Math.sqrt(differential / full); // root signal of the design
  const factor = densityFactor(state.density, design.density);
  const corrected = indicated * factor;
  return {
    indicated: flowRecord(indicated, design),
    densityFactor: factor,
    corrected: flowRecord(corrected, state),
    residual_percent: beyondRounding(100 * (corrected / exact - 1)),
  };
}
