/** What the vectors of elements ask of the core: coefficients and expansibility, without solving. */
import type { Geometry, Primary } from '../../../src/core/element/contract.ts';
import { elementOf } from '../../../src/core/element/registry.ts';
import { approachFactor } from '../../../src/core/element/shared/approach.ts';
import type { Length } from '../../../src/core/quantity/kinds.ts';

type Given = Readonly<Record<string, number | string>>;

/** The primary of a code of kind and variant, for example `orifice-plate.flange`. */
export function primaryOf(code: string): Primary {
  const [kind = '', variant = ''] = code.split('.');
  const element = elementOf(kind);
  if (!element.ok) throw new Error(`expected an element of the registry, got ${code}`);
  const [field] = element.value.fields;
  return element.value.primary(field === undefined ? {} : { [field.name]: variant });
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
    return { share: primary.lossShare(geometryOf(given), number(given, 'C'), number(given, 'Re_D')) };
  },
  /** A loss of k inlet velocity heads before the throat: C = 1/sqrt(1 + k beta^4 E^2). */
  'coefficient-from-loss': (given) => {
    const b4 = number(given, 'areaRatio') ** -2;
    return { C: 1 / Math.sqrt(1 + number(given, 'lossHeads') * b4 * approachFactor(b4 ** 0.25) ** 2) };
  },
};
