/**
 * Kinds of quantity: branded SI numbers. Two quantities of one dimension that must not be confused
 * (absolute, gauge and differential pressure; temperature and its difference; actual and base volume
 * flow) are different types. Arithmetic widens to `number`; a formula brands its result once, on return.
 */

declare const kind: unique symbol;

/** A plain number in SI units that remembers what it measures. */
export type Kind<Name extends string> = number & { readonly [kind]: Name };

export type Length = Kind<'length'>; // m
export type AbsolutePressure = Kind<'absolute pressure'>; // Pa above vacuum
export type GaugePressure = Kind<'gauge pressure'>; // Pa above the site's atmosphere
export type PressureDifference = Kind<'pressure difference'>; // Pa
export type Temperature = Kind<'temperature'>; // K
export type TemperatureDifference = Kind<'temperature difference'>; // K
export type MassFlow = Kind<'mass flow'>; // kg/s
export type VolumeFlow = Kind<'volume flow'>; // m3/s at the upstream state
export type BaseVolumeFlow = Kind<'base volume flow'>; // m3/s at the base state of the project
export type Density = Kind<'density'>; // kg/m3
export type DynamicViscosity = Kind<'dynamic viscosity'>; // Pa.s
export type KinematicViscosity = Kind<'kinematic viscosity'>; // m2/s
export type Velocity = Kind<'velocity'>; // m/s
export type Acceleration = Kind<'acceleration'>; // m/s2
export type MolarMass = Kind<'molar mass'>; // kg/mol
export type Ratio = Kind<'ratio'>; // 1 (a share of 0.004 is written 0.4 %)
