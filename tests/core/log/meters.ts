/** Meters of every kind of fluid that a log may be of, with the box that its rows span. */
import type { MeterText, Project } from '../../../src/core/document/project.ts';
import type { Box } from '../../../src/core/log/surface.ts';
import { type Standing, standing } from '../../../src/core/run/standing.ts';

const gas = {
  kind: 'gas',
  composition: {
    methane: '90.6724 %',
    nitrogen: '3.1284 %',
    'carbon-dioxide': '0.4676 %',
    ethane: '4.5279 %',
    propane: '0.828 %',
    isobutane: '0.1037 %',
    'n-butane': '0.1563 %',
    isopentane: '0.0321 %',
    'n-pentane': '0.0443 %',
    'n-hexane': '0.0293 %',
    'n-heptane': '0.01 %',
  },
};
const table = [
  { temperature: '0 degC', density: '905 kg/m3', viscosity: '95 cSt' },
  { temperature: '20 degC', density: '892 kg/m3', viscosity: '41 cSt' },
  { temperature: '40 degC', density: '878.5 kg/m3', viscosity: '21 cSt' },
  { temperature: '80 degC', density: '852 kg/m3', viscosity: '8.1 cSt' },
];

interface Logged {
  readonly fluid: Record<string, unknown>;
  readonly box: Box;
  /** Largest differential of the rows, Pa. */
  readonly most: number;
}

/** Fluids by name; boxes as plants have them, some across a seam of the formulation. */
export const logged: Readonly<Record<string, Logged>> = {
  'liquid water': {
    fluid: { kind: 'water' },
    box: { pressure: [4e5, 12e5], temperature: [290, 400] },
    most: 1e5,
  },
  'hot liquid water across 350 degC': {
    fluid: { kind: 'water' },
    box: { pressure: [22e6, 30e6], temperature: [560, 640] },
    most: 1e5,
  },
  steam: { fluid: { kind: 'water' }, box: { pressure: [30e5, 45e5], temperature: [620, 720] }, most: 8e4 },
  'eleven components': { fluid: gas, box: { pressure: [20e5, 70e5], temperature: [270, 330] }, most: 6e4 },
  'air of a duct': {
    fluid: { kind: 'air', relativeHumidity: '40 %' },
    box: { pressure: [98e3, 112e3], temperature: [280, 310] },
    most: 2e3,
  },
  'stated liquid': {
    fluid: { kind: 'stated', density: '1025 kg/m3', viscosity: '1.1 mPa.s' },
    box: { pressure: [2e5, 4e5], temperature: [278, 303] },
    most: 5e4,
  },
  'stated gas': {
    fluid: { kind: 'stated', density: '4.2 kg/m3', viscosity: '0.018 mPa.s', isentropicExponent: 1.31 },
    box: { pressure: [4e5, 8e5], temperature: [270, 460] },
    most: 1.2e5,
  },
  'liquid by table': {
    fluid: { kind: 'liquid', table },
    box: { pressure: [2e5, 6e5], temperature: [278, 350] },
    most: 5e4,
  },
  'glycol by table': {
    fluid: { kind: 'liquid', name: 'ethylene-glycol-water-inhibited', concentration: '35 %' },
    box: { pressure: [2e5, 6e5], temperature: [264, 350] },
    most: 5e4,
  },
  'crude oil': {
    fluid: {
      kind: 'liquid',
      name: 'crude-oil',
      densityAt15: '850 kg/m3',
      viscosities: [
        { temperature: '20 degC', viscosity: '12 cSt' },
        { temperature: '50 degC', viscosity: '5 cSt' },
      ],
    },
    box: { pressure: [3e5, 9e5], temperature: [285, 320] },
    most: 5e4,
  },
};

/** Every element with every variant of its own field, and one by its calibration. */
export const elementsOf: Readonly<Record<string, Record<string, unknown>>> = {
  'orifice flange': { kind: 'orifice-plate', tappings: 'flange', bore: '62.5 mm', material: 'stainless-316' },
  'orifice corner': { kind: 'orifice-plate', tappings: 'corner', bore: '70 mm', material: 'stainless-316' },
  'orifice D-D/2': { kind: 'orifice-plate', tappings: 'D-D/2', bore: '55 mm', material: 'stainless-304' },
  'ISA 1932 nozzle': { kind: 'isa-1932-nozzle', bore: '65 mm', material: 'stainless-316' },
  'long-radius nozzle': { kind: 'long-radius-nozzle', bore: '60 mm', material: 'stainless-316' },
  'Venturi nozzle': { kind: 'venturi-nozzle', bore: '60 mm' },
  'as-cast Venturi': { kind: 'venturi-tube', convergent: 'as-cast', bore: '60 mm', material: 'carbon-steel' },
  'machined Venturi': { kind: 'venturi-tube', convergent: 'machined', bore: '60 mm' },
  'fabricated Venturi': { kind: 'venturi-tube', convergent: 'fabricated', bore: '60 mm' },
  'averaging pitot': { kind: 'averaging-pitot', coefficient: 0.65, expansion: 0.2 },
  'averaging pitot, clear area': { kind: 'averaging-pitot', coefficient: 0.7, area: 'clear', width: '6 mm' },
  'calibrated averaging pitot': {
    kind: 'averaging-pitot',
    calibration: [
      { reynolds: 5e4, coefficient: 0.66 },
      { reynolds: 1e6, coefficient: 0.64 },
    ],
  },
  calibrated: {
    kind: 'orifice-plate',
    tappings: 'flange',
    bore: '62.5 mm',
    material: 'stainless-316',
    calibration: [
      { reynolds: 5e4, coefficient: 0.6061 },
      { reynolds: 2e5, coefficient: 0.6032 },
      { reynolds: 1e6, coefficient: 0.6019 },
    ],
  },
};

const middle = ([lower, upper]: readonly [number, number]): number => (lower + upper) / 2;

/** A meter of that fluid and element at the middle of the box. */
export function logMeter(
  fluid: string,
  element: string,
): { readonly stands: Standing; readonly box: Box; readonly most: number } {
  const { fluid: said, box, most } = logged[fluid] as Logged;
  const meter = {
    tag: 'FE-1101',
    fluid: said,
    upstream: { pressure: `${middle(box.pressure)} Pa(a)`, temperature: `${middle(box.temperature)} K` },
    pipe: { bore: '102.26 mm', material: 'carbon-steel' },
    element: elementsOf[element],
    duty: {},
    differential: `${most} Pa`,
    find: 'flow',
  } as unknown as MeterText;
  const project: Pick<Project, 'site' | 'base'> = {};
  const found = standing(meter, 0, project);
  if (!found.ok) throw new Error(`${fluid}, ${element}: ${JSON.stringify(found.problems)}`);
  return { stands: found.value, box, most };
}
