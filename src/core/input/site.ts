/**
 * The project's site and base state, read once for all meters. Defaults as the file contract gives them; a stated
 * atmosphere or gravity always wins over what altitude and latitude suggest.
 */
import { SITE_DEFAULTS } from '../document/defaults.ts';
import type { Project } from '../document/project.ts';
import type { AbsolutePressure, Acceleration, Temperature } from '../quantity/kinds.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import { normalGravity, standardAtmosphere } from '../quantity/place.ts';
import { type Form, failed, openForm } from './form.ts';

/** Where a figure of the site comes from: the file, what is usual, or the place. */
export type SiteFigureFrom = 'stated' | 'usual' | 'place';

export interface Site {
  readonly atmosphere: AbsolutePressure;
  readonly gravity: Acceleration;
  readonly base: { readonly pressure: AbsolutePressure; readonly temperature: Temperature };
  readonly from: { readonly atmosphere: SiteFigureFrom; readonly gravity: SiteFigureFrom };
  readonly place: Place;
}

/** Where the site lies, as far as it is said, and what follows from it. */
export interface Place {
  readonly altitude?: number; // m above the sea
  readonly latitude?: number; // rad, north positive
  /** Of the standard atmosphere at the altitude. */
  readonly atmosphere?: AbsolutePressure;
  /** Normal gravity at the latitude and the altitude. */
  readonly gravity?: Acceleration;
}

const POLE = Math.PI / 2;

/**
 * Reads site and base. Problems: those of quantity text, at site.atmosphere, site.gravity, site.altitude, site.latitude,
 * base.pressure, base.temperature; altitude-out-of-range, latitude-out-of-range.
 */
export function readSite(project: Pick<Project, 'site' | 'base'>): Outcome<Site> {
  const form = openForm({
    site: { ...project.site },
    usual: SITE_DEFAULTS,
    base: { pressure: SITE_DEFAULTS.basePressure, temperature: SITE_DEFAULTS.baseTemperature, ...project.base },
  });
  const statedAtmosphere = form.positive('site.atmosphere', ['absolute pressure']);
  const statedGravity = form.positive('site.gravity', ['acceleration']);
  const place = readPlace(form);
  const usualAtmosphere = form.positive('usual.atmosphere', ['absolute pressure'], true);
  const usualGravity = form.positive('usual.gravity', ['acceleration'], true);
  const pressure = form.positive('base.pressure', ['absolute pressure'], true);
  const temperature = form.positive('base.temperature', ['temperature'], true);
  if (form.problems.length > 0 || !(usualAtmosphere && usualGravity && pressure && temperature)) return failed(form);
  const [atmosphere, atmosphereFrom] = settled(statedAtmosphere?.si, place.atmosphere, usualAtmosphere.si);
  const [gravity, gravityFrom] = settled(statedGravity?.si, place.gravity, usualGravity.si);
  const base = { pressure: pressure.si, temperature: temperature.si };
  return ok({ atmosphere, gravity, base, from: { atmosphere: atmosphereFrom, gravity: gravityFrom }, place });
}

/** What is stated, else what the place has, else what is usual. */
function settled<Value>(
  stated: Value | undefined,
  ofPlace: Value | undefined,
  usual: Value,
): readonly [value: Value, from: SiteFigureFrom] {
  if (stated !== undefined) return [stated, 'stated'];
  return ofPlace === undefined ? [usual, 'usual'] : [ofPlace, 'place'];
}

/** Altitude and latitude, and what the two suggest; gravity asks for a latitude, and takes the sea level without altitude. */
function readPlace(form: Form): Place {
  const altitude = form.quantity('site.altitude', ['length']);
  const latitude = form.quantity('site.latitude', ['angle']);
  const air = altitude === undefined ? undefined : standardAtmosphere(altitude.si, 'site.altitude');
  if (air?.ok === false) form.problems.push(...air.problems);
  const written = latitude === undefined ? '' : `${latitude.number} ${latitude.unit.symbol}`;
  if (latitude !== undefined && Math.abs(latitude.si) > POLE)
    form.report('latitude-out-of-range', 'site.latitude', { written });
  return {
    ...(altitude === undefined ? {} : { altitude: altitude.si }),
    ...(latitude === undefined ? {} : { latitude: latitude.si }),
    ...(air?.ok === true ? { atmosphere: air.value.pressure } : {}),
    ...(latitude === undefined ? {} : { gravity: normalGravity(latitude.si, altitude?.si) }),
  };
}
