/**
 * The log of a day at one row a second, as a transmitter and its neighbours would have written it, drawn from a seed:
 * a signal of 4 to 20 mA, a pressure and a temperature, with the faults that logs have. It is the same on every machine.
 */
import { seeded } from '../numeric/seeded.ts';
import { type Bytes, endRow, flush, openBytes, type Sink, writeByte, writeDigits, writeWord } from './bytes.ts';
import { DAY } from './calendar.ts';
import { openCalendar, writeStamp } from './stamp.ts';

/** What the log shows of a meter: its usual pressure and temperature, in the units of its columns. */
export interface ExampleLog {
  readonly from: number; // s since 1970-01-01 UTC
  readonly seconds: number;
  readonly seed: number;
  readonly pressure: number; // bar(g)
  readonly temperature: number; // degC
  /** Whether the transmitter takes the root. */
  readonly root?: boolean;
}

/** The kinds of what goes wrong. */
export type Mishap =
  | 'fault-high'
  | 'fault-low'
  | 'saturated'
  | 'uncertain'
  | 'stopped'
  | 'no-rows'
  | 'twice'
  | 'clock-back'
  | 'no-pressure'
  | 'no-temperature'
  | 'unreadable';

/** Second of the day at which it begins, and for how many seconds it lasts. */
export const MISHAPS: readonly { readonly at: number; readonly seconds: number; readonly what: Mishap }[] = [
  { at: 7_200, seconds: 95, what: 'fault-high' },
  { at: 11_000, seconds: 3, what: 'twice' },
  { at: 14_600, seconds: 1, what: 'unreadable' },
  { at: 18_000, seconds: 40, what: 'fault-low' },
  { at: 21_900, seconds: 1_260, what: 'no-rows' },
  { at: 30_000, seconds: 600, what: 'no-pressure' },
  { at: 36_500, seconds: 12, what: 'clock-back' },
  { at: 41_000, seconds: 75, what: 'saturated' },
  { at: 47_300, seconds: 30, what: 'uncertain' },
  { at: 52_000, seconds: 2_400, what: 'stopped' },
  { at: 60_000, seconds: 240, what: 'no-temperature' },
  { at: 66_600, seconds: 2, what: 'twice' },
  { at: 75_000, seconds: 8, what: 'no-rows' },
];

const HEADER = 'time,signal_mA,pressure_bar,temperature_degC';
const COMMA = 44;
/** Seconds by which the clock was put back, for as long as the mishap lasts. */
const PUT_BACK = 3600;

/** Writes the log to a sink, whose bytes are used again after the call. */
export function writeExample(log: ExampleLog, sink: Sink): void {
  const out = openBytes(sink);
  const calendar = openCalendar();
  const random = seeded(log.seed);
  writeWord(out, HEADER);
  endRow(out);
  let drift = 0;
  for (let second = 0; second < log.seconds; second += 1) {
    const what = mishapAt(second % DAY);
    drift += (random() - 0.5) / 50 - drift / 200;
    const figures = {
      signal: signalOf(log, what, second % DAY, drift + (random() - 0.5) / 60),
      ...aroundOf(log, drift, random()),
    };
    if (what === 'no-rows') continue;
    for (let time = what === 'twice' ? 0 : 1; time < 2; time += 1) {
      writeStamp(out, calendar, log.from + second - (what === 'clock-back' ? PUT_BACK : 0));
      writeFigures(out, figures, what);
      endRow(out);
    }
  }
  flush(out);
}

function mishapAt(second: number): Mishap | undefined {
  for (const { at, seconds, what } of MISHAPS) if (second >= at && second < at + seconds) return what;
  return undefined;
}

/** Signals of mishaps, thousandths of a milliampere. */
const MISHAP_SIGNALS: Readonly<Partial<Record<Mishap, number>>> = {
  'fault-high': 21_600,
  'fault-low': 3_500,
  saturated: 20_600,
  uncertain: 3_700,
};
const ZERO_NOISE = 1200; // of a stopped flow, thousandths of a milliampere for a drift of 1

/** Thousandths of a milliampere; `moved` is how far the flow is off the course of its day. */
function signalOf({ root = false }: ExampleLog, what: Mishap | undefined, second: number, moved: number): number {
  const mishap = what === undefined ? undefined : MISHAP_SIGNALS[what];
  if (mishap !== undefined) return mishap;
  if (what === 'stopped') return 4_000 + Math.round(ZERO_NOISE * (moved % 0.01));
  const share = second / DAY;
  const flow = 0.5 + 1.2 * share * (1 - share) + moved; // more at noon
  return 4_000 + Math.round(16_000 * (root ? flow : flow * flow));
}

/** Pressure in thousandths, temperature in hundredths. */
const aroundOf = ({ pressure, temperature }: ExampleLog, drift: number, noise: number) => ({
  pressure: Math.round(1000 * pressure * (1 - drift / 5) + 10 * noise),
  temperature: Math.round(100 * (temperature + 10 * drift + noise / 5)),
});

interface Figures {
  readonly signal: number;
  readonly pressure: number;
  readonly temperature: number;
}

function writeFigures(out: Bytes, { signal, pressure, temperature }: Figures, what: Mishap | undefined): void {
  writeByte(out, COMMA);
  if (what === 'unreadable') writeWord(out, 'Bad Input');
  else writeDecimal(out, signal, 3);
  writeByte(out, COMMA);
  if (what !== 'no-pressure') writeDecimal(out, pressure, 3);
  writeByte(out, COMMA);
  if (what !== 'no-temperature') writeDecimal(out, temperature, 2);
}

/** A count of so many decimal places, above zero. */
function writeDecimal(out: Bytes, count: number, places: number): void {
  const unit = 10 ** places;
  const whole = Math.floor(count / unit);
  writeDigits(out, whole, String(whole).length);
  writeWord(out, '.');
  writeDigits(out, count - whole * unit, places);
}
