/**
 * Viscosity of water. Source: IAPWS R12-08, Table 1 (H_i of Eq. 11) and Table 2 (H_ij of Eq. 12: one row for each
 * i = 0 to 5, one column for each j = 0 to 6; a term that the release does not print is 0).
 */
export const dilute = [1.67752, 2.20462, 0.6366564, -0.241605] as const;

export const finite: readonly (readonly number[])[] = [
  [0.520094, 0.222531, -0.281378, 0.161913, -0.0325372, 0, 0],
  [0.0850895, 0.999115, -0.906851, 0.257399, 0, 0, 0],
  [-1.08374, 1.88797, -0.772479, 0, 0, 0, 0],
  [-0.289555, 1.26613, -0.489837, 0, 0.0698452, 0, -0.00435673],
  [0, 0, -0.25704, 0, 0, 0.00872102, 0],
  [0, 0.120573, 0, 0, 0, 0, -0.000593264],
];
