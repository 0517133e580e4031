/** The probe of a traverse, the manometer it is read on, and what the user states of corrections and uncertainties. */
import { as } from '../quantity/brand.ts';
import type { Density, Length, PressureDifference, Ratio, Temperature, Velocity } from '../quantity/kinds.ts';
import { at, type Form } from './form.ts';
import { readWithin } from './traverse-section.ts';

const PROBES = ['pitot-static', 's-type'] as const;
export type ProbeKind = (typeof PROBES)[number];

export interface ProbePoint {
  readonly velocity: Velocity;
  readonly coefficient: number;
}

export interface Probe {
  readonly kind: ProbeKind;
  readonly coefficient?: number;
  /** In rising order of velocity; it replaces the coefficient. */
  readonly calibration: readonly ProbePoint[];
  readonly head?: Length; // diameter of the head
  readonly stem?: Length; // diameter of the stem
  readonly hole?: Length; // diameter of the total-pressure hole
  readonly alignment?: number; // rad, from the axis of the duct
}

export type ManometerLiquid = 'mercury' | 'water' | Density;

export interface Manometer {
  readonly liquid: ManometerLiquid;
  readonly temperature: Temperature;
  readonly sine: number; // of the tube's angle from the horizontal; 1 where it is upright
}

export interface TraverseCorrections {
  readonly blockage: boolean;
  readonly turbulence?: Ratio; // intensity
  readonly wall?: number; // factor of the mean velocity
}

export interface TraverseUncertainty {
  /** Expanded, 95 %. */
  readonly reading?:
    | { readonly of: 'reading'; readonly share: Ratio }
    | { readonly of: 'pressure'; readonly value: PressureDifference };
  readonly coefficient?: Ratio;
  readonly density?: Ratio;
  readonly area?: Ratio;
  readonly points?: Ratio;
}

const MANOMETER_AT = as<'temperature'>(293.15); // K, 20 degC
/** No probe has a coefficient outside these (practice): S-types stand near 0.84, standard tubes near 1. */
const COEFFICIENT = { least: 0.3, most: 2 };

/** Reads the group `probe`. Problem probe-calibration-order: velocity over coefficient must rise from row to row. */
export function readProbe(form: Form, rows: number): Probe | undefined {
  const kind = form.choice('probe.kind', PROBES, true);
  const coefficient = readWithin(form, 'probe.coefficient', COEFFICIENT.least, COEFFICIENT.most);
  const calibration = readCalibration(form, rows);
  const size = (name: 'head' | 'stem' | 'hole') => {
    const read = form.positive(`probe.${name}`, ['length']);
    return read === undefined ? {} : { [name]: read.si };
  };
  const sizes = { ...size('head'), ...size('stem'), ...size('hole') };
  const alignment = readAngle(form, 'probe.alignment');
  if (kind === undefined) return undefined;
  return {
    kind,
    calibration,
    ...sizes,
    ...(coefficient === undefined ? {} : { coefficient }),
    ...(alignment === undefined ? {} : { alignment }),
  };
}

function readCalibration(form: Form, rows: number): ProbePoint[] {
  const points: ProbePoint[] = [];
  for (let row = 0; row < rows; row += 1) {
    const path = `probe.calibration.${row}`;
    const velocity = form.positive(`${path}.velocity`, ['velocity'], true)?.si;
    const coefficient = readWithin(form, `${path}.coefficient`, COEFFICIENT.least, COEFFICIENT.most, true);
    if (velocity === undefined || coefficient === undefined) continue;
    const before = points.at(-1);
    const rises = before === undefined || velocity / coefficient > before.velocity / before.coefficient;
    if (!rises || (before !== undefined && velocity <= before.velocity))
      form.report('probe-calibration-order', `${path}.velocity`, { velocity });
    points.push({ velocity, coefficient });
  }
  return points;
}

/** An angle from 0 to 90 degrees, rad. */
export function readAngle(form: Form, field: string): number | undefined {
  const angle = form.quantity(field, ['angle']);
  if (angle === undefined || (angle.si >= 0 && angle.si <= Math.PI / 2)) return angle?.si;
  return form.report('angle-out-of-range', field, { written: `${angle.number} ${angle.unit.symbol}` });
}

/** Reads the group `manometer`; undefined where none is described. */
export function readManometer(form: Form): Manometer | undefined {
  const written = at(form.group, 'manometer');
  if (written === undefined) return undefined;
  const own = typeof at(form.group, 'manometer.liquid') === 'object';
  const density = own ? form.positive('manometer.liquid.density', ['density'], true)?.si : undefined;
  const liquid = own ? density : form.choice('manometer.liquid', ['mercury', 'water'], true);
  const temperature = form.positive('manometer.temperature', ['temperature'])?.si ?? MANOMETER_AT;
  const angle = readAngle(form, 'manometer.angle') ?? Math.PI / 2;
  const sine = angle === Math.PI / 2 ? 1 : Math.sin(angle);
  if (sine === 0) form.report('angle-out-of-range', 'manometer.angle', { written: '0 deg' });
  return liquid === undefined ? undefined : { liquid, temperature, sine };
}

/** Reads the group `corrections`; each is off unless it is written. */
export function readCorrections(form: Form): TraverseCorrections {
  const blockage = form.choice('corrections.blockage', ['off', 'stem']) === 'stem';
  if (blockage && at(form.group, 'probe.stem') === undefined) form.report('field-missing', 'probe.stem');
  const turbulence = readShare(form, 'corrections.turbulence');
  const wall = readWithin(form, 'corrections.wall', 0.9, 1);
  return {
    blockage,
    ...(turbulence === undefined ? {} : { turbulence }),
    ...(wall === undefined ? {} : { wall }),
  };
}

/** Reads the group `uncertainty`; the reading's as a share of the reading or as a pressure. */
export function readTraverseUncertainty(form: Form): TraverseUncertainty {
  const field = 'uncertainty.reading';
  const reading = form.quantity(field, ['pressure difference', 'share of reading']);
  if (reading !== undefined && reading.si < 0) form.report('negative', field, { written: reading.number });
  const share = (name: 'coefficient' | 'density' | 'area' | 'points') => {
    const value = readShare(form, `uncertainty.${name}`);
    return value === undefined ? {} : { [name]: value };
  };
  return {
    ...(reading === undefined
      ? {}
      : {
          reading:
            reading.measure === 'share of reading'
              ? ({ of: 'reading', share: reading.si } as const)
              : ({ of: 'pressure', value: reading.si } as const),
        }),
    ...share('coefficient'),
    ...share('density'),
    ...share('area'),
    ...share('points'),
  };
}

function readShare(form: Form, field: string): Ratio | undefined {
  const value = form.quantity(field, ['share']);
  if (value === undefined || value.si >= 0) return value?.si;
  return form.report('negative', field, { written: `${value.number} ${value.unit.symbol}` });
}
