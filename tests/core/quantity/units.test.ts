import { describe, expect, test } from 'vitest';
import { fractionOf } from '../../../src/core/quantity/exact.ts';
import { FACTORS } from '../../../src/core/quantity/factors.table.ts';
import type { Measure, Unit } from '../../../src/core/quantity/measure.ts';
import { UNIT_ROWS } from '../../../src/core/quantity/units.table.ts';
import { convert, fromSI, measuresOf, toSI, unitOf, unitsFor } from '../../../src/core/quantity/units.ts';

const MEASURES = Object.keys(UNIT_ROWS) as Measure[];
const UNITS = MEASURES.flatMap((measure) => unitsFor(measure));

function unit(symbol: string, measure: Measure): Unit {
  const found = unitOf(symbol, [measure]);
  if (!found) throw new Error(`no unit ${symbol} of ${measure}`);
  return found;
}

/** A fraction of whole numbers of any size; the bases below are typed again, apart from the table under test. */
type Whole = readonly [numerator: bigint, denominator: bigint];
const whole = (numerator: bigint, denominator = 1n): Whole => [numerator, denominator];
const times = (...all: Whole[]): Whole => [all.reduce((p, f) => p * f[0], 1n), all.reduce((p, f) => p * f[1], 1n)];
const over = (top: Whole, ...bottom: Whole[]): Whole => times(top, ...bottom.map(([n, d]): Whole => [d, n]));

const one = whole(1n);
const milli = whole(1n, 1000n);
const micro = whole(1n, 1_000_000n);
const centi = whole(1n, 100n);
const kilo = whole(1000n);
const mega = whole(1_000_000n);
const minute = whole(60n);
const hour = whole(3600n);
const day = whole(86_400n);
const inch = whole(254n, 10_000n);
const foot = whole(3048n, 10_000n);
const pound = whole(45_359_237n, 100_000_000n);
const gravity = whole(980_665n, 100_000n);
const cubicFoot = times(foot, foot, foot);
const gallon = whole(3_785_411_784n, 1_000_000_000_000n); // m3
const barrel = whole(158_987_294_928n, 1_000_000_000_000n); // m3
const mercury = whole(135_951n, 10n);
const fahrenheit = whole(5n, 9n);
const water60 = whole(999_017n, 1000n);
const water20 = whole(9_982_067n, 10_000n);
const pi = whole(31_415_926_535_897_932_384_626_433n, 10n ** 25n);

const scales: Record<string, Whole> = {
  Pa: one,
  hPa: whole(100n),
  kPa: kilo,
  MPa: mega,
  mbar: whole(100n),
  bar: whole(100_000n),
  'kgf/cm2': whole(980_665n, 10n),
  atm: whole(101_325n),
  mmH2O: gravity,
  mmHg: times(milli, mercury, gravity),
  psi: over(times(pound, gravity), inch, inch),
  inH2O: times(inch, kilo, gravity),
  ftH2O: times(foot, kilo, gravity),
  inHg: times(inch, mercury, gravity),
};
const marked = (mark: string): Record<string, Whole> =>
  Object.fromEntries(Object.entries(scales).map(([symbol, factor]) => [symbol + mark, factor]));
const volumeFlows: Record<string, Whole> = {
  'm3/s': one,
  'm3/min': over(one, minute),
  'm3/h': over(one, hour),
  'm3/d': over(one, day),
  'L/s': milli,
  'L/min': over(milli, minute),
  'L/h': over(milli, hour),
  'ft3/s': cubicFoot,
  'ft3/min': over(cubicFoot, minute),
  'ft3/h': over(cubicFoot, hour),
  'ft3/d': over(cubicFoot, day),
  'gal/min': over(gallon, minute),
  'gal/h': over(gallon, hour),
  'bbl/d': over(barrel, day),
};
const temperatures = { K: one, degC: one, degF: fahrenheit, degR: fahrenheit };

