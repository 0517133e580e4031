/**
 * The units that are read and written, by measure, in the order of a menu: SI first, then inch and pound. No figure
 * is typed here but pure counts: each factor is made of the rows of factors.table.ts.
 */
import type { Measure } from './measure.ts';

export interface Row {
  readonly symbol: string;
  readonly print: string;
  readonly words: string;
  readonly factor: string;
  readonly offset?: string;
  readonly aliases?: readonly string[];
}

interface Scale extends Row {
  /** Spellings of the trade with the reference run into the symbol: absolute, gauge. */
  readonly joined?: readonly [string, string];
  /** False for a column whose temperature is in its name: it is used for differences only. */
  readonly referenced?: false;
}

const pressures: readonly Scale[] = [
  { symbol: 'Pa', print: 'Pa', words: 'pascal', factor: 'Pa' },
  { symbol: 'hPa', print: 'hPa', words: 'hectopascal', factor: 'hecto * Pa' },
  { symbol: 'kPa', print: 'kPa', words: 'kilopascal', factor: 'kilo * Pa', joined: ['kPaa', 'kPag'] },
  { symbol: 'MPa', print: 'MPa', words: 'megapascal', factor: 'mega * Pa' },
  { symbol: 'mbar', print: 'mbar', words: 'millibar', factor: 'milli * bar', joined: ['mbara', 'mbarg'] },
  { symbol: 'bar', print: 'bar', words: 'bar', factor: 'bar', joined: ['bara', 'barg'] },
  { symbol: 'kgf/cm2', print: 'kgf/cm²', words: 'kilogram-force per square centimetre', factor: 'kg * gn / centi / centi' },
  { symbol: 'atm', print: 'atm', words: 'standard atmosphere', factor: 'atm' },
  { symbol: 'mmH2O', print: 'mmH₂O', words: 'millimetre of water at 4 °C', factor: 'milli * water * gn', aliases: ['mmWC'] },
  { symbol: 'mmHg', print: 'mmHg', words: 'millimetre of mercury at 0 °C', factor: 'milli * mercury * gn' },
  {
    symbol: 'mmH2O@20degC',
    print: 'mmH₂O (20 °C)',
    words: 'millimetre of water at 20 °C',
    factor: 'milli * water@20degC * gn',
    referenced: false,
  },
  {
    symbol: 'psi',
    print: 'psi',
    words: 'pound-force per square inch',
    factor: 'lbf / in / in',
    aliases: ['lbf/in2'],
    joined: ['psia', 'psig'],
  },
  { symbol: 'inH2O', print: 'inH₂O', words: 'inch of water at 4 °C', factor: 'in * water * gn', aliases: ['inWC'] },
  { symbol: 'ftH2O', print: 'ftH₂O', words: 'foot of water at 4 °C', factor: 'ft * water * gn' },
  { symbol: 'inHg', print: 'inHg', words: 'inch of mercury at 0 °C', factor: 'in * mercury * gn' },
  {
    symbol: 'inH2O@60degF',
    print: 'inH₂O (60 °F)',
    words: 'inch of water at 60 °F',
    factor: 'in * water@60degF * gn',
    referenced: false,
  },
  {
    symbol: 'inH2O@68degF',
    print: 'inH₂O (68 °F)',
    words: 'inch of water at 68 °F',
    factor: 'in * water@20degC * gn', // 68 degF is 20 degC
    referenced: false,
  },
];

/** Pressures above vacuum (a) or above the atmosphere (g): the same scales, the reference in the symbol. */
const referenced = (mark: '(a)' | '(g)', words: string): readonly Row[] =>
  pressures
    .filter((scale) => scale.referenced !== false)
    .map(({ symbol, print, words: name, factor, aliases = [], joined }) => ({
      symbol: symbol + mark,
      print: print + mark,
      words: `${name}, ${words}`,
      factor,
      aliases: [...aliases.map((alias) => alias + mark), ...(joined ? [mark === '(a)' ? joined[0] : joined[1]] : [])],
    }));

const volumeFlows: readonly Row[] = [
  { symbol: 'm3/s', print: 'm³/s', words: 'cubic metre per second', factor: 'm * m * m / s' },
  { symbol: 'm3/min', print: 'm³/min', words: 'cubic metre per minute', factor: 'm * m * m / min' },
  { symbol: 'm3/h', print: 'm³/h', words: 'cubic metre per hour', factor: 'm * m * m / h', aliases: ['m3/hr'] },
  { symbol: 'm3/d', print: 'm³/d', words: 'cubic metre per day', factor: 'm * m * m / d' },
  { symbol: 'L/s', print: 'L/s', words: 'litre per second', factor: 'L / s', aliases: ['l/s'] },
  { symbol: 'L/min', print: 'L/min', words: 'litre per minute', factor: 'L / min', aliases: ['l/min'] },
  { symbol: 'L/h', print: 'L/h', words: 'litre per hour', factor: 'L / h', aliases: ['l/h'] },
  { symbol: 'ft3/s', print: 'ft³/s', words: 'cubic foot per second', factor: 'ft3 / s' },
  { symbol: 'ft3/min', print: 'ft³/min', words: 'cubic foot per minute', factor: 'ft3 / min', aliases: ['cfm', 'acfm'] },
  { symbol: 'ft3/h', print: 'ft³/h', words: 'cubic foot per hour', factor: 'ft3 / h', aliases: ['cfh', 'acfh'] },
  { symbol: 'ft3/d', print: 'ft³/d', words: 'cubic foot per day', factor: 'ft3 / d' },
  { symbol: 'gal/min', print: 'gal/min', words: 'US gallon per minute', factor: 'gal / min', aliases: ['gpm', 'GPM'] },
  { symbol: 'gal/h', print: 'gal/h', words: 'US gallon per hour', factor: 'gal / h', aliases: ['gph'] },
  { symbol: 'bbl/d', print: 'bbl/d', words: 'barrel of 42 US gallons per day', factor: 'bbl / d' },
];

