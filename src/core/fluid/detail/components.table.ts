/**
 * Components of the DETAIL equation, in the order of GERG-2008: molar mass g/mol, energy E K, size K (dm3/mol)^(1/3),
 * orientation G, quadrupole Q, high temperature F, dipole S, association W.
 * Source: AGA Report No. 8, Part 1 (2017), DETAIL, the equation of ISO 12213-2 and ISO 20765-1; digits as in the
 * public-domain AGA8 routines of NIST, 2017.
 */
export type DetailComponent = readonly [
  name: string,
  M: number,
  E: number,
  K: number,
  G: number,
  Q: number,
  F: number,
  S: number,
  W: number,
];

export const components: readonly DetailComponent[] = [
  ['methane', 16.043, 151.3183, 0.4619255, 0, 0, 0, 0, 0],
  ['nitrogen', 28.0135, 99.73778, 0.4479153, 0.027815, 0, 0, 0, 0],
  ['carbon-dioxide', 44.01, 241.9606, 0.4557489, 0.189065, 0.69, 0, 0, 0],
  ['ethane', 30.07, 244.1667, 0.5279209, 0.0793, 0, 0, 0, 0],
  ['propane', 44.097, 298.1183, 0.583749, 0.141239, 0, 0, 0, 0],
  ['isobutane', 58.123, 324.0689, 0.6406937, 0.256692, 0, 0, 0, 0],
  ['n-butane', 58.123, 337.6389, 0.6341423, 0.281835, 0, 0, 0, 0],
  ['isopentane', 72.15, 365.5999, 0.6738577, 0.332267, 0, 0, 0, 0],
  ['n-pentane', 72.15, 370.6823, 0.6798307, 0.366911, 0, 0, 0, 0],
  ['n-hexane', 86.177, 402.636293, 0.7175118, 0.289731, 0, 0, 0, 0],
  ['n-heptane', 100.204, 427.72263, 0.7525189, 0.337542, 0, 0, 0, 0],
  ['n-octane', 114.231, 450.325022, 0.784955, 0.383381, 0, 0, 0, 0],
  ['n-nonane', 128.258, 470.840891, 0.8152731, 0.427354, 0, 0, 0, 0],
  ['n-decane', 142.285, 489.558373, 0.8437826, 0.469659, 0, 0, 0, 0],
  ['hydrogen', 2.0159, 26.95794, 0.3514916, 0.034369, 0, 1, 0, 0],
  ['oxygen', 31.9988, 122.7667, 0.4186954, 0.021, 0, 0, 0, 0],
  ['carbon-monoxide', 28.01, 105.5348, 0.4533894, 0.038953, 0, 0, 0, 0],
  ['water', 18.0153, 514.0156, 0.3825868, 0.3325, 1.06775, 0, 1.5822, 1],
  ['hydrogen-sulfide', 34.082, 296.355, 0.4618263, 0.0885, 0.633276, 0, 0.39, 0],
  ['helium', 4.0026, 2.610111, 0.3589888, 0, 0, 0, 0, 0],
  ['argon', 39.948, 119.6299, 0.4216551, 0, 0, 0, 0, 0],
];
