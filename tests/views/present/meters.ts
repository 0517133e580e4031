/** Meters of every kind and in every direction of solving, for the tests of the views. */
import { emptyProject } from '../../../src/core/document/codec.ts';
import type { Display, ElementText, MeterText, Project } from '../../../src/core/document/project.ts';
import type { Solved } from '../../../src/core/result/record.ts';
import { run } from '../../../src/core/run.ts';
import { presentMeter } from '../../../src/views/present/meter.ts';
import type { PresentedSizing } from '../../../src/views/present/model.ts';

const pipe = { bore: '102.26 mm', material: 'carbon-steel', measuredAt: '20 degC', roughness: '5 um' };
const duty = { maximum: '60 t/h', normal: '40 t/h', minimum: '12 t/h' };
const uncertainty = { bore: '0.07 %', pipe: '0.4 %', differential: '0.1 % of span', density: '0.2 %' };
const water = { fluid: { kind: 'water' }, upstream: { pressure: '7 bar(g)', temperature: '85 degC' } };
const plate = { kind: 'orifice-plate', tappings: 'flange', bore: '62.5 mm', material: 'stainless-316' };

/** Feed water through a plate; the bore is asked. */
export const feedWater: MeterText = {
  tag: 'FE-1101',
  service: 'Feed water to boiler 1',
  ...water,
  pipe,
  element: { ...plate, plateThickness: '4 mm', edgeThickness: '1.5 mm' },
  duty,
  differential: '250 mbar',
  find: 'bore',
  uncertainty,
  installation: { fitting: 'single-bend', before: '45 D', after: '8 D' },
};

const steam: MeterText = {
  ...feedWater,
  tag: 'FE-2304',
  service: 'Steam to the evaporator header',
  upstream: { pressure: '39 bar(g)', temperature: '400 degC' },
  pipe: { bore: '193.7 mm', material: 'carbon-steel' },
  element: { kind: 'isa-1932-nozzle', bore: '125 mm', material: 'stainless-316' },
  duty: { maximum: '72 t/h', normal: '55 t/h', minimum: '22 t/h' },
  differential: '400 mbar',
  find: 'differential',
  installation: {},
};

const seaWater: MeterText = {
  tag: 'FE-4101',
  service: 'Sea water to the intake pumps',
  fluid: { kind: 'stated', density: '1025 kg/m3', viscosity: '1.08 mPa.s', vapourPressure: '2.0 kPa(a)' },
  upstream: { pressure: '3.1 bar(g)', temperature: '17.5 degC' },
  pipe: { bore: '400 mm' },
  element: { kind: 'venturi-tube', convergent: 'as-cast', bore: '240 mm' },
  duty: { normal: '800 m3/h', minimum: '400 m3/h' },
  differential: '250 mbar',
  find: 'flow',
  uncertainty,
};

const gas: MeterText = {
  ...seaWater,
  tag: 'FE-3102',
  service: 'Fuel gas',
  fluid: {
    kind: 'stated',
    density: '2.9 kg/m3',
    viscosity: '11 uPa.s',
    isentropicExponent: 1.3,
    molarMass: '17 kg/kmol',
  },
  element: { kind: 'venturi-nozzle', bore: '200 mm' },
  duty: { maximum: '9000 base m3/h', minimum: '1500 base m3/h' },
  find: 'differential',
};

const withElement = (element: ElementText, tag: string): MeterText => ({ ...feedWater, tag, element, find: 'bore' });

export const meters: readonly MeterText[] = [
  feedWater,
  steam,
  seaWater,
  gas,
  { ...feedWater, tag: 'differential', find: 'differential' },
  { ...feedWater, tag: 'flow', find: 'flow' },
  withElement({ ...plate, tappings: 'corner' }, 'corner'),
  withElement({ ...plate, tappings: 'D-D/2' }, 'D and D/2'),
  {
    ...withElement({ ...plate, measuredAt: '35 degC' }, 'small'),
    pipe: { bore: '60 mm' },
    duty: { maximum: '15 t/h' },
  },
  { ...withElement({ kind: 'long-radius-nozzle' }, 'long radius'), installation: {} },
  { ...withElement({ kind: 'venturi-tube', convergent: 'machined' }, 'machined'), installation: {} },
  { ...seaWater, tag: 'fabricated', element: { kind: 'venturi-tube', convergent: 'fabricated', bore: '240 mm' } },
  {
    ...seaWater,
    tag: 'slow',
    element: { kind: 'venturi-tube', convergent: 'as-cast', bore: '240 mm' },
    differential: '0.4 mbar',
  },
  {
    ...feedWater,
    tag: 'calibrated',
    element: {
      ...plate,
      calibration: [
        { reynolds: 2e5, coefficient: 0.607 },
        { reynolds: 5e5, coefficient: '0.605' },
      ],
    },
  },
  {
    ...feedWater,
    tag: 'saturated',
    fluid: { kind: 'water', phase: 'vapour' },
    upstream: { pressure: '7 bar(a)', temperature: '165 degC' },
    duty: { maximum: '2 t/h' },
  },
  { ...feedWater, tag: 'bar', element: { kind: 'averaging-pitot', coefficient: 0.65 }, find: 'flow' },
  {
    ...gas,
    tag: 'bar in gas',
    element: {
      kind: 'averaging-pitot',
      coefficient: '0.7213',
      area: 'clear',
      width: '25.4 mm',
      coefficientUncertainty: '1 %',
      expansion: 0.2,
      reynoldsMin: 20000,
      velocityMax: '40 m/s',
      straightBefore: '9 D',
      straightAfter: '3 D',
      loss: '8 %',
    },
    uncertainty,
    installation: { before: '10 D', after: '2 D' },
  },
];

export const projectOf = (display: Display, ...list: MeterText[]): Project => ({
  ...emptyProject(),
  display,
  meters: list,
});

/** A meter solved and presented; one that is refused fails the test with its problems. */
export function solved(meter: MeterText, display: Display = 'SI'): { result: Solved; presented: PresentedSizing } {
  const project = projectOf(display, meter);
  const [result] = run(project).results;
  if (result?.status !== 'solved') throw new Error(`expected ${meter.tag} solved, got ${JSON.stringify(result)}`);
  const presented = presentMeter(meter, project, result);
  if (!('answer' in presented)) throw new Error(`expected a presented sizing of ${meter.tag}, got a refusal`);
  return { result, presented };
}