const recomputed: Record<Measure, Record<string, Whole>> = {
  length: { m: one, cm: centi, mm: milli, um: micro, in: inch, ft: foot, uin: times(micro, inch) },
  area: { m2: one, cm2: times(centi, centi), ft2: times(foot, foot), in2: times(inch, inch) },
  bores: { D: one },
  'absolute pressure': marked('(a)'),
  'gauge pressure': marked('(g)'),
  'pressure difference': {
    ...scales,
    'mmH2O@20degC': times(milli, water20, gravity),
    'inH2O@60degF': times(inch, water60, gravity),
    'inH2O@68degF': times(inch, water20, gravity),
  },
  temperature: temperatures,
  'temperature difference': temperatures,
  'mass flow': {
    'kg/s': one,
    'kg/min': over(one, minute),
    'kg/h': over(one, hour),
    'g/s': milli,
    't/h': over(kilo, hour),
    't/d': over(kilo, day),
    'lb/s': pound,
    'lb/min': over(pound, minute),
    'lb/h': over(pound, hour),
    'klb/h': over(times(kilo, pound), hour),
  },
  'volume flow': volumeFlows,
  'base volume flow': Object.fromEntries(Object.entries(volumeFlows).map(([symbol, f]) => [`base ${symbol}`, f])),
  mass: { kg: one, t: kilo, lb: pound },
  volume: { m3: one, ft3: cubicFoot, gal: gallon },
  density: {
    'kg/m3': one,
    'g/cm3': kilo,
    'kg/L': kilo,
    'lb/ft3': over(pound, cubicFoot),
    'lb/gal': over(pound, gallon),
  },
  'dynamic viscosity': { 'Pa.s': one, 'mPa.s': milli, 'uPa.s': micro, cP: milli, 'lb/(ft.s)': over(pound, foot) },
  'kinematic viscosity': { 'm2/s': one, 'mm2/s': micro, cSt: micro, 'ft2/s': times(foot, foot) },
  velocity: { 'm/s': one, 'm/min': over(one, minute), 'ft/s': foot, 'ft/min': over(foot, minute) },
  acceleration: { 'm/s2': one, 'ft/s2': foot },
  angle: { deg: over(pi, whole(180n)), rad: one },
  power: { W: one, kW: kilo, MW: mega, hp: times(whole(550n), foot, pound, gravity) },
  current: { mA: milli, A: one },
  voltage: { V: one, mV: milli },
  share: { '%': centi, ppm: micro },
  'share of span': { '% of span': centi },
  'share of reading': { '% of reading': centi },
  'molar mass': { 'kg/mol': one, 'g/mol': milli, 'kg/kmol': milli, 'lb/lbmol': over(times(milli, pound), pound) },
};

/** The double nearest to a fraction: 40 digits of it and whether more follow, read by the engine. */
function nearest([numerator, denominator]: Whole): number {
  const scaled = (numerator * 10n ** 60n) / denominator;
  const more = (numerator * 10n ** 60n) % denominator === 0n ? '' : '1';
  return Number(`${scaled}${more}e-${60 + more.length}`);
}

describe('factors', () => {
  test.each(UNITS)('$symbol of $measure is what its definition gives', (row) => {
    const definition = recomputed[row.measure][row.symbol];
    if (!definition) throw new Error(`no definition of ${row.symbol} here`);
    const bare: Unit = { ...row, offset: '0' };
    expect(toSI('1', bare)).toBe(nearest(definition));
    expect(toSI('7.3', bare)).toBe(nearest(times(definition, whole(73n, 10n))));
  });

  test('every definition here is a unit', () => {
    const symbols = Object.fromEntries(MEASURES.map((m) => [m, unitsFor(m).map((row) => row.symbol)]));
    for (const measure of MEASURES) {
      expect(Object.keys(recomputed[measure]).sort()).toEqual([...(symbols[measure] ?? [])].sort());
    }
  });

  test('no figure is typed twice, except the pure count one', () => {
    const figures = [...FACTORS.values()].map((row) => row.value).filter((value) => /^[\d.]+$/.test(value));
    const counted = figures.filter((value) => value !== '1');
    // 1000 is a prefix and, kg/m3, the conventional density of water: two facts with one figure.
    expect(counted.filter((value, at) => counted.indexOf(value) !== at)).toEqual(['1000']);
    for (const row of UNITS) expect(row.factor).not.toMatch(/\d\.\d|\b\d{2,}\b(?!deg)/);
  });

  test('an unknown name in a factor is a defect', () => {
    expect(() => fractionOf('furlong / m')).toThrow('expected a factor of factors.table.ts, got furlong');
  });

  test.each([
    ['water@60degF', (60 - 32) / 1.8],
    ['water@20degC', 20],
  ])('%s is the density of Tanaka 2001, eq. 1, to seven digits', (name, t) => {
    const [a1, a2, a3, a4, a5] = [-3.983035, 301.797, 522528.9, 69.34881, 999.97495];
    const density = a5 * (1 - ((t + a1) ** 2 * (t + a2)) / (a3 * (t + a4)));
    expect(Math.abs(Number(FACTORS.get(name)?.value) - density)).toBeLessThan(5e-5);
  });

  test('only measured or rounded figures make a factor inexact', () => {
    const inexact = UNITS.filter((row) => !row.exact).map((row) => row.symbol);
    expect(inexact).toEqual(['mmH2O@20degC', 'inH2O@60degF', 'inH2O@68degF', 'deg']);
  });
});

