/** Pressure and temperature of the fluid, as far as they are written; which of them is needed the fluid says. */
import type { AbsolutePressure, GaugePressure, Temperature } from '../quantity/kinds.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import { type Form, failed, openForm } from './form.ts';
import type { Site } from './site.ts';

export interface Upstream {
  readonly pressure?: AbsolutePressure;
  readonly temperature?: Temperature;
  /** True where the temperature was measured behind the element. */
  readonly downstream?: boolean;
}

/** Where a temperature is measured, seen from the element; upstream unless it is said. */
const PLACES = ['upstream', 'downstream'] as const;

/** Reads the group `upstream` of a meter, or `state` of a traverse. Problems: those of quantity text; not-above-vacuum; choice-unknown. */
export function readUpstream(written: object, site: Site, group: 'upstream' | 'state' = 'upstream'): Outcome<Upstream> {
  const form = openForm(written);
  const pressure = readPressure(form, site, `${group}.pressure`);
  const temperature = form.positive(`${group}.temperature`, ['temperature']);
  const at = group === 'upstream' ? form.choice('upstream.temperatureAt', PLACES) : undefined;
  if (form.problems.length > 0) return failed(form);
  return ok({
    ...(pressure === undefined ? {} : { pressure }),
    ...(temperature === undefined ? {} : { temperature: temperature.si }),
    ...(at === 'downstream' ? { downstream: true } : {}),
  });
}

/** Absolute as written, or gauge above the site's atmosphere. Problem not-above-vacuum. */
export function readPressure(form: Form, site: Site, field: string): AbsolutePressure | undefined {
  const pressure = form.quantity(field, ['absolute pressure', 'gauge pressure']);
  if (pressure === undefined) return undefined;
  const absolute = pressure.measure === 'gauge pressure' ? aboveVacuum(pressure.si, site) : pressure.si;
  if (absolute > 0) return absolute;
  return form.report('not-above-vacuum', field, { written: `${pressure.number} ${pressure.unit.symbol}`, absolute });
}

/** A gauge pressure from the site's atmosphere upward, as pressure above vacuum; both in Pa. */
const aboveVacuum = (gauge: GaugePressure, { atmosphere }: Site): AbsolutePressure =>
  (atmosphere + gauge) as AbsolutePressure; // p = p_atm + p_e
