/** Pressure and temperature at the upstream tapping, as far as they are written; which of them is needed the fluid says. */
import type { MeterText } from '../document/project.ts';
import type { AbsolutePressure, Temperature } from '../quantity/kinds.ts';
import type { Outcome, Problem } from '../quantity/outcome.ts';
import { type Form, openForm } from './form.ts';
import type { Site } from './site.ts';

export interface Upstream {
  readonly pressure?: AbsolutePressure;
  readonly temperature?: Temperature;
}

/** Reads the group `upstream`. Problems: those of quantity text; not-above-vacuum. */
export function readUpstream(meter: MeterText, site: Site): Outcome<Upstream> {
  const form = openForm(meter);
  const pressure = readPressure(form, site);
  const temperature = form.positive('upstream.temperature', ['temperature']);
  const [first, ...rest] = form.problems;
  if (first !== undefined) return { ok: false, problems: [first, ...rest] as [Problem, ...Problem[]] };
  return {
    ok: true,
    value: {
      ...(pressure === undefined ? {} : { pressure }),
      ...(temperature === undefined ? {} : { temperature: temperature.si as Temperature }),
    },
  };
}

/** Absolute as written, or gauge above the site's atmosphere. */
function readPressure(form: Form, site: Site): AbsolutePressure | undefined {
  const pressure = form.quantity('upstream.pressure', ['absolute pressure', 'gauge pressure']);
  if (pressure === undefined) return undefined;
  const absolute = pressure.unit.measure === 'gauge pressure' ? pressure.si + site.atmosphere : pressure.si;
  if (absolute > 0) return absolute as AbsolutePressure;
  return form.report('not-above-vacuum', 'upstream.pressure', {
    written: `${pressure.number} ${pressure.unit.symbol}`,
    absolute,
  });
}
