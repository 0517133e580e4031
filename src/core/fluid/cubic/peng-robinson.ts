/**
 * The cubic equation of Peng and Robinson for a mixture without interaction parameters (k_ij = 0): roots and fugacities.
 * Standard: none; Peng and Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59. Symbols: those of the paper; SI, molar.
 */

/** What the equation knows of one component. */
export interface CubicComponent {
  readonly Tc: number; // K
  readonly pc: number; // Pa
  readonly omega: number; // acentric factor
}

/** Components at one temperature and pressure, reduced: √A_i and B_i. */
export interface CubicState {
  readonly rootA: readonly number[]; // sqrt(a α p)/(R T)
  readonly B: readonly number[]; // b p/(R T)
}

/** A phase: compressibility factor and ln φ of each component. */
export interface CubicPhase {
  readonly Z: number;
  readonly lnPhi: readonly number[];
}

const root2 = Math.SQRT2;

/** The reduced constants of each component at T, K, and p, Pa. Peng and Robinson 1976, Eq. 9, 10, 12, 17, 18. */
export function cubicState(components: readonly CubicComponent[], T: number, p: number): CubicState {
  const rootA = components.map(({ Tc, pc, omega }) => {
    const kappa = 0.37464 + 1.54226 * omega - 0.26992 * omega * omega; // Eq. 18
    const rootAlpha = 1 + kappa * (1 - Math.sqrt(T / Tc)); // Eq. 17; its square is α
    return (Math.sqrt((0.45724 * p) / pc) * Tc * Math.abs(rootAlpha)) / T; // Eq. 9
  });
  const B = components.map(({ Tc, pc }) => (0.0778 * (p / pc) * Tc) / T); // Eq. 10
  return { rootA, B };
}

/** The phase of lowest Gibbs energy that the equation has at mole fractions `x`. Peng and Robinson 1976, Eq. 5, 19 to 21. */
export function cubicPhase({ rootA, B }: CubicState, x: readonly number[]): CubicPhase {
  const root = sumOf(x, rootA);
  const A = root * root; // Eq. 21 with k_ij = 0: √(a_i a_j) factors
  const b = sumOf(x, B);
  const roots = realRoots(b - 1, A - 3 * b * b - 2 * b, -(A * b - b * b - b * b * b)).filter((Z) => Z > b); // Eq. 5
  const energies = roots.map((Z) => residual(Z, A, b));
  const at = energies.indexOf(Math.min(...energies));
  const Z = roots[at];
  if (Z === undefined) throw new Error(`expected a root above ${b}, got ${roots.length} roots at A = ${A}`);
  const slope = logarithm(Z, b) / (2 * root2 * b);
  const lnPhi = x.map((_, i) => {
    const own = (B[i] ?? 0) / b;
    return own * (Z - 1) - Math.log(Z - b) - A * slope * ((2 * (rootA[i] ?? 0)) / root - own); // Eq. 19
  });
  return { Z, lnPhi };
}

const logarithm = (Z: number, b: number): number => Math.log((Z + (1 + root2) * b) / (Z + (1 - root2) * b));

/** Residual Gibbs energy over R T, to compare two roots. */
const residual = (Z: number, A: number, b: number): number =>
  Z - 1 - Math.log(Z - b) - (A / (2 * root2 * b)) * logarithm(Z, b);

const sumOf = (x: readonly number[], values: readonly number[]): number =>
  x.reduce((sum, xi, i) => sum + xi * (values[i] ?? 0), 0);

/** Real roots of Z³ + a Z² + b Z + c = 0, by Cardano and Viète, each refined by one step of Newton. */
function realRoots(a: number, b: number, c: number): number[] {
  const q = (a * a - 3 * b) / 9;
  const r = (2 * a * a * a - 9 * a * b + 27 * c) / 54;
  const third = a / 3;
  if (r * r >= q * q * q) {
    const s = -Math.sign(r || 1) * Math.cbrt(Math.abs(r) + Math.sqrt(r * r - q * q * q));
    return [refined(s + (s === 0 ? 0 : q / s) - third, a, b, c)];
  }
  const angle = Math.acos(r / Math.sqrt(q * q * q));
  return [0, 1, 2].map((k) => {
    const turn = (angle + 2 * Math.PI * k) / 3;
    return refined(-2 * Math.sqrt(q) * Math.cos(turn) - third, a, b, c);
  });
}

function refined(Z: number, a: number, b: number, c: number): number {
  const slope = 3 * Z * Z + 2 * a * Z + b;
  const step = (((Z + a) * Z + b) * Z + c) / slope;
  return slope !== 0 && Math.abs(step) < 1e-3 * Math.abs(Z) ? Z - step : Z;
}
