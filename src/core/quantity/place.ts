/**
 * What a place on Earth has instead of the two constants: the pressure of the standard atmosphere at its altitude, and
 * normal gravity at its latitude and height. The weather moves the pressure by 3 %, the ground gravity by up to 0.02 %.
 * Standard: ISO 2533:1975 (ICAO Doc 7488) to 47 km; GRS 80 (Moritz, J. Geodesy 74 (2000) 128). Symbols: theirs; SI.
 */
import { standardGravity as g0, standardAtmosphere as seaLevel } from './constants.ts';
import type { AbsolutePressure, Acceleration, Density, DynamicViscosity, Temperature, Velocity } from './kinds.ts';
import { fail, type Outcome, ok } from './outcome.ts';
import type { Source } from './source.ts';

/** Where the atmosphere of an altitude, and gravity at a latitude, come from. */
export const atmosphereSource: Source = { clause: 'ISO 2533:1975, standard atmosphere', seen: 'second-hand' };
export const gravitySource: Source = {
  clause: 'normal gravity of GRS 80, Moritz, J. Geodesy 74 (2000) 128',
  seen: 'second-hand',
};

/** The air of the standard atmosphere at one altitude. */
export interface StandardAir {
  readonly temperature: Temperature;
  readonly pressure: AbsolutePressure;
  readonly density: Density;
  readonly speedOfSound: Velocity;
  readonly viscosity: DynamicViscosity;
}

interface Layer {
  readonly H: number; // geopotential altitude of its foot, m
  readonly T: number; // K
  readonly lapse: number; // K/m
}

/** Layers from -5 km to 47 km of geopotential altitude; pressure is that of the standard atmosphere at 0. ISO 2533:1975, Table 4. */
const layers: readonly Layer[] = [
  { H: -5000, T: 320.65, lapse: -0.0065 }, // Table 4
  { H: 11000, T: 216.65, lapse: 0 },
  { H: 20000, T: 216.65, lapse: 0.001 }, // Table 4
  { H: 32000, T: 228.65, lapse: 0.0028 }, // Table 4
];
const highest = 47000; // m
const R = 287.05287; // J/(kg.K), ISO 2533:1975, 2.1
const radius = 6356766; // m, ISO 2533:1975, 2.3

/**
 * Standard atmosphere at the geometric altitude z, m above mean sea level.
 * @param field where a problem is to be shown
 * Problem: altitude-out-of-range.
 */
export function standardAtmosphere(z: number, field: string): Outcome<StandardAir> {
  const H = (radius * z) / (radius + z); // geopotential altitude
  const lowest = layers[0]?.H ?? 0;
  if (!(z > -radius && H >= lowest && H <= highest))
    return fail('altitude-out-of-range', field, { altitude: z, lowest, highest });
  const { pressure: p, temperature: T } = climb(H);
  return ok({
    temperature: T as Temperature,
    pressure: p as AbsolutePressure,
    density: (p / (R * T)) as Density,
    speedOfSound: Math.sqrt(1.4 * R * T) as Velocity, // κ = 1.4
    viscosity: ((1.458e-6 * T ** 1.5) / (T + 110.4)) as DynamicViscosity, // Sutherland, ISO 2533:1975, 2.11
  });
}

/** Through the layers from sea level, up or down. ISO 2533:1975, 2.5. */
function climb(H: number): { readonly pressure: number; readonly temperature: number } {
  let pressure: number = seaLevel; // at H = 0
  let [from, temperature] = [0, 288.15]; // m, K at H = 0
  for (const [at, { lapse }] of layers.entries()) {
    const to = Math.min(H, layers[at + 1]?.H ?? highest);
    const next = temperature + lapse * (to - from);
    pressure *=
      lapse === 0 ? Math.exp((-g0 * (to - from)) / (R * temperature)) : (next / temperature) ** (-g0 / (R * lapse));
    [from, temperature] = [to, next];
    if (to === H) break;
  }
  return { pressure, temperature };
}

/** A reference ellipsoid and the field of gravity on it. */
export interface Ellipsoid {
  readonly equator: number; // normal gravity at the equator, m/s2
  readonly k: number; // constant of Somigliana's formula
  readonly e2: number; // first eccentricity squared
}

/** GRS 80. Moritz 2000. */
export const grs80: Ellipsoid = { equator: 9.7803267715, k: 0.001931851353, e2: 0.0066943800229 }; // Moritz 2000
/** WGS 84. NIMA TR8350.2, 3rd edition. */
export const wgs84: Ellipsoid = { equator: 9.7803253359, k: 0.00193185265241, e2: 0.00669437999013 }; // TR8350.2

/**
 * Normal gravity, m/s2, at a latitude, rad, and a height above the sea, m (to 10 km or so).
 * Moritz 2000 (Somigliana's closed form on the ellipsoid); Heiskanen and Moritz 1967, Eq. 2-123 (height).
 */
export function normalGravity(latitude: number, height = 0, { equator, k, e2 }: Ellipsoid = grs80): Acceleration {
  const s = Math.sin(latitude) ** 2;
  const onEllipsoid = (equator * (1 + k * s)) / Math.sqrt(1 - e2 * s);
  const [a, f, m] = [6378137, 0.00335281068, 0.00344978651]; // m, flattening, centrifugal ratio; Moritz 2000
  const free = 1 - (2 / a) * (1 + f + m - 2 * f * s) * height + (3 * height ** 2) / a ** 2; // Eq. 2-123
  return (onEllipsoid * free) as Acceleration;
}
