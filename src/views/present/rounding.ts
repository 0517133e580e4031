/** The one rounding rule: how many digits each quantity is printed with, the same on screen, paper and in sentences. */
import type { Role } from '../words/print.ts';

export interface Rounding {
  /** Significant digits, or else decimals in the unit that is shown. */
  readonly significant?: number;
  readonly decimals?: number;
  /** Leaves out the zeros that only say how many digits were kept: for figures that are set, not measured. */
  readonly trim?: boolean;
  /** Largest figure without a power of ten; a million unless given. */
  readonly plainTo?: number;
  /** Smallest figure without a power of ten; a thousandth unless given. */
  readonly plainFrom?: number;
}

const rounding: Readonly<Record<Role, Rounding>> = {
  bore: { significant: 5 },
  length: { significant: 3 },
  roughness: { significant: 2 },
  pressure: { significant: 4 },
  differential: { significant: 4 },
  loss: { significant: 3 },
  massFlow: { significant: 4 },
  volumeFlow: { significant: 4 },
  baseVolumeFlow: { significant: 4 },
  mass: { significant: 6, plainTo: 1e9 },
  volume: { significant: 6, plainTo: 1e9 },
  temperature: { decimals: 1 },
  temperatureDifference: { decimals: 1 },
  density: { significant: 4 },
  viscosity: { significant: 4 },
  velocity: { significant: 3 },
  head: { significant: 3 },
  angle: { significant: 3 },
  molarMass: { significant: 5 },
  reynolds: { significant: 3, plainTo: 99_999 },
  ratio: { decimals: 4 },
  coefficient: { decimals: 4 },
  factor: { decimals: 4 },
  percent: { significant: 3 },
  uncertainty: { significant: 2 },
  depth: { significant: 4 },
  area: { significant: 4 },
  count: { decimals: 0 },
  bores: { significant: 3, trim: true },
  number: { significant: 4 },
};

/** A workshop reads a diameter to the hundredth of a millimetre, whatever its size. */
const boreDecimals: Readonly<Record<string, number>> = { mm: 2, cm: 3, m: 5, in: 4, ft: 5 };

/** A mark on a tube is set by a rule with divisions. */
const depthDecimals: Readonly<Record<string, number>> = { mm: 1, cm: 2, m: 4, in: 2, ft: 3 };

/** The rule for one role in the unit shown. */
export function roundingOf(role: Role, unit: string): Rounding {
  const decimals = role === 'bore' ? boreDecimals[unit] : role === 'depth' ? depthDecimals[unit] : undefined;
  return decimals === undefined ? rounding[role] : { decimals };
}

/** A limit is set, not measured: 0.75, not 0.7500. */
export const ofLimit = (rounding: Rounding): Rounding => ({ ...rounding, trim: true, plainFrom: 1e-5 });

/** Figures inside a working line: enough for a reader to repeat it and meet the result. */
export const workingRounding: Rounding = { significant: 6, trim: true };
/** A ratio of pressures stands near 1, and the formula takes the rest of it: that needs more digits. */
export const nearOne: Rounding = { significant: 12, trim: true };
