/** Every instrument that can be read, and the one of a document. */
import type { MeterText } from '../document/project.ts';
import { failed, openForm } from '../input/form.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import type { Instrument, Settled } from './contract.ts';
import { differential } from './differential.ts';
import { gauges } from './gauges.ts';
import { inclined } from './inclined.ts';
import { invertedUTube } from './inverted-u-tube.ts';
import { transmitter } from './transmitter.ts';
import { uTube } from './u-tube.ts';
import { well } from './well.ts';

export const instruments: readonly Instrument[] = [
  differential,
  uTube,
  invertedUTube,
  well,
  inclined,
  gauges,
  transmitter,
];

const UNSTATED = { kind: 'differential' };

/** The instrument of a meter with its fields read; a meter that names none is read as a pressure difference. */
export function instrumentOf(meter: MeterText): Outcome<Settled> {
  const form = openForm(meter.instrument === undefined ? { ...meter, instrument: UNSTATED } : meter);
  const kind = form.choice(
    'instrument.kind',
    instruments.map((instrument) => instrument.kind),
    true,
  );
  const settled = instruments.find((instrument) => instrument.kind === kind)?.settle(form);
  if (form.problems.length > 0 || settled === undefined) return failed(form);
  return ok(settled);
}
