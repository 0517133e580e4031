/** One row of the readings of a meter -> parsed quantities, or every problem of that row. */
import type { AbsolutePressure, Temperature } from '../quantity/kinds.ts';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import type { Quantity } from '../quantity/text.ts';
import type { Measure } from '../quantity/units.ts';
import { at, failed, openForm } from './form.ts';
import type { Site } from './site.ts';
import { readPressure } from './upstream.ts';

export interface ReadingInput {
  /** As written: what the user calls the moment. */
  readonly time?: string;
  readonly value?: Quantity;
  /** What the cell of the lower range showed. */
  readonly lowRange?: Quantity;
  /** Of two gauges, where they stand. */
  readonly upstream?: AbsolutePressure;
  readonly throat?: AbsolutePressure;
  /** State upstream at that moment; what is absent is as the meter has it. */
  readonly pressure?: AbsolutePressure;
  readonly temperature?: Temperature;
}

/** What an instrument asks of a row. */
export interface Asks {
  /** In which measures its value may be written; empty where it has two gauges instead. */
  readonly shows: readonly Measure[];
  readonly gauges?: boolean;
  readonly lowRange?: boolean;
}

/** Reads row `index`. Problems: group-expected, and those of quantity text, at readings.<index>.<name>. */
export function readReading(meter: object, index: number, asks: Asks, site: Site): Outcome<ReadingInput> {
  const row = `readings.${index}`;
  const written = at(meter, row);
  if (typeof written !== 'object' || written === null || Array.isArray(written))
    return fail('group-expected', row, { written: Array.isArray(written) ? 'a list' : typeof written });
  const form = openForm(meter);
  const time = form.word(`${row}.time`);
  const value = asks.shows.length > 0 ? form.quantity(`${row}.value`, asks.shows, true) : undefined;
  const lowRange = asks.lowRange === true ? form.quantity(`${row}.lowRange`, asks.shows, true) : undefined;
  const gauge = (name: 'upstream' | 'throat') => {
    if (asks.gauges !== true) return undefined;
    const missing = form.quantity(`${row}.${name}`, ['absolute pressure', 'gauge pressure'], true) === undefined;
    return missing ? undefined : readPressure(form, site, `${row}.${name}`);
  };
  const [upstream, throat] = [gauge('upstream'), gauge('throat')];
  const pressure = readPressure(form, site, `${row}.pressure`);
  const temperature = form.positive(`${row}.temperature`, ['temperature'])?.si;
  if (form.problems.length > 0) return failed(form);
  const all = { time, value, lowRange, upstream, throat, pressure, temperature };
  return ok(Object.fromEntries(Object.entries(all).filter(([, one]) => one !== undefined)));
}
