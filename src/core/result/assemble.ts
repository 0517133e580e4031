/** Puts a solved meter together into the one record that every view reads. */
import type { Finding } from '../check/finding.ts';
import type { Straightness } from '../check/straight.ts';
import { unchecked } from '../check/unchecked.ts';
import type { DutyName, MeterText } from '../document/project.ts';
import { relativeDensity } from '../fluid/air/relative-density.ts';
import type { FigureRange, FluidState } from '../fluid/contract.ts';
import type { MeterInput } from '../input/meter.ts';
import type { Site } from '../input/site.ts';
import type { Seen, Source } from '../quantity/source.ts';
import type { Working } from '../quantity/working.ts';
import { correctionWorking } from '../solve/downstream.ts';
import { lossOf, type Operation, velocityOf } from '../solve/equation.ts';
import { metalWorking } from '../solve/metal.ts';
import type { Solution } from '../solve/solve.ts';
import type { Budgets } from '../uncertainty/duty.ts';
import { type Budget, isKnown } from '../uncertainty/iso5167.ts';
import { curveOf, reynoldsLimits } from './curve.ts';
import { headsOf } from './heads.ts';
import { withLate } from './late.ts';
import type { Readings } from './readings-record.ts';
import type { PointRecord, RangeRecord, Solved, StateRecord } from './record.ts';
import { siteRecord, siteWorking } from './site.ts';
import { type Direction, pointWorking } from './working.ts';

export interface Parts {
  readonly written: MeterText;
  readonly input: MeterInput;
  readonly site: Site;
  readonly solution: Solution;
  readonly budgets: Budgets;
  readonly straight: Straightness;
  readonly checks: readonly Finding[];
  /** Absent where the file has neither instrument nor readings. */
  readonly readings?: () => Readings;
}

/** Keys of a meter that are kept for later versions and not evaluated by this one. */
const UNREAD: readonly string[] = [];

/** The record of a solved meter; what only screen and paper ask for is worked out when they do. */
export function assemble(parts: Parts): Solved {
  const { written, input, site, solution, straight, checks } = parts;
  const { meter, duty, span } = solution;
  const { geometry, primary, state } = meter;
  const tappings = primary.tappings(geometry);
  const relative = relativeOf(state, input, site);
  const figures = {
    tag: input.tag,
    status: 'solved',
    find: input.find,
    element: primary.name,
    standard: primary.standard,
    site: siteRecord(site),
    state: { ...stateRecord(state, relative), ...downstreamRecord(solution) },
    ...boreOf(solution),
    pipe_m: geometry.pipe,
    pipeAsMeasured_m: solution.pipeAsMeasured,
    points: pointsOf(parts),
    span_Pa: span,
    checks,
    unchecked: unchecked({ input, solution }),
    straightLengths: straight.lengths,
    tappings: { upstream_m: tappings.upstream, downstream_m: tappings.downstream },
    unread: UNREAD.filter((key) => written[key] !== undefined),
  } as const;
  const solved: Solved = withLate<typeof figures, Late>(figures, {
    curve: () => curveOf(meter, span, input.uncertainty, straight.parts),
    reynoldsLimits: () => reynoldsLimits(meter),
    heads: () => headsOf(meter, duty.maximum, site.gravity),
    dimensions: () => primary.dimensions(geometry),
    working: () => [...siteWorking(site), ...stateWorking(solution), ...relative, ...metalOf(parts)],
    sources: () => sourcesOf(solved, parts.budgets),
    ...(parts.readings === undefined ? {} : { readings: parts.readings }),
  });
  return solved;
}

/** The bore and its ratio, of an element that has one. */
function boreOf({ meter: { geometry }, boreAsMeasured }: Solution) {
  if (boreAsMeasured === undefined) return {};
  return { bore_m: geometry.bore, diameterRatio: geometry.ratio, boreAsMeasured_m: boreAsMeasured };
}

/** What only screen and paper ask for. */
type Late = Pick<Solved, 'readings' | 'curve' | 'reynoldsLimits' | 'heads' | 'dimensions' | 'working' | 'sources'>;

/** What was made of a temperature measured behind the element. */
function downstreamRecord({ downstream }: Solution): Pick<StateRecord, 'downstream'> {
  if (downstream === undefined) return {};
  const { measured } = downstream;
  return { downstream: { measured_K: measured, ...('loss' in downstream ? { loss_Pa: downstream.loss } : {}) } };
}

/** The state, its temperature first where that was found from one measured behind the element. */
function stateWorking({ downstream, meter: { state } }: Solution): readonly Working[] {
  const corrected = downstream !== undefined && 'loss' in downstream;
  return [...(corrected ? correctionWorking(downstream, state.pressure) : []), ...state.working];
}

