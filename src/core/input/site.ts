/** The project's site and base state, read once for all meters. Defaults as the file contract gives them. */
import { SITE_DEFAULTS } from '../document/defaults.ts';
import type { Project } from '../document/project.ts';
import type { AbsolutePressure, Acceleration, Temperature } from '../quantity/kinds.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import { failed, openForm } from './form.ts';

export interface Site {
  readonly atmosphere: AbsolutePressure;
  readonly gravity: Acceleration;
  readonly base: { readonly pressure: AbsolutePressure; readonly temperature: Temperature };
}

/** Reads site and base. Problems: those of quantity text, at site.atmosphere, site.gravity, base.pressure, base.temperature. */
export function readSite(project: Pick<Project, 'site' | 'base'>): Outcome<Site> {
  const form = openForm({
    site: { atmosphere: SITE_DEFAULTS.atmosphere, gravity: SITE_DEFAULTS.gravity, ...project.site },
    base: { pressure: SITE_DEFAULTS.basePressure, temperature: SITE_DEFAULTS.baseTemperature, ...project.base },
  });
  const atmosphere = form.positive('site.atmosphere', ['absolute pressure'], true);
  const gravity = form.positive('site.gravity', ['acceleration'], true);
  const pressure = form.positive('base.pressure', ['absolute pressure'], true);
  const temperature = form.positive('base.temperature', ['temperature'], true);
  if (!(atmosphere && gravity && pressure && temperature)) return failed(form);
  const base = { pressure: pressure.si, temperature: temperature.si };
  return ok({ atmosphere: atmosphere.si, gravity: gravity.si, base });
}
