/**
 * Gas viscosity of the components of GERG-2008, in its order. Columns: name, C1 to C4 of the dilute gas,
 * eta0 = C1 T^C2 / (1 + C3/T + C4/T2) Pa.s, lowest and highest K of the fit, critical volume Vc cm3/mol, the source.
 * The constants are fitted here to the correlations named, with an error of at most 0.5 %; those of carbon monoxide and
 * isopentane are printed in Perry's Handbook. Critical volumes: the reference equations of state of the pure fluids.
 */
export type Row = readonly [
  name: string,
  C: readonly [C1: number, C2: number, C3: number, C4: number],
  lowest: number,
  highest: number,
  Vc: number,
  source: string,
];

export const rows: readonly Row[] = [
  ['methane', [3.75277e-7, 0.636004, 74.36, 720.923], 180, 800, 98.6278, 'Quinones-Cisneros and Deiters, J. Phys. Chem. B 110 (2006) 12820'],
  ['nitrogen', [8.90122e-7, 0.567435, 81.7933, -514.067], 180, 800, 89.4142, 'Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21'],
  ['carbon-dioxide', [7.67401e-6, 0.317705, 683.075, -13174.9], 200, 700, 94.1185, 'Laesecke and Muzny, J. Phys. Chem. Ref. Data 46 (2017) 013107'],
  ['ethane', [2.73186e-6, 0.375758, 473.789, -8794.12], 180, 800, 145.8388, 'Friend, Ingham and Ely, J. Phys. Chem. Ref. Data 20 (1991) 275'],
  ['propane', [2.93702e-6, 0.373972, 672.249, -20100.6], 200, 700, 200, 'Vogel, Kuechenmeister, Bich and Laesecke, J. Phys. Chem. Ref. Data 27 (1998) 947'],
  ['isobutane', [1.2147e-7, 0.767584, 94.0018, -3027.13], 180, 800, 257.7481, 'Vogel, Kuechenmeister and Bich, Int. J. Thermophys. 21 (2000) 343'],
  ['n-butane', [7.61072e-8, 0.836883, 69.6344, -2441.82], 180, 800, 254.9219, 'Vogel, Kuechenmeister and Bich, High Temp. High Press. 31 (1999) 173'],
  ['isopentane', [2.4344e-8, 0.97376, -91.597, 18720], 150, 1000, 305.7169, 'Perry, 8th edition, Table 2-312'],
  ['n-pentane', [2.21412e-7, 0.692085, 239.035, -10470.9], 180, 800, 311.5265, 'Quinones-Cisneros and Deiters, J. Phys. Chem. B 110 (2006) 12820'],
  ['n-hexane', [6.71059e-8, 0.835185, 82.1397, -2759.24], 180, 800, 369.5492, 'Michailidou and others, J. Phys. Chem. Ref. Data 42 (2013) 033104'],
  ['n-heptane', [9.70472e-7, 0.506195, 758.287, -52338.1], 180, 800, 429.1845, 'Michailidou and others, J. Phys. Chem. Ref. Data 43 (2014) 023103'],
  ['n-octane', [2.30873e-8, 0.967898, 0, 0], 230, 800, 492.3683, 'Huber, Laesecke and Xiang, Fluid Phase Equilib. 224 (2004) 263'],
  ['n-nonane', [2.20966e-8, 0.966455, 0, 0], 230, 800, 552.4862, 'Huber, Laesecke and Xiang, Fluid Phase Equilib. 224 (2004) 263'],
  ['n-decane', [2.21466e-8, 0.960514, 0, 0], 240, 800, 609.7561, 'Huber, Laesecke and Xiang, Fluid Phase Equilib. 224 (2004) 263'],
  ['hydrogen', [1.40185e-7, 0.720979, -16.6983, 1242.37], 180, 800, 64.4828, 'Muzny, Huber and Kazakov, J. Chem. Eng. Data 58 (2013) 969'],
  ['oxygen', [1.12965e-6, 0.560248, 105.103, -1174.83], 180, 800, 73.3676, 'Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21'],
  ['carbon-monoxide', [1.1127e-6, 0.5338, 94.7, 0], 150, 1000, 92.1659, 'Perry, 8th edition, Table 2-312'],
  ['water', [1.30259e-7, 0.880074, 525.379, -65993], 273.15, 650, 55.948, 'IAPWS R12-08, Eq. 11'],
  ['hydrogen-sulfide', [5.42244e-6, 0.357565, 749.169, -7689.43], 240, 650, 98.1354, 'Quinones-Cisneros, Schmidt, Giri, Blais and Marriott, J. Chem. Eng. Data 57 (2012) 3014'],
  ['helium', [3.17935e-7, 0.718927, -12.0294, 310.77], 110, 800, 57.5252, 'Arp, McCarty and Friend, NIST TN 1334 (1998)'],
  ['argon', [1.33158e-6, 0.557789, 129.514, -1847.11], 180, 800, 74.5855, 'Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21'],
];
