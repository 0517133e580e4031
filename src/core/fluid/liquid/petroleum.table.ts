/**
 * Thermal expansion of crude oil and refined products: K0, K1, K2 of each group and its densities at 60 degF in kg/m3.
 * Source: API MPMS Chapter 11.1-2004 (ASTM D1250-04, IP 200/04), as open copies have it.
 */
export const groups = [
  { group: 'crude', K0: 341.0957, K1: 0, K2: 0, min: 610.6, max: 1163.5 },
  { group: 'fuel-oil', K0: 103.872, K1: 0.2701, K2: 0, min: 838.3127, max: 1163.5 },
  { group: 'jet-kerosene', K0: 330.301, K1: 0, K2: 0, min: 787.5195, max: 838.3127 },
  { group: 'transition', K0: 1489.067, K1: 0, K2: -0.0018684, min: 770.352, max: 787.5195 },
  { group: 'gasoline', K0: 192.4571, K1: 0.2438, K2: 0, min: 610.6, max: 770.352 },
  { group: 'lubricating', K0: 0, K1: 0.34878, K2: 0, min: 800.9, max: 1163.5 },
] as const;

/** Coefficients a1 to a8 of the shift from ITS-90 to IPTS-68. */
export const shift = [-0.148759, -0.267408, 1.08076, 1.269056, -4.089591, -1.871251, 7.438081, -3.536296] as const;

export const delta60 = 0.01374979547; // degF, shift of the base temperature
export const baseTemperature68 = 60.0068749; // degF, 60 degF on IPTS-68
export const waterDensity60 = 999.016; // kg/m3, water at 60 degF: the base of the API gravity
