/**
 * Region 5. Source: IAPWS R7-97(2012), Table 37 (ideal part; rows 0, J, n: n τ^J) and Table 38 (residual part;
 * rows I, J, n: n π^I τ^J).
 */
import type { Term } from '../../numeric/power-sum.ts';

export const ideal: readonly Term[] = [
  [0, 0, -13.179983674201],
  [0, 1, 6.8540841634434],
  [0, -3, -0.024805148933466],
  [0, -2, 0.36901534980333],
  [0, -1, -3.1161318213925],
  [0, 2, -0.32961626538917],
];

export const residual: readonly Term[] = [
  [1, 1, 0.0015736404855259],
  [1, 2, 0.00090153761673944],
  [1, 3, -0.0050270077677648],
  [2, 3, 2.2440037409485e-6],
  [2, 9, -4.1163275453471e-6],
  [3, 7, 3.7919454822955e-8],
];
