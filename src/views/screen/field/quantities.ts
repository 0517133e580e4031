/** What each quantity field measures, and the unit it starts with in either display. */
import type { Display } from '../../../core/document/project.ts';
import type { Measure } from '../../../core/quantity/units.ts';

export interface QuantityKind {
  /** In the order of preference: the first that knows a unit reads it. */
  readonly measures: readonly Measure[];
  readonly unit: Readonly<Record<Display, string>>;
}

const kind = (measures: readonly Measure[], si: string, us: string): QuantityKind => ({
  measures,
  unit: { SI: si, US: us },
});

const pressure = kind(['gauge pressure', 'absolute pressure'], 'bar(g)', 'psi(g)');
const absolute = kind(['absolute pressure'], 'kPa(a)', 'psi(a)');
const temperature = kind(['temperature'], 'degC', 'degF');
const diameter = kind(['length'], 'mm', 'in');
const flow = kind(['mass flow', 'volume flow', 'base volume flow'], 't/h', 'lb/h');
const density = kind(['density'], 'kg/m3', 'lb/ft3');
const straight = kind(['bores', 'length'], 'D', 'D');
const bores = kind(['bores'], 'D', 'D');
const viscosity = kind(['dynamic viscosity', 'kinematic viscosity'], 'mPa.s', 'cP');
const boiling = kind(['absolute pressure', 'gauge pressure'], 'bar(a)', 'psi(a)');
const share = kind(['share'], '%', '%');
const difference = kind(['pressure difference'], 'mbar', 'inH2O');

export const QUANTITIES: Readonly<Record<string, QuantityKind>> = {
  'upstream.pressure': pressure,
  'upstream.temperature': temperature,
  'fluid.density': density,
  'fluid.viscosity': viscosity,
  'fluid.molarMass': kind(['molar mass'], 'kg/kmol', 'lb/lbmol'),
  'fluid.vapourPressure': boiling,
  'fluid.baseDensity': density,
  'fluid.dewPoint': temperature,
  'fluid.wetBulb': temperature,
  'fluid.densityAt15': density,
  'fluid.densityAt60F': density,
  'fluid.bulkModulus': kind(['pressure difference'], 'MPa', 'psi'),
  'fluid.override.density': density,
  'fluid.override.viscosity': viscosity,
  'fluid.override.vapourPressure': boiling,
  'pipe.bore': diameter,
  'pipe.roughness': kind(['length'], 'um', 'uin'),
  'pipe.measuredAt': temperature,
  'element.bore': diameter,
  'element.measuredAt': temperature,
  'element.width': diameter,
  'element.coefficientUncertainty': share,
  'element.velocityMax': kind(['velocity'], 'm/s', 'ft/s'),
  'element.straightBefore': bores,
  'element.straightAfter': bores,
  'element.loss': share,
  'element.plateThickness': diameter,
  'element.edgeThickness': diameter,
  'duty.maximum': flow,
  'duty.normal': flow,
  'duty.minimum': flow,
  differential: difference,
  'installation.before': straight,
  'installation.after': straight,
  'installation.fluctuation': share,
  'section.diameter': diameter,
  'section.width': diameter,
  'section.height': diameter,
  port: diameter,
  'straight.before': straight,
  'straight.after': straight,
  'probe.head': diameter,
  'probe.stem': diameter,
  'probe.hole': diameter,
  'probe.alignment': kind(['angle'], 'deg', 'deg'),
  'state.pressure': kind(['gauge pressure', 'absolute pressure'], 'Pa(g)', 'inH2O(g)'),
  'state.temperature': temperature,
  'manometer.liquid.density': density,
  'manometer.temperature': temperature,
  'manometer.angle': kind(['angle'], 'deg', 'deg'),
  readings: kind(['pressure difference', 'length'], 'Pa', 'inH2O'),
  'probe.calibration': kind(['velocity'], 'm/s', 'ft/min'),
  'instrument.temperature': temperature,
  'instrument.liquid.density': density,
  'instrument.above.density': density,
  'instrument.aboveDownstream.density': density,
  'instrument.rise': kind(['length'], 'm', 'ft'),
  'instrument.drop': kind(['length'], 'm', 'ft'),
  'instrument.heightUpstream': kind(['length'], 'm', 'ft'),
  'instrument.heightThroat': kind(['length'], 'm', 'ft'),
  'instrument.zero': diameter,
  'instrument.division': diameter,
  'instrument.scaleTrueAt': temperature,
  'instrument.tube': diameter,
  'instrument.well': diameter,
  'instrument.angle': kind(['angle'], 'deg', 'deg'),
  'instrument.lower': difference,
  'instrument.upper': difference,
  'instrument.cutOff': kind(['share', 'pressure difference'], '%', '%'),
  'instrument.lowRange.lower': difference,
  'instrument.lowRange.upper': difference,
  'instrument.lowRange.zero': difference,
  'instrument.lowRange.up': share,
  'instrument.lowRange.down': share,
  'instrument.uncertainty.angle': kind(['angle'], 'deg', 'deg'),
  nullAngle: kind(['angle'], 'deg', 'deg'),
  'corrections.turbulence': share,
  'uncertainty.reading': kind(['share of reading', 'pressure difference'], '% of reading', '% of reading'),
  'uncertainty.coefficient': share,
  'uncertainty.area': share,
  'uncertainty.points': share,
  'uncertainty.bore': share,
  'uncertainty.pipe': share,
  'uncertainty.differential': kind(
    ['share of span', 'share of reading', 'pressure difference'],
    '% of span',
    '% of span',
  ),
  'uncertainty.density': share,
  'log.cutOff': kind(['pressure difference'], 'mbar', 'inH2O'),
  'log.fallback.pressure': pressure,
  'log.fallback.temperature': temperature,
  'site.atmosphere': absolute,
  'site.gravity': kind(['acceleration'], 'm/s2', 'm/s2'),
  'site.altitude': kind(['length'], 'm', 'ft'),
  'site.latitude': kind(['angle'], 'deg', 'deg'),
  'base.pressure': absolute,
  'base.temperature': temperature,
};

/** Kinds that several fields of an instrument share, or one takes in place of its own. */
export const SHARED_KINDS: Readonly<Record<string, QuantityKind>> = {
  'instrument.zero.cell': difference,
  'instrument.limits.current': kind(['current'], 'mA', 'mA'),
  'instrument.limits.voltage': kind(['voltage'], 'V', 'V'),
  'instrument.limits.share': share,
  'instrument.uncertainty.spanned': kind(
    ['share of span', 'share of reading', 'pressure difference'],
    '% of span',
    '% of span',
  ),
  'instrument.uncertainty.plain': kind(['share of reading', 'pressure difference'], '% of reading', '% of reading'),
};

/** The kind of a field. A path without a row here is a mistake of ours. */
export function quantityKind(path: string): QuantityKind {
  const found = QUANTITIES[path] ?? SHARED_KINDS[path];
  if (found === undefined) throw new Error(`expected a quantity field, got ${path}`);
  return found;
}
