/** Every primary of the registry, each variant once, and a geometry from D and beta. */
import type { Geometry, Primary } from '../../../src/core/element/contract.ts';
import { elements } from '../../../src/core/element/registry.ts';
import type { Length } from '../../../src/core/quantity/kinds.ts';

export const primaries: readonly Primary[] = elements.flatMap((element) => {
  const choice = element.fields.find((field) => field.type === 'choice');
  if (choice?.type !== 'choice') return [element.primary({})];
  return choice.choices.map((variant) => element.primary({ [choice.name]: variant }));
});

export function primary(name: string): Primary {
  const found = primaries.find((one) => one.name === name);
  if (found === undefined) throw new Error(`expected a primary of the registry, got ${name}`);
  return found;
}

export function geometry(pipe: number, ratio: number): Geometry {
  return { pipe: pipe as Length, bore: (pipe * ratio) as Length, ratio };
}
