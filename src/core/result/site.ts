/** The site as views read it, and the working of what its place gives. */
import type { Site } from '../input/site.ts';
import { atmosphereSource, gravitySource } from '../quantity/place.ts';
import { named, type Working } from '../quantity/working.ts';
import type { SiteRecord } from './record.ts';

/** Site and base state, with where atmosphere and gravity come from. */
export function siteRecord({ atmosphere, gravity, base, from, place }: Site): SiteRecord {
  const known = {
    altitude_m: place.altitude,
    latitude_rad: place.latitude,
    suggestedAtmosphere_Pa: place.atmosphere,
    suggestedGravity_m_s2: place.gravity,
  };
  return {
    atmosphere_Pa: atmosphere,
    atmosphereFrom: from.atmosphere,
    gravity_m_s2: gravity,
    gravityFrom: from.gravity,
    basePressure_Pa: base.pressure,
    baseTemperature_K: base.temperature,
    ...Object.fromEntries(Object.entries(known).filter(([, value]) => value !== undefined)),
  };
}

/** What the place gives and nobody stated. */
export function siteWorking({ atmosphere, gravity, from, place }: Site): readonly Working[] {
  const altitude = place.altitude === undefined ? [] : [named('z', place.altitude, 'm', 'altitude')];
  const latitude = place.latitude === undefined ? [] : [named('φ', place.latitude, 'rad', 'latitude')];
  const lines: readonly (Working | undefined)[] = [
    from.atmosphere !== 'place'
      ? undefined
      : {
          id: 'site-atmosphere',
          symbol: 'p_atm',
          given: altitude,
          value: atmosphere,
          unit: 'Pa(a)',
          source: atmosphereSource,
          remark: 'standard-atmosphere',
        },
    from.gravity !== 'place'
      ? undefined
      : {
          id: 'site-gravity',
          symbol: 'g',
          given: [...latitude, ...altitude],
          value: gravity,
          unit: 'm/s2',
          source: gravitySource,
          remark: 'normal-gravity',
        },
  ];
  return lines.filter((line) => line !== undefined);
}
