/** What the vectors of gases by the cubic equation put to the test: T in K, p in MPa; each figure under all its names. */
import { otherGasState } from '../../../src/core/fluid/gas/other-gas.ts';
import { as } from '../../../src/core/quantity/brand.ts';

type Given = Record<string, number | string>;

function otherGas({ gas, T, p }: Given): Record<string, number> {
  const state = { pressure: as<'absolute pressure'>(Number(p) * 1e6), temperature: as<'temperature'>(Number(T)) };
  const paths = { pressure: 'p', temperature: 'T', own: (name: string) => name };
  const found = otherGasState(String(gas), { ...state, base: state, paths });
  if (!found.ok) throw new Error(`expected a state, got ${JSON.stringify(found.problems)}`);
  const { density: rho, isentropicExponent: kappa = 0, viscosity } = found.value;
  const figures = ['near', 'near of an alcohol', 'dense', 'dense of an alcohol'].flatMap((place) => [
    [`rho, ${place}`, rho] as const,
    [`kappa, ${place}`, kappa] as const,
  ]);
  return { ...Object.fromEntries(figures), mu: viscosity * 1e6 };
}

export const subjects: Readonly<Record<string, (given: Given) => Record<string, number>>> = { 'other-gas': otherGas };
