/** Everything that a conversion has to know: the meter that stands, the columns, the rules for faults and for time. */
import { type Form, failed, openForm } from '../input/form.ts';
import { readLegs } from '../input/instrument.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import { quoted } from '../quantity/spelling.ts';
import type { SignalLimits } from '../reading/signal.ts';
import { readTransmitterFields } from '../reading/transmitter-fields.ts';
import type { Standing } from '../run/standing.ts';
import { HOUR } from './calendar.ts';
import type { FaultRule, SignalRule } from './faults.ts';
import type { Mapping, SignalKind } from './mapping.ts';

export interface LogPlan {
  readonly stands: Standing;
  readonly mapping: Mapping;
  readonly faults: FaultRule;
  /** s after midnight at which a day begins. */
  readonly dayStart: number;
  /** Every row through the whole calculation, without a surface. */
  readonly exact: boolean;
}

const MEASURES: Readonly<Record<Exclude<SignalKind, 'differential'>, string>> = {
  current: 'current',
  voltage: 'voltage',
  percent: 'share',
};

/**
 * The plan of a log. Problems: log-transmitter-missing (a signal of no stated transmitter), log-signal-unlike (in another
 * unit than its), log-legs (legs whose weight moves with each row), log-day-start; those of the transmitter's fields.
 */
export function planOf(stands: Standing, mapping: Mapping, exact = false): Outcome<LogPlan> {
  const form = openForm(stands.written);
  const signal = readSignal(form, mapping.signal.kind);
  if (isTransmitter(form)) refuseLegs(form);
  const dayStart = readDayStart(form);
  if (form.problems.length > 0) return failed(form);
  const { solution, upstream } = stands;
  const { pressure = solution.meter.state.pressure, temperature = solution.meter.state.temperature } = upstream;
  const { fallback, frozen, spike } = mapping;
  const faults: FaultRule = {
    ...(signal === undefined ? {} : { signal: signal.rule }),
    pressure: { constant: pressure, ...(fallback.pressure === undefined ? {} : { fallback: fallback.pressure }) },
    temperature: {
      constant: temperature,
      ...(fallback.temperature === undefined ? {} : { fallback: fallback.temperature }),
    },
    cutOff: mapping.cutOff ?? signal?.cutOff ?? 0,
    ...(frozen === undefined ? {} : { frozen }),
    ...(spike === undefined ? {} : { spike }),
  };
  return ok({ stands, mapping, faults, dayStart, exact });
}

const isTransmitter = ({ group }: Form): boolean =>
  (group as { instrument?: { kind?: unknown } }).instrument?.kind === 'transmitter';

/** The transmitter of a signal, in the unit that the reader hands it over in; undefined for a differential. */
function readSignal(form: Form, kind: SignalKind): { rule: SignalRule; cutOff: number } | undefined {
  if (kind === 'differential') return undefined;
  if (!isTransmitter(form)) return form.report('log-transmitter-missing', 'instrument.kind');
  const own = readTransmitterFields(form);
  if (own === undefined) return undefined;
  const { signal, range, output, zero, limits, cutOff } = own;
  if (signal.measure !== MEASURES[kind])
    return form.report('log-signal-unlike', 'log.signal.unit', { written: kind, expected: signal.measure });
  const inUnit = (si: number): number => Math.round((si / signal.size) * 1e9) / 1e9; // 0.0036 / 0.001 is not 3.6
  const scaled: SignalLimits = {
    failLow: inUnit(limits.failLow),
    low: inUnit(limits.low),
    high: inUnit(limits.high),
    failHigh: inUnit(limits.failHigh),
  };
  const ends = { zero: inUnit(signal.zero), full: inUnit(signal.full) };
  return { rule: { ends, range, output, zero, limits: scaled }, cutOff };
}

/** Legs that weigh nothing against each other: of the process fluid, or alike between tappings at one level. */
function refuseLegs(form: Form): void {
  const { upstream, downstream, rise } = readLegs(form);
  if (upstream === downstream && (upstream === 'process' || rise === 0)) return;
  form.report('log-legs', 'instrument.above');
}

/** The clock at which a day begins, '06:00'; midnight where none is stated. */
function readDayStart(form: Form): number {
  const text = form.word('log.dayStart')?.trim();
  if (text === undefined || text === '') return 0;
  const [, hours, minutes] = /^([01]?\d|2[0-3]):([0-5]\d)$/.exec(text) ?? [];
  if (hours === undefined) form.report('log-day-start', 'log.dayStart', { written: quoted(text) });
  return Number(hours ?? 0) * HOUR + Number(minutes ?? 0) * 60;
}
