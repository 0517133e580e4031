/**
 * One velocity for the whole of a circular section, by an assumed profile.
 * Standard: none; laminar pipe flow u = 1 - r^2, and the power law u = y^(1/n) (Prandtl, n = 7). Symbols: R = 1 the radius,
 * y from the wall, u over the velocity on the axis.
 */
import type { Profile } from '../input/traverse-section.ts';
import type { Source } from '../quantity/source.ts';
import type { Layout } from './layout.ts';

const sources: Readonly<Record<Profile['kind'], Source>> = {
  laminar: { clause: 'laminar profile in a pipe', seen: 'derived' },
  power: { clause: 'power-law profile', seen: 'derived' },
  stated: { clause: 'mean over centre as stated by the user', seen: 'practice' },
};

/** Mean velocity over that on the axis; without a unit. */
export function meanOverCentre(profile: Profile): number {
  if (profile.kind === 'stated') return profile.meanOverCentre;
  if (profile.kind === 'laminar') return 0.5; // integral of (1 - r^2) 2 r dr
  const n = profile.exponent;
  return (2 * n ** 2) / ((n + 1) * (2 * n + 1)); // integral of (1 - r)^(1/n) 2 r dr
}

/** Distance from the wall, in diameters, at which the profile has its mean velocity. */
export function meanVelocityPosition(profile: Exclude<Profile, { kind: 'stated' }>): number {
  const share = meanOverCentre(profile);
  if (profile.kind === 'laminar') return (1 - Math.sqrt(1 - share)) / 2; // 1 - r^2 = share
  return share ** profile.exponent / 2; // y^(1/n) = share
}

/** The traverse of a single point: at the centre it counts by the ratio of the profile, at the mean velocity in full. */
export function singlePoint(profile: Profile): Layout {
  const centre = profile.kind === 'stated' || profile.at === 'centre';
  const point = centre
    ? { at: 0.5, weight: meanOverCentre(profile) }
    : { at: meanVelocityPosition(profile), weight: 1 };
  return { lines: [{ angle: 0, points: [point] }], source: sources[profile.kind] };
}
