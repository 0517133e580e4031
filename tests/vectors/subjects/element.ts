/** What the vectors of elements ask of the core: coefficients, expansibility, loss, and the flow of a gas. */
import type { Geometry, Primary } from '../../../src/core/element/contract.ts';
import { elementOf } from '../../../src/core/element/registry.ts';
import { approachFactor } from '../../../src/core/element/shared/approach.ts';
import type { FluidState } from '../../../src/core/fluid/contract.ts';
import type {
  AbsolutePressure,
  Density,
  DynamicViscosity,
  Length,
  PressureDifference,
  Temperature,
} from '../../../src/core/quantity/kinds.ts';
import { meterOf } from '../../../src/core/solve/equation.ts';
import { flowFrom } from '../../../src/core/solve/flow.ts';

type Given = Readonly<Record<string, number | string>>;

/** The primary of a code of kind and variant, for example `orifice-plate.flange`. */
export function primaryOf(code: string): Primary {
  const [kind = '', variant = ''] = code.split('.');
  const element = elementOf(kind);
  if (!element.ok) throw new Error(`expected an element of the registry, got ${code}`);
  const choice = element.value.fields.find((field) => field.type === 'choice');
  return element.value.primary(choice === undefined ? {} : { [choice.name]: variant });
}

/** The permanent loss as a share of the differential. */
export function lossShareOf(primary: Primary, at: Geometry, coefficient: number, reynolds: number): number {
  const share = primary.lossShare?.(at, coefficient, reynolds);
  if (share === undefined) throw new Error(`expected a loss of ${primary.name}, got none`);
  return share;
}

export function number(given: Given, name: string): number {
  const value = given[name];
  if (typeof value !== 'number') throw new Error(`expected a number for ${name}, got ${value}`);
  return value;
}

/** The geometry of D and either d or beta. */
export function geometryOf(given: Given): Geometry {
  const pipe = number(given, 'D');
  const ratio = 'beta' in given ? number(given, 'beta') : number(given, 'd') / pipe;
  return { pipe: pipe as Length, bore: (ratio * pipe) as Length, ratio };
}

/** A gas of stated properties; its temperature plays no part in the flow. */
function gas(given: Given): FluidState {
  const source = { clause: 'as the case states', seen: 'read' } as const;
  return {
    pressure: number(given, 'p1') as AbsolutePressure,
    temperature: 288.15 as Temperature,
    density: number(given, 'rho') as Density,
    viscosity: number(given, 'mu') as DynamicViscosity,
    isentropicExponent: number(given, 'kappa'),
    phase: 'gas',
    expands: true,
    sources: { density: source, viscosity: source },
    working: [],
  };
}

export const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = {
  coefficient: (given) => ({
    C: primaryOf(String(given.element)).discharge(geometryOf(given))(number(given, 'Re_D')),
  }),
  'flow-coefficient': (given) => {
    const at = geometryOf(given);
    const C = primaryOf(String(given.element)).discharge(at)(number(given, 'Re_D'));
    return { CE: C * approachFactor(at.ratio) };
  },
  expansibility: (given) => {
    const primary = primaryOf(String(given.element));
    const expansibility = primary.expansibility(number(given, 'beta'), number(given, 'kappa'));
    return { epsilon: expansibility(number(given, 'x')) };
  },
  'loss-share': (given) => {
    const primary = primaryOf(String(given.element));
    return { share: lossShareOf(primary, geometryOf(given), number(given, 'C'), number(given, 'Re_D')) };
  },
  'gas-flow-from-differential': (given) => {
    const meter = meterOf(primaryOf(String(given.element)), geometryOf(given), gas(given));
    const found = flowFrom(number(given, 'dp') as PressureDifference, meter);
    if (!found.ok) throw new Error(`expected a flow, got ${JSON.stringify(found.problems)}`);
    return { q_m: found.value.massFlow };
  },
  /** A loss of k inlet velocity heads before the throat: C = 1/sqrt(1 + k beta^4 E^2). */
  'coefficient-from-loss': (given) => {
    const b4 = number(given, 'areaRatio') ** -2;
    return { C: 1 / Math.sqrt(1 + number(given, 'lossHeads') * b4 * approachFactor(b4 ** 0.25) ** 2) };
  },
};
