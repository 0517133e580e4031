/** Pressure and temperature at the upstream tapping, as far as they are written; which of them is needed the fluid says. */
import type { MeterText } from '../document/project.ts';
import type { AbsolutePressure, GaugePressure, Temperature } from '../quantity/kinds.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import { type Form, failed, openForm } from './form.ts';
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
  if (form.problems.length > 0) return failed(form);
  return ok({
    ...(pressure === undefined ? {} : { pressure }),
    ...(temperature === undefined ? {} : { temperature: temperature.si }),
  });
}

/** Absolute as written, or gauge above the site's atmosphere. */
function readPressure(form: Form, site: Site): AbsolutePressure | undefined {
  const pressure = form.quantity('upstream.pressure', ['absolute pressure', 'gauge pressure']);
  if (pressure === undefined) return undefined;
  const absolute = pressure.measure === 'gauge pressure' ? aboveVacuum(pressure.si, site) : pressure.si;
  if (absolute > 0) return absolute;
  return form.report('not-above-vacuum', 'upstream.pressure', {
    written: `${pressure.number} ${pressure.unit.symbol}`,
    absolute,
  });
}

/** A gauge pressure from the site's atmosphere upward, as pressure above vacuum; both in Pa. */
const aboveVacuum = (gauge: GaugePressure, { atmosphere }: Site): AbsolutePressure =>
  (atmosphere + gauge) as AbsolutePressure; // p = p_atm + p_e
