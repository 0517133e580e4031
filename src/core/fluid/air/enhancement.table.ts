/**
 * Enhancement factor of water vapour in air: a_0 to a_3 and b_0 to b_3 over water (0 degC to 100 degC) and over ice
 * (-100 degC to 0 degC), t in degC. Source: Hardy, Proc. 3rd Int. Symp. on Humidity and Moisture (1998), ITS-90 form of
 * Greenspan, J. Res. NBS 80A (1976) 41. From memory, held against an independent equation of state: check your copy.
 */
export interface Coefficients {
  readonly a: readonly number[];
  readonly b: readonly number[];
}

export const overWater: Coefficients = {
  a: [3.53624e-4, 2.9328363e-5, 2.6168979e-7, 8.5813609e-9],
  b: [-1.07588e1, 6.3268134e-2, -2.5368934e-4, 6.3405286e-7],
};

export const overIce: Coefficients = {
  a: [3.64449e-4, 2.9367585e-5, 4.8874766e-7, 4.3669918e-9],
  b: [-1.07271e1, 7.6215115e-2, -1.7490155e-4, 2.4668279e-6],
};
