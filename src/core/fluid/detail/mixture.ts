/**
 * The DETAIL equation of AGA 8 as a mixture: its terms are powers of D = K³ ρ and of 1/T with exponentials exp(-D^k), the
 * same form as those of GERG-2008, so that one isotherm serves both.
 * Standard: AGA Report No. 8, Part 1:2017 (DETAIL); ISO 12213-2:2006. Symbols: those of the report; SI.
 */
import { molarGasConstant } from '../../quantity/constants.ts';
import type { Mixture } from '../helmholtz/mixture.ts';
import { gathered, plain, slotSet, type Term } from '../helmholtz/slots.ts';
import * as binary from './binary.table.ts';
import { components } from './components.table.ts';
import { type DetailTerm, terms } from './terms.table.ts';

const R = molarGasConstant.codata1986; // J/(mol.K), that of the equation: AGA Report No. 8, Part 1

const size = components.length;
const lastVirial = 18; // terms 1 to 18 make the second virial coefficient
const firstDense = 13; // terms 13 to 58 depend on the density beyond it

/** A square table of a pair's interaction, 1 where nothing is listed. */
function pairTable(rows: readonly binary.BinaryRow[]): Float64Array {
  const table = new Float64Array(size * size).fill(1);
  for (const [i, j, value] of rows) {
    table[(i - 1) * size + j - 1] = value;
    table[(j - 1) * size + i - 1] = value;
  }
  return table;
}
const Eij = pairTable(binary.energy);
const Uij = pairTable(binary.conformal);
const Kij = pairTable(binary.size);
const Gij = pairTable(binary.orientation);

/** (v + 1 - e)^e of the report, for an exponent e of 0 or 1. */
const gate = (value: number, exponent: number): number => (exponent === 0 ? 1 : value);

/** E_ij^u B*_nij (K_i K_j)^1.5 of a term and a pair. AGA Report No. 8, Part 1, the second virial coefficient. */
function virialOf([, , , , u, g, q, f, s, w]: DetailTerm, i: number, j: number): number {
  const [, , Ei, Ki, Gi, Qi, Fi, Si, Wi] = components[i] as (typeof components)[number];
  const [, , Ej, Kj, Gj, Qj, Fj, Sj, Wj] = components[j] as (typeof components)[number];
  const at = i * size + j;
  const star =
    gate(((Gij[at] as number) * (Gi + Gj)) / 2, g) *
    gate(Qi * Qj, q) *
    gate(Math.sqrt(Fi * Fj), f) *
    gate(Si * Sj, s) *
    gate(Wi * Wj, w);
  return star === 0 ? 0 : star * ((Eij[at] as number) * Math.sqrt(Ei * Ej)) ** u * (Ki * Kj) ** 1.5;
}

/** a_n times virialOf for every term and every pair i <= j, both orders counted. */
const virials = terms
  .slice(0, lastVirial)
  .map((term) =>
    components.map((_, i) =>
      Float64Array.from(components, (__, j) => (j < i ? 0 : (i === j ? 1 : 2) * term[0] * virialOf(term, i, j))),
    ),
  );
const denseTerms = terms.slice(firstDense - 1);
const virialTerm = ([, , , , u]: DetailTerm): Term => ({ d: 1, t: u, shape: plain });
const denseTerm = ([, b, c, k, u]: DetailTerm): Term => ({
  d: b,
  t: u,
  shape: c === 0 ? plain : { ...plain, order: k },
});
const slots = slotSet([...terms.slice(0, lastVirial).map(virialTerm), ...denseTerms.map(denseTerm)]);
const virialSlots = terms.slice(0, lastVirial).map((term) => slots.numberOf(virialTerm(term)));
const denseSlots = denseTerms.map((term) => slots.numberOf(denseTerm(term)));

/** Size, orientation, quadrupole, high-temperature and energy parameter of a mixture. */
interface Conformal {
  readonly K3: number; // dm3/mol
  readonly G: number;
  readonly Q: number;
  readonly F: number;
  readonly U: number; // K
}

/** K⁵ = (Σ x K^2.5)² + 2 ΣΣ x x (K_ij⁵ - 1)(K_i K_j)^2.5, U⁵ alike with E; G, Q and F. AGA Report No. 8, Part 1. */
function conformalOf(x: readonly number[]): Conformal {
  let [k, u, k5, u5, G, Q, F] = [0, 0, 0, 0, 0, 0, 0];
  for (let i = 0; i < size; i++) {
    const xi = x[i] as number;
    if (xi === 0) continue;
    const [, , Ei, Ki, Gi, Qi, Fi] = components[i] as (typeof components)[number];
    k += xi * Ki ** 2.5;
    u += xi * Ei ** 2.5;
    G += xi * Gi;
    Q += xi * Qi;
    F += xi * xi * Fi;
    for (let j = i + 1; j < size; j++) {
      const xj = x[j] as number;
      if (xj === 0) continue;
      const [, , Ej, Kj, Gj] = components[j] as (typeof components)[number];
      const at = i * size + j;
      k5 += 2 * xi * xj * ((Kij[at] as number) ** 5 - 1) * (Ki * Kj) ** 2.5;
      u5 += 2 * xi * xj * ((Uij[at] as number) ** 5 - 1) * (Ei * Ej) ** 2.5;
      G += xi * xj * ((Gij[at] as number) - 1) * (Gi + Gj);
    }
  }
  return { K3: (k * k + k5) ** 0.6, G, Q, F, U: (u * u + u5) ** 0.2 };
}

/** The mixture of a composition by the DETAIL equation; `x` in the order of componentNames, sum 1. */
export function detailMixtureOf(x: readonly number[]): Mixture {
  const { K3, G, Q, F, U } = conformalOf(x);
  const sums = new Float64Array(slots.count);
  const add = (slot: number | undefined, factor: number): void => {
    if (slot !== undefined) sums[slot] = (sums[slot] ?? 0) + factor;
  };
  virials.forEach((rows, n) => {
    let B = 0; // dm3/mol without its power of T
    rows.forEach((row, i) => {
      const xi = x[i] as number;
      if (xi !== 0) B += xi * row.reduce((sum, value, j) => sum + value * (x[j] as number), 0);
    });
    add(virialSlots[n], B / K3); // ρ B = D B/K³
  });
  denseTerms.forEach(([a, , , , u, g, q, f], n) => {
    const C = a * G ** g * Q ** (2 * q) * F ** f * U ** u;
    add(denseSlots[n], C);
    if (n + firstDense <= lastVirial) add(virialSlots[n + firstDense - 1], -C); // terms 13 to 18 once more, linear in D
  });
  const molarMass = components.reduce((sum, [, M], i) => sum + (x[i] as number) * M, 0) / 1e3;
  return { x, molarMass, R, Tr: 1, rhoR: 1e3 / K3, ...gathered(slots, sums) };
}
