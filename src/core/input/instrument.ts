/** What several instruments have in common, from text to quantities: legs, gauge liquid, scale, zero, uncertainties. */
import { MEASURED_AT } from '../document/defaults.ts';
import { as } from '../quantity/brand.ts';
import type { Density, Length, PressureDifference, Ratio, Temperature } from '../quantity/kinds.ts';
import type { Measure } from '../quantity/units.ts';
import { at, type Form } from './form.ts';

/** What fills a leg between a tapping and the instrument. */
export type Fill = 'process' | 'water' | Density;

export interface Legs {
  readonly upstream: Fill;
  readonly downstream: Fill;
  /** From the upstream tapping up to the downstream one; negative where it lies lower. */
  readonly rise: Length;
  /** From the upstream tapping down to the zero mark or the cell. */
  readonly drop: Length;
  /** Whether the temperature at the instrument is written. */
  readonly temperatureStated: boolean;
}

/** The lighter fluid of an inverted tube may be air at the pressure of the line. */
export type GaugeLiquid = 'mercury' | 'water' | 'air' | Density;

export interface Gauge {
  readonly liquid: GaugeLiquid;
  readonly temperature: Temperature;
}

export type Limb = 'upstream' | 'downstream';
export type ScaleMetal = 'brass' | 'steel';

/** How a length is read: from which zero, in which divisions, on which metal. */
export interface Scale {
  readonly zero: Length;
  readonly division?: Length;
  readonly metal?: { readonly name: ScaleMetal; readonly trueAt: Temperature };
}

export type StatedShare =
  | { readonly of: 'span' | 'reading'; readonly share: Ratio }
  | { readonly of: 'pressure'; readonly value: PressureDifference };

export const UNCERTAINTY_NAMES = ['accuracy', 'stability', 'ambient', 'staticPressure', 'output', 'legs'] as const;
export type UncertaintyName = (typeof UNCERTAINTY_NAMES)[number];

export interface InstrumentUncertainty {
  /** What the figures are: the half-width of an interval at 95 %, or of one that holds everything. */
  readonly as: 'expanded' | 'rectangular';
  readonly terms: readonly { readonly name: UncertaintyName; readonly value: StatedShare }[];
  readonly angle?: number; // rad
}

/** A quantity that may have either sign. */
const signed = <Name extends Measure>(form: Form, field: string, measure: Name) => form.quantity(field, [measure])?.si;

/**
 * Reads what fills the legs and how they run; usual is the process fluid in both, then nothing else matters.
 * Problem field-missing: legs filled unlike need their height.
 */
export function readLegs(form: Form): Legs {
  const upstream = readFill(form, 'instrument.above') ?? 'process';
  const downstream = readFill(form, 'instrument.aboveDownstream') ?? upstream;
  const rise = signed(form, 'instrument.rise', 'length') ?? as<'length'>(0);
  const drop = form.quantity('instrument.drop', ['length'], upstream !== downstream)?.si ?? as<'length'>(0);
  const temperatureStated = String(at(form.group, 'instrument.temperature') ?? '').trim() !== '';
  return { upstream, downstream, rise, drop, temperatureStated };
}

function readFill(form: Form, field: string): Fill | undefined {
  if (typeof at(form.group, field) === 'object') return form.positive(`${field}.density`, ['density'], true)?.si;
  return form.choice(field, ['process', 'water'] as const);
}

/** Reads the gauge liquid; only an inverted tube knows air, and takes it where nothing is written. */
export function readGauge(form: Form, inverted = false): Gauge | undefined {
  const field = 'instrument.liquid';
  const own = typeof at(form.group, field) === 'object' && at(form.group, field) !== null;
  const names = inverted ? (['air', 'water'] as const) : (['mercury', 'water'] as const);
  const stated = own
    ? form.positive(`${field}.density`, ['density'], true)?.si
    : form.choice<'air' | 'mercury' | 'water'>(field, names, !inverted);
  const liquid = stated ?? (inverted && !own ? 'air' : undefined);
  const temperature = form.positive('instrument.temperature', ['temperature'])?.si ?? as<'temperature'>(MEASURED_AT);
  return liquid === undefined ? undefined : { liquid, temperature };
}

export function readScale(form: Form): Scale {
  const zero = signed(form, 'instrument.zero', 'length') ?? as<'length'>(0);
  const division = form.positive('instrument.division', ['length'])?.si;
  const name = form.choice('instrument.scaleMetal', ['brass', 'steel'] as const);
  const trueAt = form.positive('instrument.scaleTrueAt', ['temperature'])?.si ?? as<'temperature'>(MEASURED_AT);
  return {
    zero,
    ...(division === undefined ? {} : { division }),
    ...(name === undefined ? {} : { metal: { name, trueAt } }),
  };
}

/** The limb that stands higher for a positive reading; `usual` where nothing is written. */
export const readHigh = (form: Form, usual: Limb): Limb =>
  form.choice<Limb>('instrument.high', ['upstream', 'downstream']) ?? usual;

/** The inclination of a tube, above 0 and up to 90 degrees, rad. */
export function readInclination(form: Form): number | undefined {
  const angle = form.positive('instrument.angle', ['angle'], true);
  if (angle === undefined || angle.si <= Math.PI / 2) return angle?.si;
  return form.report('angle-out-of-range', 'instrument.angle', { written: `${angle.number} ${angle.unit.symbol}` });
}

export interface Well {
  /** Section of the tube over that of the well. */
  readonly ratio: number;
  readonly tube: Length;
}

/** Reads the bores of tube and well, both or none. Problem well-not-wider. */
export function readWell(form: Form, required: boolean): Well | undefined {
  const written = ['tube', 'well'].some((name) => (at(form.group, `instrument.${name}`) ?? '') !== '');
  const tube = form.positive('instrument.tube', ['length'], required || written)?.si;
  const well = form.positive('instrument.well', ['length'], required || written)?.si;
  if (tube === undefined || well === undefined) return undefined;
  if (tube >= well) return form.report('well-not-wider', 'instrument.well', { tube, well });
  return { ratio: (tube / well) ** 2, tube };
}

/**
 * Reads the group `instrument.uncertainty`; a share of the span needs an instrument that has one.
 * Problems: negative, instrument-has-no-span.
 */
export function readInstrumentUncertainty(form: Form, spanned: boolean): InstrumentUncertainty {
  const group = 'instrument.uncertainty';
  const meant = form.choice(`${group}.as`, ['expanded', 'rectangular'] as const) ?? 'expanded';
  const terms = UNCERTAINTY_NAMES.flatMap((name) => {
    const value = readShare(form, `${group}.${name}`, spanned);
    return value === undefined ? [] : [{ name, value }];
  });
  const angle = form.positive(`${group}.angle`, ['angle'])?.si;
  return { as: meant, terms, ...(angle === undefined ? {} : { angle }) };
}

function readShare(form: Form, field: string, spanned: boolean): StatedShare | undefined {
  const read = form.quantity(field, ['pressure difference', 'share of span', 'share of reading']);
  if (read === undefined) return undefined;
  if (read.si < 0) return form.report('negative', field, { written: `${read.number} ${read.unit.symbol}` });
  if (read.measure === 'pressure difference') return { of: 'pressure', value: read.si };
  if (read.measure === 'share of span' && !spanned)
    return form.report('instrument-has-no-span', field, { written: `${read.number} %` });
  return { of: read.measure === 'share of span' ? 'span' : 'reading', share: read.si };
}
