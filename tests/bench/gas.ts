/**
 * State of an eleven-component gas: cold (composition and temperature new), warm (pressure new), against one evaluation
 * of the pressure, and the gathered terms against the equation summed term by term.
 */
import { gasState } from '../../src/core/fluid/gas/gas.ts';
import { functions, pairs } from '../../src/core/fluid/gerg/departure.table.ts';
import { mixtureOf, R } from '../../src/core/fluid/gerg/mixture.ts';
import { pureTerms } from '../../src/core/fluid/gerg/pure.table.ts';
import { reducing } from '../../src/core/fluid/gerg/reducing.table.ts';
import { components } from '../../src/core/fluid/helmholtz/components.table.ts';
import { componentNames } from '../../src/core/fluid/helmholtz/components.ts';
import { gasDensity } from '../../src/core/fluid/helmholtz/density.ts';
import { isothermOf, pressureAt } from '../../src/core/fluid/helmholtz/isotherm.ts';
import { propertiesAt } from '../../src/core/fluid/helmholtz/properties.ts';
import type { AbsolutePressure, Temperature } from '../../src/core/quantity/kinds.ts';
import { generator } from '../laws/random.ts';
import { compare, inTurn } from './pairs.ts';
import { type Line, ratioLine } from './report.ts';

const STATES = 20_000;
const eleven = {
  methane: 0.906724,
  nitrogen: 0.031284,
  'carbon-dioxide': 0.004676,
  ethane: 0.045279,
  propane: 0.00828,
  isobutane: 0.001037,
  'n-butane': 0.001563,
  isopentane: 0.000321,
  'n-pentane': 0.000443,
  'n-hexane': 0.000293,
  'n-heptane': 0.0001,
};
const x = componentNames.map((name) => (eleven as Record<string, number>)[name] ?? 0);

interface State {
  readonly p: AbsolutePressure;
  readonly T: Temperature;
}

/** Pressure by the equation as it is printed: every term of every component and pair, each with its own powers. */
function pressureTermByTerm(fractions: readonly number[], T: number, rho: number): { p: number; slope: number } {
  let [Tr, volume] = [0, 0];
  components.forEach(({ Tc, rhoc }, i) => {
    const xi = fractions[i] ?? 0;
    Tr += xi ** 2 * Tc;
    volume += xi ** 2 / (1e3 * rhoc);
  });
  for (const [i, j, betaV, gammaV, betaT, gammaT] of reducing) {
    const [xi, xj, a, b] = [fractions[i - 1] ?? 0, fractions[j - 1] ?? 0, components[i - 1], components[j - 1]];
    if (xi === 0 || xj === 0 || a === undefined || b === undefined) continue;
    const both = 2 * xi * xj * (xi + xj);
    const v = (Math.cbrt(1 / (1e3 * a.rhoc)) + Math.cbrt(1 / (1e3 * b.rhoc))) ** 3 / 8;
    volume += (both * betaV * gammaV * v) / (betaV ** 2 * xi + xj);
    Tr += (both * betaT * gammaT * Math.sqrt(a.Tc * b.Tc)) / (betaT ** 2 * xi + xj);
  }
  const [delta, tau] = [rho * volume, Tr / T];
  let [a1, a2] = [0, 0];
  const add = (factor: number, n: number, d: number, t: number, u: number, v: number, h: number): void => {
    const term = factor * n * delta ** d * tau ** t * Math.exp(h);
    a1 += term * (d + u);
    a2 += term * ((d + u) ** 2 - d + v);
  };
  pureTerms.forEach((terms, i) => {
    const xi = fractions[i] ?? 0;
    if (xi === 0) return;
    for (const [n, d, t, c] of terms) {
      const power = c === 0 ? 0 : delta ** c;
      add(xi, n, d, t, -c * power, -c * (c - 1) * power, -power);
    }
  });
  for (const [i, j, F, name] of pairs) {
    const factor = (fractions[i - 1] ?? 0) * (fractions[j - 1] ?? 0) * F;
    const found = functions[name];
    if (factor === 0 || found === undefined) continue;
    for (const [n, d, t] of found.powers) add(factor, n, d, t, 0, 0, 0);
    for (const [n, d, t, eta, epsilon, beta, gamma] of found.bells) {
      const away = delta - epsilon;
      const h = -eta * away ** 2 - beta * (delta - gamma);
      add(factor, n, d, t, -delta * (2 * eta * away + beta), -2 * eta * delta ** 2, h);
    }
  }
  return { p: rho * R * T * (1 + a1), slope: R * T * (1 + 2 * a1 + a2) };
}

function densityTermByTerm({ p, T }: State): number {
  let y = Math.log(p / (R * T));
  for (let step = 0; step < 50; step++) {
    const rho = Math.exp(y);
    const { p: at, slope } = pressureTermByTerm(x, T, rho);
    const change = (Math.log(p / at) * at) / (rho * slope);
    y += change;
    if (Math.abs(change) < 1e-9) break;
  }
  return Math.exp(y);
}

export function gas(): Line[] {
  const random = generator(2008);
  const states: State[] = Array.from({ length: STATES }, () => ({
    p: (1e5 * 100 ** random()) as AbsolutePressure,
    T: (260 + 100 * random()) as Temperature,
  }));
  const mixture = mixtureOf(x);
  const isotherm = isothermOf(mixture, 300);
  const density = (along: typeof isotherm, p: number): number => {
    const rho = gasDensity(along, p);
    if (rho === undefined) throw new Error(`expected a density at ${p} Pa, got none`);
    return rho;
  };
  for (const state of states.slice(0, 100)) {
    const [own, plain] = [density(isothermOf(mixture, state.T), state.p), densityTermByTerm(state)];
    if (!(Math.abs(own / plain - 1) < 1e-10)) throw new Error(`expected the same density, got ${own} and ${plain}`);
  }
  const pressure = inTurn(states, ({ p }) => pressureAt(isotherm, p / 2500).p);
  const cold = inTurn(states, ({ p, T }) => density(isothermOf(mixtureOf(x), T), p));
  const warm = inTurn(states, ({ p }) => density(isotherm, p));
  const naive = inTurn(states, densityTermByTerm);
  const all = inTurn(states, ({ p, T }) => {
    const along = isothermOf(mixtureOf(x), T);
    return propertiesAt(along, density(along, p)).isentropicExponent;
  });
  const paths = { pressure: 'p', temperature: 'T', own: (name: string) => name };
  const base = { pressure: 101325 as AbsolutePressure, temperature: 288.15 as Temperature };
  const whole = inTurn(states, ({ p, T }) => {
    const state = gasState(x, { pressure: p, temperature: T, base, paths });
    return state.ok ? state.value.density : 0;
  });
  return [
    ratioLine('11-component gas: cold density / one pressure', compare(cold, pressure)),
    ratioLine('the same, temperature and composition kept / one pressure', compare(warm, pressure)),
    ratioLine('the same, cold with heat capacities and sound / one pressure', compare(all, pressure)),
    ratioLine('whole state with viscosity, base state and phase test / one pressure', compare(whole, pressure)),
    ratioLine('the equation term by term / its terms gathered, cold density', compare(naive, cold), '>= 20'),
  ];
}
