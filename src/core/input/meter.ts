/**
 * One meter of the document -> parsed quantities, or every problem found. What is to be found is not read.
 * The element's own fields are declared by the element and handed in by run.ts.
 */
import { MEASURED_AT } from '../document/defaults.ts';
import type { DutyName, FluidText, MeterText, Unknown } from '../document/project.ts';
import { as } from '../quantity/brand.ts';
import type {
  BaseVolumeFlow,
  Length,
  MassFlow,
  PressureDifference,
  Temperature,
  VolumeFlow,
} from '../quantity/kinds.ts';
import { type Outcome, ok } from '../quantity/outcome.ts';
import type { Quantity } from '../quantity/text.ts';
import type { Field, NumberField } from './field.ts';
import { type Form, failed, openForm } from './form.ts';
import { type Installation, readInstallation } from './installation.ts';
import { readUncertainty, type StatedUncertainty } from './uncertainty.ts';

export type FlowInput =
  | { readonly basis: 'mass'; readonly value: MassFlow }
  | { readonly basis: 'volume'; readonly value: VolumeFlow }
  | { readonly basis: 'base'; readonly value: BaseVolumeFlow };

export interface CalibrationPoint {
  readonly reynolds: number;
  readonly coefficient: number;
}

export interface MetalInput {
  readonly bore: Length; // as measured
  readonly material?: string;
  readonly measuredAt: Temperature;
}

export interface MeterInput {
  readonly tag: string;
  readonly find: Unknown;
  readonly fluid: FluidText;
  readonly pipe: MetalInput & { readonly roughness?: Length };
  readonly element: Partial<MetalInput> & {
    readonly measuredAt: Temperature;
    readonly own: Readonly<Record<string, string | number>>;
    readonly plateThickness?: Length;
    readonly edgeThickness?: Length;
    readonly calibration: readonly CalibrationPoint[];
  };
  readonly duty: Readonly<Partial<Record<DutyName, FlowInput>>>;
  readonly differential?: PressureDifference;
  readonly uncertainty: StatedUncertainty;
  readonly installation: Installation;
}

const UNKNOWNS: readonly Unknown[] = ['bore', 'differential', 'flow'];

/** What an element asks of the form: its own fields, and whether it has a bore. */
export interface Asked {
  readonly fields: readonly Field[];
  readonly bore?: 'none';
}

/** Reads a meter whose shape is checked; `materials` are the keys thermal growth is known for. */
export function readMeter(meter: MeterText, asked: Asked, materials: readonly string[]): Outcome<MeterInput> {
  const form = openForm(meter);
  const find = form.choice('find', UNKNOWNS, true);
  const pipe = readMetal(form, 'pipe', materials, true);
  const element = readMetal(form, 'element', materials, find !== 'bore' && asked.bore !== 'none');
  const roughness = form.positive('pipe.roughness', ['length']);
  const plate = form.positive('element.plateThickness', ['length']);
  const edge = form.positive('element.edgeThickness', ['length']);
  const calibration = readCalibration(form, meter.element?.calibration?.length ?? 0);
  const own = readOwn(form, asked.fields, calibration.length > 0);
  const duty = readDuty(form, find);
  const differential =
    find === 'differential' ? undefined : form.positive('differential', ['pressure difference'], find !== undefined);
  const uncertainty = readUncertainty(form);
  const installation = readInstallation(form, pipe.bore);
  if (form.problems.length > 0 || !(find && pipe.bore)) return failed(form);
  return ok({
    tag: meter.tag ?? '',
    find,
    fluid: meter.fluid ?? {},
    pipe: { ...pipe, bore: pipe.bore, ...given('roughness', roughness?.si) },
    element: {
      ...element,
      own,
      calibration,
      ...given('plateThickness', plate?.si),
      ...given('edgeThickness', edge?.si),
    },
    duty,
    ...given('differential', differential?.si),
    uncertainty,
    installation,
  });
}

function readMetal(form: Form, group: 'pipe' | 'element', materials: readonly string[], boreRequired: boolean) {
  const bore = boreRequired ? form.positive(`${group}.bore`, ['length'], true) : undefined;
  const material = form.choice(`${group}.material`, materials);
  const measuredAt = form.positive(`${group}.measuredAt`, ['temperature']);
  return {
    ...given('bore', bore?.si),
    ...given('material', material),
    measuredAt: measuredAt?.si ?? as<'temperature'>(MEASURED_AT),
  };
}

function readOwn(form: Form, fields: readonly Field[], calibrated: boolean): Record<string, string | number> {
  const read = (field: Field): string | number | undefined => {
    const path = `element.${field.name}`;
    if (field.type === 'choice') return form.choice(path, field.choices, field.required);
    if (field.type === 'number') return numberWithin(form, path, field, calibrated);
    if (field.type === 'share') return shareOfWhole(form, path, field.required);
    return form.positive(path, [field.measure], field.required)?.si;
  };
  return Object.fromEntries(
    fields.flatMap((field) => {
      const value = read(field);
      return value === undefined ? [] : [[field.name, value]];
    }),
  );
}

function numberWithin(form: Form, path: string, field: NumberField, calibrated: boolean): number | undefined {
  const { required, least, most } = field;
  const value = form.number(path, required === 'uncalibrated' ? !calibrated : required);
  if (value === undefined || (value >= least && value <= most)) return value;
  return form.report('figure-implausible', path, { written: String(value), least, most });
}

function shareOfWhole(form: Form, path: string, required: boolean): number | undefined {
  const share = form.quantity(path, ['share'], required);
  if (share === undefined || (share.si >= 0 && share.si <= 1)) return share?.si;
  return form.report('share-out-of-range', path, { written: `${share.number} ${share.unit.symbol}` });
}

function readCalibration(form: Form, rows: number): CalibrationPoint[] {
  const points: CalibrationPoint[] = [];
  for (let row = 0; row < rows; row += 1) {
    const path = `element.calibration.${row}`;
    const reynolds = positiveNumber(form, `${path}.reynolds`);
    const coefficient = positiveNumber(form, `${path}.coefficient`);
    if (reynolds === undefined || coefficient === undefined) continue;
    const before = points.at(-1);
    if (before && reynolds <= before.reynolds)
      form.report('calibration-order', `${path}.reynolds`, { written: reynolds });
    points.push({ reynolds, coefficient });
  }
  return points;
}

function positiveNumber(form: Form, field: string): number | undefined {
  const value = form.number(field, true);
  if (value === undefined || value > 0) return value;
  return form.report('not-positive', field, { written: String(value) });
}

function readDuty(form: Form, find: Unknown | undefined): Partial<Record<DutyName, FlowInput>> {
  const names: readonly DutyName[] = find === 'flow' ? ['normal', 'minimum'] : ['maximum', 'normal', 'minimum'];
  const flows = names.flatMap((name) => {
    const flow = form.positive(`duty.${name}`, ['mass flow', 'volume flow', 'base volume flow'], name === 'maximum');
    return flow === undefined ? [] : [[name, flowOf(flow)] as const];
  });
  return Object.fromEntries(flows);
}

function flowOf(flow: Quantity<'mass flow' | 'volume flow' | 'base volume flow'>): FlowInput {
  if (flow.measure === 'volume flow') return { basis: 'volume', value: flow.si };
  if (flow.measure === 'base volume flow') return { basis: 'base', value: flow.si };
  return { basis: 'mass', value: flow.si };
}

/** A key that is absent when it has no value. */
function given<Key extends string, Value>(key: Key, value: Value | undefined): { readonly [K in Key]?: Value } {
  return (value === undefined ? {} : { [key]: value }) as { readonly [K in Key]?: Value };
}
