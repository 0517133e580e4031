/**
 * A tube beside a well, upright or inclined: the reading along the tube, the fall of the level in the well, and what a
 * scale says that is made for it. Symbols: R the reading, θ the inclination, a/A the sections of tube and well.
 */
import type { Scale, Well } from '../input/instrument.ts';
import type { Temperature } from '../quantity/kinds.ts';
import type { Source } from '../quantity/source.ts';
import { named, type Working } from '../quantity/working.ts';
import type { Levels } from './column.ts';
import { scaleWorking, trueLength } from './scale.ts';

const VOLUME: Source = { clause: 'volume that leaves the well, section taken across the tube', seen: 'derived' };

export interface Tube {
  readonly sine: number;
  readonly angle?: number; // rad, of an inclined tube
  /** a/A; nothing where the well is so wide that its level stays. */
  readonly wellRatio: number;
  /** Bore of the tube, m, where it is stated. */
  readonly bore?: number;
  /** True where the divisions are shortened, so that the scale reads the vertical separation. */
  readonly corrected: boolean;
}

/** What the two bores are to a tube; a well that is not described is so wide that its level stays. */
export const wellOf = (well: Well | undefined): Pick<Tube, 'wellRatio' | 'bore'> =>
  well === undefined ? { wellRatio: 0 } : { wellRatio: well.ratio, bore: well.tube };

/** Metres of separation for one metre along the tube. */
const separation = ({ sine, wellRatio }: Tube): number => sine + wellRatio; // sin(theta) + a/A

/** The levels of a reading: the well falls by what the tube takes up. */
export function tubeLevels(read: number, tube: Tube, scale: Scale, temperature: Temperature, towards: 1 | -1): Levels {
  const length = towards * trueLength(read, scale, temperature);
  const whole = separation(tube);
  const along = tube.corrected ? length / whole : length;
  const h = along * whole;
  const shown = scaleWorking(read, scale, temperature);
  return {
    upstream: -along * tube.wellRatio, // R a/A
    downstream: along * tube.sine, // R sin(theta)
    working: tube.corrected ? shown : [...shown, separationLine(along, tube, h)],
    perReading: tube.corrected ? 1 : whole,
    menisci: 1,
    ...(tube.angle === undefined ? {} : { angle: tube.angle }),
    ...(tube.bore === undefined ? {} : { bore: tube.bore }),
  };
}

function separationLine(along: number, { sine, angle, wellRatio }: Tube, h: number): Working {
  const formula = angle === undefined ? 'R * (1 + r_A)' : 'R * (s_θ + r_A)';
  const given = [
    named('R', along, 'm', 'reading-along-tube'),
    named('r_A', wellRatio, '', 'tube-over-well'),
    ...(angle === undefined ? [] : [named('s_θ', sine, '', 'sine-of-inclination')]),
  ];
  return { id: 'separation', symbol: 'h', formula, given, value: h, unit: 'm', source: VOLUME };
}