describe('spellings', () => {
  test('a spelling is one unit in a measure, and never another scale in another measure', () => {
    for (const measure of MEASURES) {
      const symbols = unitsFor(measure).map((row) => row.symbol);
      expect(new Set(symbols).size).toBe(symbols.length);
    }
    for (const row of UNITS) {
      for (const text of [row.symbol, row.print, ...row.aliases]) {
        expect(unitOf(text, [row.measure])).toBe(row);
        for (const other of measuresOf(text)) expect(unit(text, other).factor).toBe(row.factor);
      }
    }
  });

  test('only temperatures share spellings with another measure', () => {
    const shared = UNITS.filter((row) => measuresOf(row.symbol).length > 1).map((row) => row.symbol);
    expect([...new Set(shared)].sort()).toEqual(['K', 'degC', 'degF', 'degR']);
  });

  test.each([
    ['m³/h', 'volume flow', 'm3/h'],
    ['m^3/h', 'volume flow', 'm3/h'],
    ['base  m³/h', 'base volume flow', 'base m3/h'],
    ['Base m3/h', 'base volume flow', undefined],
    ['°C', 'temperature', 'degC'],
    ['℃', 'temperature', 'degC'],
    ['\u00b5m', 'length', 'um'],
    ['\u03bcm', 'length', 'um'],
    ['mPa*s', 'dynamic viscosity', 'mPa.s'],
    ['mPa⋅s', 'dynamic viscosity', 'mPa.s'],
    ['bar (g)', 'gauge pressure', 'bar(g)'],
    ['psig', 'gauge pressure', 'psi(g)'],
    ['barg', 'absolute pressure', undefined],
    ['MM', 'length', undefined],
    ['constructor', 'length', undefined],
    ['__proto__', 'length', undefined],
    ['', 'length', undefined],
  ] as const)('%s of %s is %s', (text, measure, symbol) => {
    expect(unitOf(text, [measure])?.symbol).toBe(symbol);
  });

  test('the first measure that knows a spelling is taken', () => {
    expect(unitOf('K', ['temperature', 'temperature difference'])?.measure).toBe('temperature');
    expect(unitOf('K', ['temperature difference', 'temperature'])?.measure).toBe('temperature difference');
  });
});

describe('conversion', () => {
  test.each([
    ['102.26', 'mm', 'length', 0.10226],
    ['85', 'degC', 'temperature', 358.15],
    ['-459.67', 'degF', 'temperature', 0],
    ['68', 'degF', 'temperature', 293.15],
    ['-0', 'mm', 'length', 0],
    ['0.1', '%', 'share', 0.001],
    ['36', 't/h', 'mass flow', 10],
    ['9007199254740993', 'm', 'length', 9007199254740992], // half way between two doubles: to the even one
    ['9007199254740993.0000000000000000000000000000000000000001', 'm', 'length', 9007199254740994], // just above it
  ] as const)('%s %s is the nearest double', (number, symbol, measure, si) => {
    expect(Object.is(toSI(number, unit(symbol, measure)), si)).toBe(true);
    if (si < 1e15) expect(fromSI(si, unit(symbol, measure))).toBe(Number(number) || 0);
  });

  test.each([
    ['7', 'bar(g)', 'kPa(g)', 'gauge pressure', '700'],
    ['85', 'degC', 'degF', 'temperature', '185'],
    ['1', 'in', 'mm', 'length', '25.4'],
    ['102.26', 'mm', 'in', 'length', '4.02598425197'],
    ['4.02598425197', 'in', 'mm', 'length', '102.26'],
    ['0.00', 'mm', 'in', 'length', '0'],
    ['-40', 'degF', 'degC', 'temperature', '-40'],
    ['1e-5', 'm', 'um', 'length', '10'],
    ['123456789012345678', 'mm', 'mm', 'length', '123456789012345678'],
  ] as const)('%s %s in %s', (number, from, to, measure, converted) => {
    expect(convert(number, unit(from, measure), unit(to, measure))).toBe(converted);
  });

  test('between measures it is a defect', () => {
    expect(() => convert('1', unit('bar(g)', 'gauge pressure'), unit('bar(a)', 'absolute pressure'))).toThrow(
      'expected units of one measure, got bar(g) and bar(a)',
    );
  });
});
