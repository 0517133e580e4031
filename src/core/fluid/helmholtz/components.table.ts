/**
 * The 21 components of a gas mixture, in the order of GERG-2008: molar mass g/mol, critical temperature K and density mol/dm3, constants of
 * the ideal gas n1 to n7 and theta4 to theta7 (K; those of the paper times Tc). n1 and n2 set enthalpy and entropy of the
 * ideal gas to zero at 298.15 K and 101.325 kPa.
 * Source: Kunz and Wagner, J. Chem. Eng. Data 57 (2012) 3032, Tables A1 to A8, the model of ISO 20765-2:2015 and of
 * AGA Report No. 8, Part 2 (2017); digits as in the public-domain AGA8 routines of NIST, version 2.0.
 */
export interface ComponentRow {
  readonly name: string;
  readonly formula: string;
  readonly M: number;
  readonly Tc: number;
  readonly rhoc: number;
  readonly n: readonly number[];
  readonly theta: readonly number[];
}

export const components: readonly ComponentRow[] = [
  { name: 'methane', formula: 'CH4', M: 16.04246, Tc: 190.564, rhoc: 10.139342719, n: [29.83843397, -15999.69151, 4.00088, 0.76315, 0.0046, 8.74432, -4.46921], theta: [820.659, 178.41, 1062.82, 1090.53] },
  { name: 'nitrogen', formula: 'N2', M: 28.0134, Tc: 126.192, rhoc: 11.1839, n: [17.56770785, -2801.729072, 3.50031, 0.13732, -0.1466, 0.90066, 0], theta: [662.738, 680.562, 1740.06, 0] },
  { name: 'carbon-dioxide', formula: 'CO2', M: 44.0095, Tc: 304.1282, rhoc: 10.624978698, n: [20.65844696, -4902.171516, 3.50002, 2.04452, -1.06044, 2.03366, 0.01393], theta: [919.306, 865.07, 483.553, 341.109] },
  { name: 'ethane', formula: 'C2H6', M: 30.06904, Tc: 305.322, rhoc: 6.87085454, n: [36.73005938, -23639.65301, 4.00263, 4.33939, 1.23722, 13.1974, -6.01989], theta: [559.314, 223.284, 1031.38, 1071.29] },
  { name: 'propane', formula: 'C3H8', M: 44.09562, Tc: 369.825, rhoc: 5.000043088, n: [44.70909619, -31236.63551, 4.02939, 6.60569, 3.197, 19.1921, -8.37267], theta: [479.856, 200.893, 955.312, 1027.29] },
  { name: 'isobutane', formula: 'i-C4H10', M: 58.1222, Tc: 407.817, rhoc: 3.86014294, n: [34.30180349, -38525.50276, 4.06714, 8.97575, 5.25156, 25.1423, 16.1388], theta: [438.27, 198.018, 1905.02, 893.765] },
  { name: 'n-butane', formula: 'n-C4H10', M: 58.1222, Tc: 425.125, rhoc: 3.920016792, n: [36.53237783, -38957.80933, 4.33944, 9.44893, 6.89406, 24.4618, 14.7824], theta: [468.27, 183.636, 1914.1, 903.185] },
  { name: 'isopentane', formula: 'i-C5H12', M: 72.14878, Tc: 460.35, rhoc: 3.271, n: [43.17218626, -51198.30946, 4, 11.7618, 20.1101, 33.1688, 0], theta: [292.503, 910.237, 1919.37, 0] },
  { name: 'n-pentane', formula: 'n-C5H12', M: 72.14878, Tc: 469.7, rhoc: 3.215577588, n: [42.67837089, -45215.83, 4, 8.95043, 21.836, 33.4032, 0], theta: [178.67, 840.538, 1774.25, 0] },
  { name: 'n-hexane', formula: 'n-C6H14', M: 86.17536, Tc: 507.82, rhoc: 2.705877875, n: [46.99717188, -52746.83318, 4, 11.6977, 26.8142, 38.6164, 0], theta: [182.326, 859.207, 1826.59, 0] },
  { name: 'n-heptane', formula: 'n-C7H16', M: 100.20194, Tc: 540.13, rhoc: 2.315324434, n: [52.07631631, -57104.81056, 4, 13.7266, 30.4707, 43.5561, 0], theta: [169.789, 836.195, 1760.46, 0] },
  { name: 'n-octane', formula: 'n-C8H18', M: 114.22852, Tc: 569.32, rhoc: 2.056404127, n: [57.25830934, -60546.76385, 4, 15.6865, 33.8029, 48.1731, 0], theta: [158.922, 815.064, 1693.07, 0] },
  { name: 'n-nonane', formula: 'n-C9H20', M: 128.2551, Tc: 594.55, rhoc: 1.81, n: [62.09646901, -66600.12837, 4, 18.0241, 38.1235, 53.3415, 0], theta: [156.854, 814.882, 1693.79, 0] },
  { name: 'n-decane', formula: 'n-C10H22', M: 142.28168, Tc: 617.7, rhoc: 1.64, n: [65.93909154, -74131.45483, 4, 21.0069, 43.4931, 58.3657, 0], theta: [164.947, 836.264, 1750.24, 0] },
  { name: 'hydrogen', formula: 'H2', M: 2.01588, Tc: 33.19, rhoc: 14.94, n: [13.07520288, -5836.943696, 2.47906, 0.95806, 0.45444, 1.56039, -1.3756], theta: [228.734, 326.843, 1651.71, 1671.69] },
  { name: 'oxygen', formula: 'O2', M: 31.9988, Tc: 154.595, rhoc: 13.63, n: [16.8017173, -2318.32269, 3.50146, 1.07558, 1.01334, 0, 0], theta: [2235.71, 1116.69, 0, 0] },
  { name: 'carbon-monoxide', formula: 'CO', M: 28.0101, Tc: 132.86, rhoc: 10.85, n: [17.45786899, -2635.244116, 3.50055, 1.02865, 0.00493, 0, 0], theta: [1550.45, 704.525, 0, 0] },
  { name: 'water', formula: 'H2O', M: 18.01528, Tc: 647.096, rhoc: 17.87371609, n: [21.57882705, -7766.733078, 4.00392, 0.01059, 0.98763, 3.06904, 0], theta: [268.795, 1141.41, 2507.37, 0] },
  { name: 'hydrogen-sulfide', formula: 'H2S', M: 34.08088, Tc: 373.1, rhoc: 10.19, n: [21.5830944, -6069.035869, 4, 3.11942, 1.00243, 0, 0], theta: [1833.63, 847.181, 0, 0] },
  { name: 'helium', formula: 'He', M: 4.002602, Tc: 5.1953, rhoc: 17.399, n: [10.04639507, -745.375, 2.5, 0, 0, 0, 0], theta: [0, 0, 0, 0] },
  { name: 'argon', formula: 'Ar', M: 39.948, Tc: 150.687, rhoc: 13.407429659, n: [10.04639507, -745.375, 2.5, 0, 0, 0, 0], theta: [0, 0, 0, 0] },
];
