/**
 * Reference correlations of the viscosity of pure gases. Sources: nitrogen, oxygen, argon and air: Lemmon and Jacobsen,
 * Int. J. Thermophys. 25 (2004) 21, Tables I, III and IV; carbon dioxide: Laesecke and Muzny, J. Phys. Chem. Ref. Data 46
 * (2017) 013107, Tables 4 to 8; hydrogen: Muzny, Huber and Kazakov, J. Chem. Eng. Data 58 (2013) 969; ethane: Friend,
 * Ingham and Ely, J. Phys. Chem. Ref. Data 20 (1991) 275; propane: Vogel, Kuechenmeister, Bich and Laesecke, J. Phys.
 * Chem. Ref. Data 27 (1998) 947. Seen in an open library that quotes them.
 */

/** Lemmon and Jacobsen: M g/mol, sigma nm, eps/k K, Tc K, rhoc mol/dm3; terms: N uPa.s, t, d, l. */
export interface SimpleFluid {
  readonly M: number;
  readonly sigma: number;
  readonly epsilon: number;
  readonly Tc: number;
  readonly rhoc: number;
  readonly terms: readonly (readonly [N: number, t: number, d: number, l: number])[];
}

/** b_i of ln Omega, i = 0 to 4. */
export const collision: readonly number[] = [0.431, -0.4623, 0.08406, 0.005341, -0.00331];

export const nitrogen: SimpleFluid = { M: 28.01348, sigma: 0.3656, epsilon: 98.94, Tc: 126.192, rhoc: 11.1839, terms: [[10.72, 0.1, 2, 0], [0.03989, 0.25, 10, 1], [0.001208, 3.2, 12, 1], [-7.402, 0.9, 2, 2], [4.62, 0.3, 1, 3]] };

export const oxygen: SimpleFluid = { M: 31.9988, sigma: 0.3428, epsilon: 118.5, Tc: 154.581, rhoc: 13.63, terms: [[17.67, 0.05, 1, 0], [0.4042, 0, 5, 0], [0.000108, 2.1, 12, 0], [0.351, 0, 8, 1], [-13.67, 0.5, 1, 2]] };

export const argon: SimpleFluid = { M: 39.948, sigma: 0.335, epsilon: 143.2, Tc: 150.687, rhoc: 13.40743, terms: [[12.19, 0.42, 1, 0], [13.99, 0, 2, 0], [0.005027, 0.95, 10, 0], [-18.93, 0.5, 5, 2], [-6.698, 0.9, 1, 4], [-3.827, 0.8, 2, 4]] };

export const air: SimpleFluid = { M: 28.9586, sigma: 0.36, epsilon: 103.3, Tc: 132.6312, rhoc: 10.4477, terms: [[10.72, 0.2, 1, 0], [1.122, 0.05, 4, 0], [0.002019, 2.4, 9, 0], [-8.876, 0.6, 1, 1], [-0.02916, 3.6, 8, 1]] };

/** b_i and t_i of the initial density dependence, after Vogel and others 1998. */
export const initialDensity: readonly (readonly [b: number, t: number])[] = [[-19.572881, 0], [219.73999, -0.25], [-1015.3226, -0.5], [2471.0125, -0.75], [-3375.1717, -1], [2491.6597, -1.25], [-787.26086, -1.5], [14.085455, -2.5], [-0.34664158, -5.5]];

/** a_0 to a_6 of the dilute gas; eps/k K, sigma nm; c_1, c_2, gamma of the residual. */
export const carbonDioxide = { a: [1749.35489318835, -369.069300007128, 5423856.34887691, -2.21283852168356, -269503.247933569, 73145.021531826, 5.34368649509278], epsilon: 200.76, sigma: 0.378421, c1: 0.360603235428487, c2: 0.121550806591497, gamma: 8.06282737481277 } as const;

/** a_0 to a_4 of ln S, b_0 to b_6 of the initial density dependence, c_1 to c_6 of the residual. */
export const hydrogen = { M: 2.01588, epsilon: 30.41, sigma: 0.297, a: [0.20963, -0.455274, 0.143602, -0.0335325, 0.00276981], b: [-0.187, 2.4871, 3.7151, -11.0972, 9.0965, -3.8292, 0.5166], c: [6.43449673e-6, 0.0456334068, 0.232797868, 0.95832612, 0.127941189, 0.363576595] } as const;

/** C_1 to C_9 of the dilute gas; g_i, r_i, s_i of the excess, 1 to 9 over 10 and 11. */
export const ethane = { C: [-3.0328138281, 16.918880086, -37.189364917, 41.288861858, -24.61592114, 8.9488430959, -1.8739245042, 0.2096610139, -0.0096570437074], excess: [[0.47177003, 1, 0], [-0.23950311, 1, 1], [0.39808301, 2, 0], [-0.27343335, 2, 1], [0.3519226, 2, 1.5], [-0.21101308, 3, 0], [-0.00478579, 3, 2], [0.07378129, 4, 0], [-0.030435255, 4, 1], [-0.30435286, 1, 0], [0.001215675, 1, 1]] } as const;

/** Terms of ln S (a, power), of the residual (e Pa.s, d, t), and f, g_1, g_2. */
export const propane = { M: 44.0956, epsilon: 263.88, sigma: 0.49748, a: [[0.25104574, 0], [-0.47271238, 1], [0.060836515, 3]], residual: [[3.59873030195e-5, 2, 0], [-0.000180512188564, 2, 1], [8.77124888223e-5, 2, 2], [-0.000105773052525, 3, 0], [0.000205319740877, 3, 1], [-0.00012921093261, 3, 2], [5.89491587759e-5, 4, 0], [-0.0001297400331, 4, 1], [7.66280419971e-5, 4, 2], [-9.59407868475e-6, 5, 0], [2.10726986598e-5, 5, 1], [-1.43971968187e-5, 5, 2]], f: 0.00161688405374, g1: 2.50053938863, g2: 0.860516059264 } as const;
