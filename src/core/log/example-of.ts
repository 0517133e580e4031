/** The example log of a meter: a day around the state that its meter has. */
import type { MeterText } from '../document/project.ts';
import { celsius } from '../quantity/constants.ts';
import { gather, type Outcome, ok } from '../quantity/outcome.ts';
import { standing } from '../run/standing.ts';
import type { Sink } from './bytes.ts';
import { DAY, daysOf } from './calendar.ts';
import { writeExample } from './example.ts';
import type { OfMeter } from './look.ts';

const BAR = 1e5; // Pa
const SEED = 4101;

/** Writes the log of a day at one row a second to a sink, whose bytes are used again after the call. Problems: those of the meter. */
export function writeExampleOf({ meter, index, project }: OfMeter, sink: Sink): Outcome<undefined> {
  const stands = standing(meter, index, project);
  if (!stands.ok) return gather(stands);
  const { pressure, temperature } = stands.value.solution.meter.state;
  writeExample(
    {
      from: daysOf(2026, 3, 14) * DAY,
      seconds: DAY,
      seed: SEED,
      pressure: (pressure - stands.value.site.atmosphere) / BAR,
      temperature: celsius(temperature),
      root: takesRoot(stands.value.written),
    },
    sink,
  );
  return ok(undefined);
}

/** Whether the transmitter of a meter takes the root. */
function takesRoot({ instrument }: MeterText): boolean {
  return typeof instrument === 'object' && instrument !== null && instrument.output === 'square-root';
}
