/** Every primary of the registry, each variant once, and a geometry from D and beta. */
import type { Geometry, Primary } from '../../../src/core/element/contract.ts';
import { elements } from '../../../src/core/element/registry.ts';
import type { Length } from '../../../src/core/quantity/kinds.ts';

/** A maker's sheet, for an element whose figures come from one. */
const sheets: Readonly<Record<string, Readonly<Record<string, number>>>> = {
  'averaging-pitot': { coefficient: 0.7, coefficientUncertainty: 0.01, width: 0.006, expansion: 0.2, loss: 0.1 },
};

export const primaries: readonly Primary[] = elements.flatMap((element) => {
  const sheet = sheets[element.kind] ?? {};
  const choice = element.fields.find((field) => field.type === 'choice');
  if (choice?.type !== 'choice') return [element.primary(sheet)];
  return choice.choices.map((variant) => element.primary({ ...sheet, [choice.name]: variant }));
});

/** Those with a bore, which are ruled by a standard. */
export const bored: readonly Primary[] = primaries.filter(({ insertion }) => insertion === undefined);

export function primary(name: string): Primary {
  const found = primaries.find((one) => one.name === name);
  if (found === undefined) throw new Error(`expected a primary of the registry, got ${name}`);
  return found;
}

export function geometry(pipe: number, ratio: number): Geometry {
  return { pipe: pipe as Length, bore: (pipe * ratio) as Length, ratio };
}

/** The permanent loss of an element that has one, as a share of the differential. */
export function lossShareOf(one: Primary, at: Geometry, coefficient: number, reynolds: number): number {
  const share = one.lossShare?.(at, coefficient, reynolds);
  if (share === undefined) throw new Error(`expected a loss of ${one.name}, got none`);
  return share;
}
