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

/** Components at one temperature and pressure, reduced. */
export interface CubicState {
  readonly rootA: Float64Array; // √(a p)/(R T)
  readonly B: Float64Array; // b p/(R T)
}

/** Which root of the equation: the largest is the gas, the smallest the liquid, the stable one has the lower Gibbs energy. */
export type Root = 'gas' | 'liquid' | 'stable';

/** A phase: compressibility factor and ln φ of each component. */
export interface CubicPhase {
  readonly Z: number;
  readonly lnPhi: Float64Array;
}

const root2 = Math.SQRT2;

/** The reduced constants of each component at T, K, and p, Pa. Peng and Robinson 1976, Eq. 9, 10, 12, 17, 18. */
export function cubicState(components: readonly CubicComponent[], T: number, p: number): CubicState {
  const rootA = Float64Array.from(components, ({ Tc, pc, omega }) => {
    const kappa = 0.37464 + 1.54226 * omega - 0.26992 * omega * omega; // Eq. 18
    const rootAlpha = 1 + kappa * (1 - Math.sqrt(T / Tc)); // Eq. 17; its square is α
    return (Math.sqrt((0.45724 * p) / pc) * Tc * Math.abs(rootAlpha)) / T; // Eq. 9
  });
  const B = Float64Array.from(components, ({ Tc, pc }) => (0.0778 * (p / pc) * Tc) / T); // Eq. 10
  return { rootA, B };
}

/** A phase of mole fractions `x`. Peng and Robinson 1976, Eq. 5 and 19 to 21. */
export function cubicPhase({ rootA, B }: CubicState, x: ArrayLike<number>, root: Root = 'stable'): CubicPhase {
  let [sumA, b] = [0, 0];
  for (let i = 0; i < x.length; i++) {
    sumA += (x[i] as number) * (rootA[i] as number);
    b += (x[i] as number) * (B[i] as number);
  }
  const A = sumA * sumA; // Eq. 21 with k_ij = 0: √(a_i a_j) factors
  const Z = rootOf(A, b, root);
  const slope = (A * logarithm(Z, b)) / (2 * root2 * b);
  const repulsion = Math.log(Z - b);
  const lnPhi = new Float64Array(x.length);
  for (let i = 0; i < x.length; i++) {
    const own = (B[i] as number) / b;
    lnPhi[i] = own * (Z - 1) - repulsion - slope * ((2 * (rootA[i] as number)) / sumA - own); // Eq. 19
  }
  return { Z, lnPhi };
}

/** The root asked for of Z³ - (1-B) Z² + (A-3B²-2B) Z - (AB-B²-B³) = 0 above B; there is always one. Eq. 5. */
function rootOf(A: number, b: number, root: Root): number {
  const roots = realRoots(b - 1, A - 3 * b * b - 2 * b, -(A * b - b * b - b * b * b)).filter((Z) => Z > b);
  const largest = Math.max(...roots);
  const smallest = Math.min(...roots);
  if (!(smallest > b && Number.isFinite(largest)))
    throw new Error(`expected a root above ${b} at A = ${A}, got ${roots}`);
  if (root !== 'stable') return root === 'gas' ? largest : smallest;
  return residual(smallest, A, b) < residual(largest, A, b) ? smallest : largest;
}

const logarithm = (Z: number, b: number): number => Math.log((Z + (1 + root2) * b) / (Z + (1 - root2) * b));

/** Residual Gibbs energy over R T, to compare two roots. */
const residual = (Z: number, A: number, b: number): number =>
  Z - 1 - Math.log(Z - b) - (A / (2 * root2 * b)) * logarithm(Z, b);

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