const baseVolumeFlows: readonly Row[] = volumeFlows.map((row) => ({
  ...row,
  symbol: `base ${row.symbol}`,
  print: `base ${row.print}`,
  words: `${row.words} at the base state`,
  aliases: (row.aliases ?? []).map((alias) => `base ${alias}`),
}));

export const UNIT_ROWS: Readonly<Record<Measure, readonly Row[]>> = {
  length: [
    { symbol: 'mm', print: 'mm', words: 'millimetre', factor: 'milli * m' },
    { symbol: 'cm', print: 'cm', words: 'centimetre', factor: 'centi * m' },
    { symbol: 'm', print: 'm', words: 'metre', factor: 'm' },
    { symbol: 'um', print: 'µm', words: 'micrometre', factor: 'micro * m' },
    { symbol: 'in', print: 'in', words: 'inch', factor: 'in' },
    { symbol: 'ft', print: 'ft', words: 'foot', factor: 'ft' },
    { symbol: 'uin', print: 'µin', words: 'microinch', factor: 'micro * in' },
  ],
  area: [
    { symbol: 'm2', print: 'm²', words: 'square metre', factor: 'm * m' },
    { symbol: 'cm2', print: 'cm²', words: 'square centimetre', factor: 'centi * m * centi * m' },
    { symbol: 'ft2', print: 'ft²', words: 'square foot', factor: 'ft * ft' },
    { symbol: 'in2', print: 'in²', words: 'square inch', factor: 'in * in' },
  ],
  bores: [{ symbol: 'D', print: 'D', words: 'pipe bore', factor: 'one' }],
  'absolute pressure': referenced('(a)', 'absolute'),
  'gauge pressure': referenced('(g)', 'gauge'),
  'pressure difference': pressures,
  temperature: [
    { symbol: 'degC', print: '°C', words: 'degree Celsius', factor: 'K', offset: '273.15', aliases: ['C'] },
    { symbol: 'K', print: 'K', words: 'kelvin', factor: 'K' },
    { symbol: 'degF', print: '°F', words: 'degree Fahrenheit', factor: 'degR', offset: '459.67', aliases: ['F'] },
    { symbol: 'degR', print: '°R', words: 'degree Rankine', factor: 'degR' },
  ],
  'temperature difference': [
    { symbol: 'K', print: 'K', words: 'kelvin', factor: 'K' },
    { symbol: 'degC', print: '°C', words: 'degree Celsius', factor: 'K', aliases: ['C'] },
    { symbol: 'degF', print: '°F', words: 'degree Fahrenheit', factor: 'degR', aliases: ['F'] },
    { symbol: 'degR', print: '°R', words: 'degree Rankine', factor: 'degR' },
  ],
  'mass flow': [
    { symbol: 'kg/s', print: 'kg/s', words: 'kilogram per second', factor: 'kg / s' },
    { symbol: 'kg/min', print: 'kg/min', words: 'kilogram per minute', factor: 'kg / min' },
    { symbol: 'kg/h', print: 'kg/h', words: 'kilogram per hour', factor: 'kg / h', aliases: ['kg/hr'] },
    { symbol: 'g/s', print: 'g/s', words: 'gram per second', factor: 'g / s' },
    { symbol: 't/h', print: 't/h', words: 'tonne per hour', factor: 't / h', aliases: ['tph', 't/hr'] },
    { symbol: 't/d', print: 't/d', words: 'tonne per day', factor: 't / d' },
    { symbol: 'lb/s', print: 'lb/s', words: 'pound per second', factor: 'lb / s' },
    { symbol: 'lb/min', print: 'lb/min', words: 'pound per minute', factor: 'lb / min' },
    { symbol: 'lb/h', print: 'lb/h', words: 'pound per hour', factor: 'lb / h', aliases: ['lb/hr', 'pph'] },
    { symbol: 'klb/h', print: 'klb/h', words: 'thousand pounds per hour', factor: 'kilo * lb / h' },
  ],
  'volume flow': volumeFlows,
  'base volume flow': baseVolumeFlows,
  mass: [
    { symbol: 'kg', print: 'kg', words: 'kilogram', factor: 'kg' },
    { symbol: 't', print: 't', words: 'tonne', factor: 't' },
    { symbol: 'lb', print: 'lb', words: 'pound', factor: 'lb' },
  ],
  volume: [
    { symbol: 'm3', print: 'm³', words: 'cubic metre', factor: 'm * m * m' },
    { symbol: 'ft3', print: 'ft³', words: 'cubic foot', factor: 'ft3' },
    { symbol: 'gal', print: 'gal', words: 'US gallon', factor: 'gal' },
  ],
  density: [
    { symbol: 'kg/m3', print: 'kg/m³', words: 'kilogram per cubic metre', factor: 'kg / m / m / m' },
    { symbol: 'g/cm3', print: 'g/cm³', words: 'gram per cubic centimetre', factor: 'g / centi / centi / centi' },
    { symbol: 'kg/L', print: 'kg/L', words: 'kilogram per litre', factor: 'kg / L', aliases: ['kg/l'] },
    { symbol: 'lb/ft3', print: 'lb/ft³', words: 'pound per cubic foot', factor: 'lb / ft3' },
    { symbol: 'lb/gal', print: 'lb/gal', words: 'pound per US gallon', factor: 'lb / gal' },
  ],
  'dynamic viscosity': [
    { symbol: 'mPa.s', print: 'mPa·s', words: 'millipascal second', factor: 'milli * Pa * s', aliases: ['mPas'] },
    { symbol: 'uPa.s', print: 'µPa·s', words: 'micropascal second', factor: 'micro * Pa * s', aliases: ['uPas'] },
    { symbol: 'Pa.s', print: 'Pa·s', words: 'pascal second', factor: 'Pa * s', aliases: ['Pas'] },
    { symbol: 'cP', print: 'cP', words: 'centipoise', factor: 'centi * P' },
    { symbol: 'lb/(ft.s)', print: 'lb/(ft·s)', words: 'pound per foot second', factor: 'lb / ft / s' },
  ],
  'kinematic viscosity': [
    { symbol: 'mm2/s', print: 'mm²/s', words: 'square millimetre per second', factor: 'milli * m * milli * m / s' },
    { symbol: 'm2/s', print: 'm²/s', words: 'square metre per second', factor: 'm * m / s' },
    { symbol: 'cSt', print: 'cSt', words: 'centistokes', factor: 'centi * St' },
    { symbol: 'ft2/s', print: 'ft²/s', words: 'square foot per second', factor: 'ft * ft / s' },
  ],
  velocity: [
    { symbol: 'm/s', print: 'm/s', words: 'metre per second', factor: 'm / s' },
    { symbol: 'm/min', print: 'm/min', words: 'metre per minute', factor: 'm / min' },
    { symbol: 'ft/s', print: 'ft/s', words: 'foot per second', factor: 'ft / s' },
    { symbol: 'ft/min', print: 'ft/min', words: 'foot per minute', factor: 'ft / min' },
  ],
  acceleration: [
    { symbol: 'm/s2', print: 'm/s²', words: 'metre per second squared', factor: 'm / s / s' },
    { symbol: 'ft/s2', print: 'ft/s²', words: 'foot per second squared', factor: 'ft / s / s' },
  ],
  angle: [
    { symbol: 'deg', print: '°', words: 'degree', factor: 'deg' },
    { symbol: 'rad', print: 'rad', words: 'radian', factor: 'rad' },
  ],
  power: [
    { symbol: 'W', print: 'W', words: 'watt', factor: 'W' },
    { symbol: 'kW', print: 'kW', words: 'kilowatt', factor: 'kilo * W' },
    { symbol: 'MW', print: 'MW', words: 'megawatt', factor: 'mega * W' },
    { symbol: 'hp', print: 'hp', words: 'mechanical horsepower of 550 ft·lbf/s', factor: 'hp' },
  ],
  current: [
    { symbol: 'mA', print: 'mA', words: 'milliampere', factor: 'milli * A' },
    { symbol: 'A', print: 'A', words: 'ampere', factor: 'A' },
  ],
  voltage: [
    { symbol: 'V', print: 'V', words: 'volt', factor: 'V' },
    { symbol: 'mV', print: 'mV', words: 'millivolt', factor: 'milli * V' },
  ],
  share: [
    { symbol: '%', print: '%', words: 'per cent', factor: 'centi' },
    { symbol: 'ppm', print: 'ppm', words: 'part per million', factor: 'ppm' },
  ],
  'share of span': [{ symbol: '% of span', print: '% of span', words: 'per cent of the span', factor: 'centi' }],
  'share of reading': [
    { symbol: '% of reading', print: '% of reading', words: 'per cent of the reading', factor: 'centi' },
  ],
  'molar mass': [
    { symbol: 'g/mol', print: 'g/mol', words: 'gram per mole', factor: 'g / mol' },
    { symbol: 'kg/kmol', print: 'kg/kmol', words: 'kilogram per kilomole', factor: 'kg / kilo / mol' },
    { symbol: 'kg/mol', print: 'kg/mol', words: 'kilogram per mole', factor: 'kg / mol' },
    { symbol: 'lb/lbmol', print: 'lb/lbmol', words: 'pound per pound-mole', factor: 'g / mol' }, // the same ratio
  ],
};
