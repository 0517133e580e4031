/** Meters as a user would write them, drawn by fast-check over every element, liquids and gases, in range and beyond. */
import fc from 'fast-check';
import { expect } from 'vitest';
import type { MeterText } from '../../src/core/document/project.ts';

const elements = fc.constantFrom(
  { kind: 'orifice-plate', tappings: 'corner' },
  { kind: 'orifice-plate', tappings: 'flange' },
  { kind: 'orifice-plate', tappings: 'D-D/2' },
  { kind: 'isa-1932-nozzle' },
  { kind: 'long-radius-nozzle' },
  { kind: 'venturi-nozzle' },
  { kind: 'venturi-tube', convergent: 'as-cast' },
  { kind: 'venturi-tube', convergent: 'machined' },
  { kind: 'venturi-tube', convergent: 'fabricated' },
);
const between = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

const parts = fc.record({
  element: elements,
  pipe: between(0.03, 1.2), // m; beyond the limits of every standard on both sides
  ratio: between(0.25, 0.78),
  material: fc.constantFrom(undefined, 'carbon-steel', 'stainless-316'),
  temperature: between(1, 250), // degC
  pressure: between(2, 100), // bar
  viscosity: between(0.01, 2), // mPa.s
});

const meterOf = (
  {
    element,
    pipe,
    ratio,
    material,
    temperature,
    pressure,
    viscosity,
  }: typeof parts extends fc.Arbitrary<infer P> ? P : never,
  fluid: MeterText['fluid'],
  share: number,
): MeterText => ({
  tag: 'FE-1',
  fluid: { kind: 'stated', viscosity: `${viscosity} mPa.s`, ...fluid },
  upstream: { pressure: `${pressure} bar(a)`, temperature: `${temperature} degC` },
  pipe: { bore: `${pipe} m`, ...(material === undefined ? {} : { material }) },
  element: { ...element, bore: `${pipe * ratio} m`, ...(material === undefined ? {} : { material }) },
  differential: `${share * pressure} bar`,
});

export const liquidMeter = fc
  .tuple(parts, between(600, 1400), between(1e-4, 0.2))
  .map(([part, density, share]) => meterOf(part, { density: `${density} kg/m3` }, share));

export const gasMeter = fc
  .tuple(parts, between(0.5, 80), between(1.1, 1.66), between(1e-4, 0.2))
  .map(([part, density, exponent, share]) =>
    meterOf(part, { density: `${density} kg/m3`, isentropicExponent: exponent }, share),
  );

/** Meters whose bore can be asked for. */
export const boredMeter = fc.oneof(liquidMeter, gasMeter);

const sheets = fc.record({
  kind: fc.constant('averaging-pitot'),
  coefficient: between(0.4, 1),
  area: fc.constantFrom('pipe', 'clear'),
  width: fc.constantFrom('3 mm', '12 mm'),
  expansion: between(0, 0.4),
  loss: fc.constantFrom('3 %', '20 %'),
  coefficientUncertainty: fc.constant('1 %'),
});

/** A bar across the pipe, which has no bore. */
export const barMeter = fc.tuple(boredMeter, sheets).map(([meter, element]): MeterText => ({ ...meter, element }));

export const anyMeter = fc.oneof({ weight: 3, arbitrary: boredMeter }, { weight: 1, arbitrary: barMeter });

/** Equal within a relative tolerance. */
export const near = (value: number, expected: number, tolerance: number): void => {
  expect(Math.abs(value / expected - 1), `${value} against ${expected}`).toBeLessThanOrEqual(tolerance);
};
