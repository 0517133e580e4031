/**
 * Which kinds may stand for which. Compiled by tsc alone, never run: each line under `@ts-expect-error` must not compile,
 * and the compiler reports the line when it does.
 */
import type { Form } from '../../src/core/input/form.ts';
import { as } from '../../src/core/quantity/brand.ts';
import type {
  AbsolutePressure,
  Acceleration,
  BaseVolumeFlow,
  Density,
  DynamicViscosity,
  GaugePressure,
  KinematicViscosity,
  Length,
  MassFlow,
  MolarMass,
  PressureDifference,
  Ratio,
  Temperature,
  TemperatureDifference,
  Velocity,
  VolumeFlow,
} from '../../src/core/quantity/kinds.ts';
import type { Quantity } from '../../src/core/quantity/text.ts';

declare const absolute: AbsolutePressure;
declare const gauge: GaugePressure;
declare const difference: PressureDifference;
declare const temperature: Temperature;
declare const temperatureDifference: TemperatureDifference;
declare const massFlow: MassFlow;
declare const volumeFlow: VolumeFlow;
declare const baseVolumeFlow: BaseVolumeFlow;
declare const density: Density;
declare const dynamicViscosity: DynamicViscosity;
declare const kinematicViscosity: KinematicViscosity;
declare const length: Length;
declare const velocity: Velocity;
declare const acceleration: Acceleration;
declare const molarMass: MolarMass;
declare const ratio: Ratio;
declare const pressure: Quantity<'gauge pressure' | 'absolute pressure'>;
declare const share: Quantity<'share of span'>;
declare const form: Form;

declare function takesAbsolute(value: AbsolutePressure): void;
declare function takesGauge(value: GaugePressure): void;
declare function takesDifference(value: PressureDifference): void;
declare function takesTemperature(value: Temperature): void;
declare function takesTemperatureDifference(value: TemperatureDifference): void;
declare function takesMassFlow(value: MassFlow): void;
declare function takesVolumeFlow(value: VolumeFlow): void;
declare function takesBaseVolumeFlow(value: BaseVolumeFlow): void;
declare function takesDensity(value: Density): void;
declare function takesDynamicViscosity(value: DynamicViscosity): void;
declare function takesKinematicViscosity(value: KinematicViscosity): void;
declare function takesLength(value: Length): void;
declare function takesVelocity(value: Velocity): void;
declare function takesAcceleration(value: Acceleration): void;
declare function takesMolarMass(value: MolarMass): void;
declare function takesRatio(value: Ratio): void;
declare function takesNumber(value: number): void;

// Each kind stands for itself and widens to a number; a result is branded once.
takesAbsolute(absolute);
takesGauge(gauge);
takesDifference(difference);
takesTemperature(temperature);
takesTemperatureDifference(temperatureDifference);
takesMassFlow(massFlow);
takesVolumeFlow(volumeFlow);
takesBaseVolumeFlow(baseVolumeFlow);
takesDensity(density);
takesDynamicViscosity(dynamicViscosity);
takesKinematicViscosity(kinematicViscosity);
takesLength(length);
takesVelocity(velocity);
takesAcceleration(acceleration);
takesMolarMass(molarMass);
takesRatio(ratio);
takesNumber(absolute - difference);
takesAbsolute((absolute - difference) as AbsolutePressure);
takesAbsolute(as<'absolute pressure'>(101325));

// Pressures: absolute, gauge, difference.
// @ts-expect-error gauge for absolute
takesAbsolute(gauge);
// @ts-expect-error difference for absolute
takesAbsolute(difference);
// @ts-expect-error absolute for gauge
takesGauge(absolute);
// @ts-expect-error difference for gauge
takesGauge(difference);
// @ts-expect-error absolute for difference
takesDifference(absolute);
// @ts-expect-error gauge for difference
takesDifference(gauge);

// A temperature and a difference of temperatures.
// @ts-expect-error difference for temperature
takesTemperature(temperatureDifference);
// @ts-expect-error temperature for difference
takesTemperatureDifference(temperature);

// Flows: by mass, by volume at the line, by volume at the base state.
// @ts-expect-error volume for mass
takesMassFlow(volumeFlow);
// @ts-expect-error base volume for mass
takesMassFlow(baseVolumeFlow);
// @ts-expect-error mass for volume
takesVolumeFlow(massFlow);
// @ts-expect-error base volume for actual volume
takesVolumeFlow(baseVolumeFlow);
// @ts-expect-error actual volume for base volume
takesBaseVolumeFlow(volumeFlow);
// @ts-expect-error mass for base volume
takesBaseVolumeFlow(massFlow);

// Properties of the fluid.
// @ts-expect-error kinematic for dynamic viscosity
takesDynamicViscosity(kinematicViscosity);
// @ts-expect-error dynamic for kinematic viscosity
takesKinematicViscosity(dynamicViscosity);
// @ts-expect-error viscosity for density
takesDensity(dynamicViscosity);
// @ts-expect-error molar mass for density
takesDensity(molarMass);
// @ts-expect-error density for molar mass
takesMolarMass(density);
// @ts-expect-error density for dynamic viscosity
takesDynamicViscosity(density);

// Length, motion, plain shares.
// @ts-expect-error a ratio for a length
takesLength(ratio);
// @ts-expect-error a length for a ratio
takesRatio(length);
// @ts-expect-error velocity for acceleration
takesAcceleration(velocity);
// @ts-expect-error acceleration for velocity
takesVelocity(acceleration);

// A number without a kind, and the result of arithmetic, are no kind yet.
// @ts-expect-error a bare number for an absolute pressure
takesAbsolute(101325);
// @ts-expect-error gauge plus atmosphere is a number until it is branded
takesAbsolute(gauge + absolute);
// @ts-expect-error temperatures subtracted are a number until branded
takesTemperatureDifference(temperature - temperature);

// A quantity read from text takes the kind of the measure that was asked for, or is absent.
const read = form.positive('field', ['gauge pressure']);
if (read !== undefined) takesGauge(read.si);
// @ts-expect-error it may be absent
takesGauge(read?.si);
// @ts-expect-error the kind follows the measure asked for
if (read !== undefined) takesAbsolute(read.si);
// @ts-expect-error a measure that does not exist
form.positive('field', ['pressure']);

// Of several measures the quantity says which it is.
if (pressure.measure === 'gauge pressure') takesGauge(pressure.si);
else takesAbsolute(pressure.si);
// @ts-expect-error it may be the other of the two
takesGauge(pressure.si);
takesRatio(share.si);
// @ts-expect-error a share is no length
takesLength(share.si);