/** How the metal grew, and the area that a bar across the pipe leaves clear, where its coefficient counts that. */
function metalOf({ input, solution: { boreAsMeasured, meter } }: Parts): readonly Working[] {
  const area = meter.primary.insertion?.area?.(meter.geometry.pipe);
  const grown = metalWorking(input, boreAsMeasured, meter.state.temperature);
  return area === undefined ? grown : [...grown, area];
}

/** The relative density as a working line, for a gas whose base volume counts the whole of it: none for air. */
function relativeOf({ phase, baseDensity }: FluidState, { fluid }: MeterInput, { base }: Site): readonly Working[] {
  if (phase !== 'gas' || baseDensity === undefined || fluid.kind === 'air') return [];
  const line = relativeDensity(baseDensity, base);
  return line === undefined ? [] : [line];
}

/** The state as views read it; `relative` is the working of its relative density, where it has one. */
export function stateRecord(state: FluidState, [relative]: readonly Working[]): StateRecord {
  const optional = {
    isentropicExponent: state.isentropicExponent,
    compressibility: state.compressibility,
    vapourPressure_Pa: state.phase === 'liquid' ? state.vapourPressure : undefined,
    saturationTemperature_K: state.saturationTemperature,
    baseDensity_kg_m3: state.baseDensity,
    molarMass_kg_mol: state.molarMass,
    relativeDensity: relative?.value,
    quality: state.quality,
    jouleThomson_K_Pa: state.jouleThomson,
    overridden: state.overridden,
    uncertainty_percent: percentsOf(state.uncertainties),
    ranges: rangesOf(state.ranges),
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

/** The ranges of the figures, by their names; undefined where none is known. */
function rangesOf(ranges: FluidState['ranges']): Readonly<Record<string, RangeRecord>> | undefined {
  const known = Object.entries(ranges ?? {}).map(([name, range]) => [name, rangeOf(range)] as const);
  return known.length === 0 ? undefined : Object.fromEntries(known);
}

const rangeOf = ({ temperature: T = {}, pressure: p = {} }: FigureRange): RangeRecord => ({
  ...(T.min === undefined ? {} : { minTemperature_K: T.min }),
  ...(T.max === undefined ? {} : { maxTemperature_K: T.max }),
  ...(p.min === undefined ? {} : { minPressure_Pa: p.min }),
  ...(p.max === undefined ? {} : { maxPressure_Pa: p.max }),
});

/** Uncertainties that the formulations state, by the names of the figures, in per cent; undefined where none does. */
function percentsOf(stated: FluidState['uncertainties']): Readonly<Record<string, number>> | undefined {
  const known = Object.entries(stated ?? {}).map(([name, { share }]) => [name, 100 * share] as const);
  return known.length === 0 ? undefined : Object.fromEntries(known);
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
  const loss = lossOf(solution.meter, operation);
  const direction: Direction = name === 'maximum' && input.find === 'flow' ? 'flow' : 'differential';
  const figures = {
    massFlow_kg_s: massFlow,
    volumeFlow_m3_s: massFlow / state.density,
    ...(state.baseDensity === undefined ? {} : { baseVolumeFlow_m3_s: massFlow / state.baseDensity }),
    differential_Pa: differential,
    C: coefficient,
    epsilon,
    reynoldsPipe: reynolds,
    ...(loss === undefined ? {} : { permanentLoss_Pa: loss }),
    velocityPipe_m_s: velocityOf(massFlow, state.density, geometry.pipe),
    ...(primary.insertion === undefined
      ? { velocityBore_m_s: velocityOf(massFlow, state.density, geometry.bore) }
      : {}),
    uncertainty: {
      ...(isKnown(budget) ? { expanded_percent: budget.expandedPercent } : {}),
      terms: budget.terms.map(({ name: term, percentOfFlow }) => ({ name: term, percentOfFlow })),
      parts: budget.coefficientParts.map(({ id, percent }) => ({ name: id, percentOfC: percent })),
      open: budget.open,
    },
  };
  return withLate<typeof figures, Pick<PointRecord, 'working'>>(figures, {
    working: () => pointWorking(solution.meter, operation, direction, budget),
  });
}

const WORST: readonly Seen[] = ['memory', 'second-hand', 'practice', 'derived', 'read'];

/** Every source once, the least certain first. */
function sourcesOf(solved: Solved, budgets: Budgets): readonly Source[] {
  const working = [...solved.working, ...Object.values(solved.points).flatMap((point) => point.working)];
  const parts = Object.values(budgets).flatMap((budget) => budget.coefficientParts);
  return sourcesOnce([...working, ...solved.checks, ...parts].map(({ source }) => source));
}

/** Each source once, the least certain first. */
export function sourcesOnce(all: readonly Source[]): readonly Source[] {
  const once = [...new Map(all.map((source) => [`${source.seen} ${source.clause}`, source])).values()];
  return once.sort((one, other) => WORST.indexOf(one.seen) - WORST.indexOf(other.seen));
}
