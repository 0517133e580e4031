/**
 * Critical temperature K, critical pressure MPa and acentric factor of the components of GERG-2008, in its order.
 * Source: the reference equations of state of the pure fluids, as tabulated in an open library of chemical data.
 */
export type CriticalRow = readonly [name: string, Tc: number, pc: number, omega: number];

export const critical: readonly CriticalRow[] = [
  ['methane', 190.564, 4.5992, 0.01142],
  ['nitrogen', 126.192, 3.3958, 0.0372],
  ['carbon-dioxide', 304.1282, 7.3773, 0.22394],
  ['ethane', 305.322, 4.8722, 0.0995],
  ['propane', 369.89, 4.2512, 0.1521],
  ['isobutane', 407.81, 3.629, 0.184],
  ['n-butane', 425.125, 3.796, 0.201],
  ['isopentane', 460.35, 3.378, 0.2274],
  ['n-pentane', 469.7, 3.3675, 0.251],
  ['n-hexane', 507.82, 3.0441, 0.3],
  ['n-heptane', 540.2, 2.73573, 0.349],
  ['n-octane', 568.74, 2.48359, 0.398],
  ['n-nonane', 594.55, 2.281, 0.4433],
  ['n-decane', 617.7, 2.103, 0.4884],
  ['hydrogen', 33.145, 1.2964, -0.219],
  ['oxygen', 154.581, 5.043, 0.0222],
  ['carbon-monoxide', 132.86, 3.494, 0.0497],
  ['water', 647.096, 22.064, 0.3443],
  ['hydrogen-sulfide', 373.1, 9, 0.1005],
  ['helium', 5.1953, 0.22832, -0.3836],
  ['argon', 150.687, 4.863, -0.00219],
];
