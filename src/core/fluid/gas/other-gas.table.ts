/**
 * Gases that GERG-2008 does not hold. Name, other spellings, M g/mol, Tc K, pc MPa, Vc cm3/mol, acentric factor, C1 to C4
 * of the dilute gas C1 T^C2 / (1 + C3/T + C4/T2) Pa.s and its range K, cp/R = sum of a_i T^i of the ideal gas and its
 * range K. Sources: critical points from the reference equations of state; viscosity from Perry's Handbook, 8th edition,
 * Table 2-312; heat capacity from Poling, Prausnitz and O'Connell, 5th edition, Appendix A; seen in an open library.
 */
export interface OtherGas {
  readonly name: string;
  readonly spellings: readonly string[];
  readonly M: number;
  readonly Tc: number;
  readonly pc: number;
  readonly Vc: number;
  readonly omega: number;
  readonly C: readonly [C1: number, C2: number, C3: number, C4: number];
  readonly viscous: readonly [lowest: number, highest: number];
  readonly a: readonly number[];
  readonly caloric: readonly [lowest: number, highest: number];
}

export const otherGases: readonly OtherGas[] = [
  { name: 'ammonia', spellings: ['NH3', 'R717'], M: 17.03052, Tc: 405.56, pc: 11.3634, Vc: 73.014, omega: 0.256, C: [4.1855e-8, 0.9806, 30.8, 0], viscous: [195.41, 1000], a: [4.238, -0.004215, 2.041e-5, -2.126e-8, 7.61e-12], caloric: [50, 1000] },
  { name: 'ethylene', spellings: ['ethene', 'C2H4'], M: 28.05316, Tc: 282.35, pc: 5.0418, Vc: 130.9455, omega: 0.0866, C: [2.0789e-6, 0.4163, 352.7, 0], viscous: [169.41, 1000], a: [4.221, -0.008782, 5.795e-5, -6.729e-8, 2.511e-11], caloric: [50, 1000] },
  { name: 'propylene', spellings: ['propene', 'C3H6'], M: 42.07974, Tc: 364.211, pc: 4.555, Vc: 183.2509, omega: 0.146, C: [7.3919e-7, 0.5423, 263.73, 0], viscous: [87.89, 1000], a: [3.834, 0.003893, 4.688e-5, -6.013e-8, 2.283e-11], caloric: [50, 1000] },
  { name: 'chlorine', spellings: ['Cl2'], M: 70.906, Tc: 416.8654, pc: 7.6424, Vc: 124.0695, omega: 0.07, C: [2.6e-7, 0.7423, 98.3, 0], viscous: [200, 1000], a: [3.056, 0.0053708, -8.098e-6, 5.693e-9, -1.5256e-12], caloric: [50, 1000] },
  { name: 'sulfur-dioxide', spellings: ['sulphur dioxide', 'SO2'], M: 64.0638, Tc: 430.64, pc: 7.8866, Vc: 123.793, omega: 0.256, C: [6.863e-7, 0.6112, 217, 0], viscous: [197.67, 1000], a: [4.417, -0.002234, 2.344e-5, -3.271e-8, 1.393e-11], caloric: [50, 1000] },
  { name: 'acetylene', spellings: ['ethyne', 'C2H2'], M: 26.03728, Tc: 308.3, pc: 5.9882, Vc: 113.2503, omega: 0.178, C: [1.2025e-6, 0.4952, 291.4, 0], viscous: [192.4, 600], a: [2.41, 0.010926, -2.55e-6, -7.9e-9, 5.24e-12], caloric: [50, 1000] },
  { name: 'nitrous-oxide', spellings: ['N2O'], M: 44.0128, Tc: 309.52, pc: 7.245, Vc: 97.371, omega: 0.162, C: [2.115e-6, 0.4642, 305.7, 0], viscous: [182.3, 1000], a: [3.165, 0.003401, 9.89e-6, -1.88e-8, 8.9e-12], caloric: [50, 1000] },
  { name: 'neon', spellings: ['Ne'], M: 20.1797, Tc: 44.4, pc: 2.66163, Vc: 41.4938, omega: -0.0355, C: [7.19e-7, 0.6659, 5.3, 0], viscous: [30, 3273.1], a: [2.5, 0, 0, 0, 0], caloric: [30, 3000] },
  { name: '1-butene', spellings: ['butene'], M: 56.10632, Tc: 419.29, pc: 4.0051, Vc: 235.8491, omega: 0.192, C: [6.9744e-7, 0.5462, 305.25, 0], viscous: [87.8, 1000], a: [4.389, 0.007984, 6.143e-5, -8.2e-8, 3.165e-11], caloric: [50, 1000] },
  { name: 'methanol', spellings: ['CH3OH'], M: 32.04186, Tc: 513.38, pc: 8.21585, Vc: 113.8282, omega: 0.5625, C: [3.0663e-7, 0.69655, 205, 0], viscous: [240, 1000], a: [4.714, -0.006986, 4.211e-5, -4.443e-8, 1.535e-11], caloric: [50, 1000] },
  { name: 'ethanol', spellings: ['C2H5OH'], M: 46.06844, Tc: 514.71, pc: 6.268, Vc: 168.6341, omega: 0.646, C: [1.0613e-7, 0.8066, 52.7, 0], viscous: [200, 1000], a: [4.396, 0.000628, 5.546e-5, -7.024e-8, 2.685e-11], caloric: [50, 1000] },
  { name: 'dimethyl-ether', spellings: ['DME'], M: 46.06844, Tc: 400.378, pc: 5.3368, Vc: 168.3502, omega: 0.196, C: [2.68e-6, 0.3975, 534, 0], viscous: [131.65, 1000], a: [4.361, 0.00607, 2.899e-5, -3.581e-8, 1.282e-11], caloric: [100, 1000] },
  { name: 'benzene', spellings: ['C6H6'], M: 78.11184, Tc: 562.02, pc: 4.907277, Vc: 256.3445, omega: 0.211, C: [3.134e-8, 0.9676, 7.9, 0], viscous: [278.68, 1000], a: [3.551, -0.006184, 0.00014365, -1.9807e-7, 8.234e-11], caloric: [50, 1000] },
  { name: 'toluene', spellings: ['C7H8'], M: 92.13842, Tc: 591.75, pc: 4.1263, Vc: 315.557, omega: 0.2657, C: [8.7268e-7, 0.49397, 323.79, 0], viscous: [178.18, 1000], a: [3.866, 0.003558, 0.00013356, -1.8659e-7, 7.69e-11], caloric: [50, 1000] },
  { name: 'hydrogen-chloride', spellings: ['HCl'], M: 36.46094, Tc: 324.68, pc: 8.3135, Vc: 84.246, omega: 0.129, C: [4.924e-7, 0.6702, 157.7, 0], viscous: [200, 1000], a: [3.827, -0.002936, 8.79e-6, -1.031e-8, 4.39e-12], caloric: [50, 1000] },
  { name: 'cyclohexane', spellings: ['C6H12'], M: 84.15948, Tc: 553.6, pc: 4.0805, Vc: 310.1737, omega: 0.2096, C: [6.77e-8, 0.8367, 36.7, 0], viscous: [279.69, 900], a: [4.035, -0.004433, 0.00016834, -2.0775e-7, 7.746e-11], caloric: [100, 1000] },
];
