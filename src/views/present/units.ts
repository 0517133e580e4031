/**
 * The unit of every quantity that is shown: the one the user wrote in the same field, where it belongs to the system
 * of the display, else the usual one of that system.
 */
import type { Display, MeterText } from '../../core/document/project.ts';
import { type Quantity, readQuantity } from '../../core/quantity/text.ts';
import { type Measure, type Unit, unitOf } from '../../core/quantity/units.ts';
import type { Role } from '../words/print.ts';

/** The roles that have a unit; the others are plain numbers. */
export type UnitRole = Exclude<Role, 'reynolds' | 'ratio' | 'coefficient' | 'factor' | 'count' | 'number'>;
/** `flow` is the measure and unit in which the flows of this meter are shown. */
export type DisplayUnits = Readonly<Record<UnitRole, Unit>> & { readonly flow: Unit };

type Usual = readonly [measure: Measure, si: string, us: string];

const usual: Readonly<Record<UnitRole, Usual>> = {
  bore: ['length', 'mm', 'in'],
  length: ['length', 'mm', 'in'],
  roughness: ['length', 'um', 'uin'],
  pressure: ['absolute pressure', 'bar(a)', 'psi(a)'],
  differential: ['pressure difference', 'mbar', 'inH2O'],
  loss: ['pressure difference', 'mbar', 'inH2O'],
  massFlow: ['mass flow', 't/h', 'lb/h'],
  volumeFlow: ['volume flow', 'm3/h', 'gal/min'],
  baseVolumeFlow: ['base volume flow', 'base m3/h', 'base ft3/h'],
  mass: ['mass', 't', 'lb'],
  volume: ['volume', 'm3', 'ft3'],
  temperature: ['temperature', 'degC', 'degF'],
  temperatureDifference: ['temperature difference', 'K', 'degF'],
  density: ['density', 'kg/m3', 'lb/ft3'],
  viscosity: ['dynamic viscosity', 'mPa.s', 'cP'],
  velocity: ['velocity', 'm/s', 'ft/s'],
  head: ['length', 'm', 'ft'],
  angle: ['angle', 'deg', 'deg'],
  molarMass: ['molar mass', 'kg/kmol', 'lb/lbmol'],
  percent: ['share', '%', '%'],
  uncertainty: ['share', '%', '%'],
  depth: ['length', 'mm', 'in'],
  area: ['area', 'm2', 'ft2'],
  bores: ['bores', 'D', 'D'],
};

export const flowMeasures: readonly Measure[] = ['mass flow', 'volume flow', 'base volume flow'];
export const pressureMeasures: readonly Measure[] = ['absolute pressure', 'gauge pressure'];

const customary = /^(base )?(u?in|ft|psi|lb|gal|bbl|degF|degR|hp)/;
const neutral = /^(%|D$|deg$|rad$|cP$|cSt$)/;

/** Whether a unit is at home in the system of the display. */
export function belongs(unit: Unit, display: Display): boolean {
  return neutral.test(unit.symbol) || customary.test(unit.symbol) === (display === 'US');
}

/** What the user wrote, read; absent where there is nothing or it cannot be read. */
export function written(text: unknown, measures: readonly Measure[]): Quantity | undefined {
  if (typeof text !== 'string') return undefined;
  const read = readQuantity(text, measures, '');
  return read.ok ? read.value : undefined;
}

/** A unit of the table by its file spelling; one that is not there is a defect. */
export function unit(symbol: string, measure: Measure): Unit {
  const found = unitOf(symbol, [measure]);
  if (found === undefined) throw new Error(`expected a unit of ${measure}, got '${symbol}'`);
  return found;
}

/** The units of every quantity of one meter. */
export function displayUnits(meter: MeterText, display: Display): DisplayUnits {
  const own = (texts: readonly unknown[], measures: readonly Measure[]): Unit | undefined =>
    texts.map((text) => written(text, measures)?.unit).find((found) => found !== undefined && belongs(found, display));
  const standard = (role: UnitRole): Unit => {
    const [measure, si, us] = usual[role];
    return unit(display === 'US' ? us : si, measure);
  };
  const { maximum, normal, minimum } = meter.duty ?? {};
  const flows = [maximum, normal, minimum].flatMap((text) => written(text, flowMeasures)?.unit ?? []);
  const flow = flows.find((found) => belongs(found, display)) ?? standard(flowRole(flows[0]));
  const differential = own([meter.differential], ['pressure difference']) ?? standard('differential');
  const pressure = own([meter.upstream?.pressure], pressureMeasures);
  const roles = Object.keys(usual) as UnitRole[];
  const plain = Object.fromEntries(roles.map((role) => [role, standard(role)])) as Record<UnitRole, Unit>;
  return {
    ...plain,
    [flowRole(flow)]: flow,
    flow,
    differential,
    loss: differential,
    bore: own([meter.element?.bore, meter.pipe?.bore], ['length']) ?? plain.bore,
    pressure: pressure === undefined ? plain.pressure : unit(`${pressure.symbol.slice(0, -3)}(a)`, 'absolute pressure'),
    temperature: own([meter.upstream?.temperature], ['temperature']) ?? plain.temperature,
    density: own([meter.fluid?.density], ['density']) ?? plain.density,
    viscosity: own([meter.fluid?.viscosity], ['dynamic viscosity']) ?? plain.viscosity,
    roughness: own([meter.pipe?.roughness], ['length']) ?? plain.roughness,
    length: own([meter.element?.plateThickness], ['length']) ?? plain.length,
  };
}

/** The role of a flow in its unit; mass where none is written. */
export function flowRole(of: Unit | undefined): 'massFlow' | 'volumeFlow' | 'baseVolumeFlow' {
  if (of?.measure === 'volume flow') return 'volumeFlow';
  return of?.measure === 'base volume flow' ? 'baseVolumeFlow' : 'massFlow';
}
