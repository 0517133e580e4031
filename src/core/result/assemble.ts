/** Puts a solved meter together into the one record that every view reads. */
import type { Finding } from '../check/finding.ts';
import type { Straightness } from '../check/straight.ts';
import type { DutyName, MeterText } from '../document/project.ts';
import type { FluidState } from '../fluid/contract.ts';
import type { MeterInput } from '../input/meter.ts';
import type { Site } from '../input/site.ts';
import type { Seen, Source } from '../quantity/source.ts';
import type { Operation } from '../solve/equation.ts';
import { metalWorking } from '../solve/metal.ts';
import type { Solution } from '../solve/solve.ts';
import type { Budgets } from '../uncertainty/duty.ts';
import type { Budget } from '../uncertainty/iso5167.ts';
import { curveOf, reynoldsLimits } from './curve.ts';
import { headsOf } from './heads.ts';
import type { PointRecord, Solved, StateRecord } from './record.ts';
import { type Direction, pointWorking, velocityOf } from './working.ts';

export interface Parts {
  readonly written: MeterText;
  readonly input: MeterInput;
  readonly site: Site;
  readonly solution: Solution;
  readonly budgets: Budgets;
  readonly straight: Straightness;
  readonly checks: readonly Finding[];
}

/** Keys of a meter that are kept for later versions and not evaluated by this one. */
const UNREAD = ['instrument', 'readings', 'log'] as const;

export function assemble(parts: Parts): Solved {
  const { written, input, site, solution, straight, checks } = parts;
  const { meter, duty, span } = solution;
  const { geometry, primary, state } = meter;
  const maximum = duty.maximum as Operation;
  const points = pointsOf(parts);
  const tappings = primary.tappings(geometry);
  const solved = {
    tag: input.tag,
    status: 'solved',
    find: input.find,
    element: primary.name,
    standard: primary.standard,
    state: stateRecord(state),
    bore_m: geometry.bore,
    pipe_m: geometry.pipe,
    diameterRatio: geometry.ratio,
    boreAsMeasured_m: solution.boreAsMeasured,
    pipeAsMeasured_m: solution.pipeAsMeasured,
    points,
    span_Pa: span,
    checks,
    curve: curveOf(meter, span, input.uncertainty, straight.parts),
    reynoldsLimits: reynoldsLimits(meter),
    heads: headsOf(meter, maximum, site.gravity),
    dimensions: primary.dimensions(geometry),
    tappings: { upstream_m: tappings.upstream, downstream_m: tappings.downstream },
    straightLengths: straight.lengths,
    working: [...state.working, ...metalWorking(input, solution.boreAsMeasured, state.temperature)],
    unread: UNREAD.filter((key) => written[key] !== undefined),
  } as const satisfies Omit<Solved, 'sources'>;
  return { ...solved, sources: sourcesOf(solved, parts.budgets) };
}

function stateRecord(state: FluidState): StateRecord {
  const optional = {
    isentropicExponent: state.isentropicExponent,
    compressibility: state.compressibility,
    vapourPressure_Pa: state.vapourPressure,
    saturationTemperature_K: state.saturationTemperature,
    baseDensity_kg_m3: state.baseDensity,
    quality: state.quality,
    overridden: state.overridden,
  };
  const known = Object.entries(optional).filter(([, value]) => value !== undefined);
  return {
    density_kg_m3: state.density,
    viscosity_Pa_s: state.viscosity,
    ...Object.fromEntries(known),
    phase: state.phase,
    pressure_Pa: state.pressure,
    temperature_K: state.temperature,
  };
}

function pointsOf(parts: Parts): Partial<Record<DutyName, PointRecord>> {
  const entries = (['maximum', 'normal', 'minimum'] as const).flatMap((name) => {
    const operation = parts.solution.duty[name];
    const budget = parts.budgets[name];
    return operation && budget ? [[name, pointOf(parts, name, operation, budget)] as const] : [];
  });
  return Object.fromEntries(entries);
}

function pointOf({ input, solution }: Parts, name: DutyName, operation: Operation, budget: Budget): PointRecord {
  const { state, geometry, primary } = solution.meter;
  const { massFlow, differential, coefficient, epsilon, reynolds } = operation;
  const direction: Direction = name === 'maximum' && input.find === 'flow' ? 'flow' : 'differential';
  return {
    massFlow_kg_s: massFlow,
    volumeFlow_m3_s: massFlow / state.density,
    ...(state.baseDensity === undefined ? {} : { baseVolumeFlow_m3_s: massFlow / state.baseDensity }),
    differential_Pa: differential,
    C: coefficient,
    epsilon,
    reynoldsPipe: reynolds,
    permanentLoss_Pa: differential * primary.lossShare(geometry, coefficient, reynolds),
    velocityPipe_m_s: velocityOf(massFlow, state.density, geometry.pipe),
    velocityBore_m_s: velocityOf(massFlow, state.density, geometry.bore),
    uncertainty: {
      expanded_percent: budget.expandedPercent,
      terms: budget.terms.map(({ name: term, percentOfFlow }) => ({ name: term, percentOfFlow })),
      parts: budget.coefficientParts.map(({ id, percent }) => ({ name: id, percentOfC: percent })),
    },
    working: pointWorking(solution.meter, operation, direction, budget),
  };
}

const WORST: readonly Seen[] = ['memory', 'second-hand', 'practice', 'derived', 'read'];

/** Every source once, the least certain first. */
function sourcesOf(solved: Omit<Solved, 'sources'>, budgets: Budgets): readonly Source[] {
  const working = [...solved.working, ...Object.values(solved.points).flatMap((point) => point.working)];
  const parts = Object.values(budgets).flatMap((budget) => budget.coefficientParts);
  const all = [...working, ...solved.checks, ...parts].map(({ source }) => source);
  const once = [...new Map(all.map((source) => [`${source.seen} ${source.clause}`, source])).values()];
  return once.sort((one, other) => WORST.indexOf(one.seen) - WORST.indexOf(other.seen));
}
