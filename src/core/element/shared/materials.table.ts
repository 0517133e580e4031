/**
 * Mean thermal expansion of materials, 1e-6/K from 20 degC to the temperature of the column, and, where the standard
 * minimum is well known, yield strength and elastic modulus at 20 degC. Linear between the temperatures, held outside.
 * The ASME tables count from 70 degF; the difference is within their rounding.
 */
import type { Source } from '../../quantity/source.ts';

export interface Material {
  /** As written in the file. */
  readonly key: string;
  readonly source: Source;
  readonly celsius: readonly number[];
  readonly expansion: readonly number[]; // 1e-6/K
  readonly strength?: { readonly yieldStrength: number; readonly elasticModulus: number; readonly source: Source }; // Pa
}

export const materials: readonly Material[] = [
  // carbon and low-alloy steel (C, C-Mn, C-Mo, 1/2Cr..3Cr)
  {
    key: 'carbon-steel',
    source: { clause: 'ASME BPVC II-D:2001, Table TE-1, Group 1, coefficient B', seen: 'read' },
    celsius: [21.11, 37.78, 65.56, 93.33, 121.11, 148.89, 176.67, 204.44, 232.22, 260, 287.78, 315.56, 343.33, 371.11, 398.89, 426.67, 454.44, 482.22, 510, 537.78],
    expansion: [11.52, 11.7, 11.88, 12.06, 12.24, 12.42, 12.6, 12.78, 12.96, 13.14, 13.14, 13.32, 13.5, 13.68, 13.86, 14.04, 14.22, 14.22, 14.4, 14.58],
    strength: {
      yieldStrength: 205e6,
      elasticModulus: 200e9,
      source: { clause: 'carbon steel plate, lowest of the usual grades (ASTM A283 C)', seen: 'memory' },
    },
  },
  // austenitic stainless steel 304/304L/321/347 (1.4301, 1.4307, 1.4541, 1.4550)
  {
    key: 'stainless-304',
    source: { clause: 'EN 10088-1', seen: 'read' },
    celsius: [100, 200, 300, 400, 500],
    expansion: [16, 16.5, 17, 17.5, 18],
    strength: {
      yieldStrength: 205e6,
      elasticModulus: 193e9,
      source: { clause: 'ASTM A240 304', seen: 'memory' },
    },
  },
  // austenitic stainless steel 316/316L (1.4401, 1.4404)
  {
    key: 'stainless-316',
    source: { clause: 'EN 10088-1', seen: 'memory' },
    celsius: [100, 200, 300, 400, 500],
    expansion: [16, 16.5, 17, 17.5, 18],
    strength: {
      yieldStrength: 205e6,
      elasticModulus: 193e9,
      source: { clause: 'ASTM A240 316', seen: 'memory' },
    },
  },
  // duplex stainless steel S31803/S32205 (1.4462)
  {
    key: 'duplex',
    source: { clause: 'EN 10088-1', seen: 'memory' },
    celsius: [100, 200, 300],
    expansion: [13, 13.5, 14],
    strength: {
      yieldStrength: 450e6,
      elasticModulus: 200e9,
      source: { clause: 'ASTM A240 S31803', seen: 'memory' },
    },
  },
  // martensitic stainless steel 410 (1.4006)
  {
    key: 'stainless-410',
    source: { clause: 'EN 10088-1', seen: 'read' },
    celsius: [100, 200, 300, 400],
    expansion: [10.5, 11, 11.5, 12],
  },
  // ferritic stainless steel 430 (1.4016)
  {
    key: 'stainless-430',
    source: { clause: 'EN 10088-1', seen: 'read' },
    celsius: [100, 200, 300, 400, 500],
    expansion: [10, 10, 10.5, 10.5, 11],
  },
  // nickel-copper alloy UNS N04400 (67Ni-30Cu)
  {
    key: 'alloy-400',
    source: { clause: 'alloy data sheet values, mean from 21 C', seen: 'read' },
    celsius: [-130, -70, 100, 200, 300, 400, 500, 600],
    expansion: [11.4, 12.1, 14.2, 15.2, 15.7, 16.1, 16.3, 16.6],
  },
  // Ni-Mo-Cr alloy UNS N10276
  {
    key: 'alloy-c276',
    source: { clause: 'alloy data sheet values, mean from 24 C', seen: 'memory' },
    celsius: [93, 204, 316, 427, 538],
    expansion: [11.2, 12, 12.8, 13.2, 13.4],
  },
  // Ni-Cr-Mo alloy UNS N06022
  {
    key: 'alloy-c22',
    source: { clause: 'ASME BPVC II-D:2019, Table TE-4, coefficient B', seen: 'read' },
    celsius: [21.11, 37.78, 65.56, 93.33, 121.11, 148.89, 176.67, 204.44, 232.22, 260, 287.78, 315.56, 343.33, 371.11, 398.89, 426.67, 454.44, 482.22, 510, 537.78],
    expansion: [12.42, 12.42, 12.42, 12.42, 12.42, 12.42, 12.42, 12.42, 12.42, 12.6, 12.6, 12.6, 12.78, 12.96, 12.96, 13.14, 13.32, 13.5, 13.68, 13.86],
  },
  // Ni-Cr-Mo-Nb alloy UNS N06625
  {
    key: 'alloy-625',
    source: { clause: 'alloy data sheet values', seen: 'memory' },
    celsius: [93, 204, 316, 427, 538],
    expansion: [12.8, 13.1, 13.3, 13.7, 14],
  },
  // red brass UNS C23000 (85Cu-15Zn)
  {
    key: 'red-brass',
    source: { clause: 'ASME B31.9 Table 919.3.1: 10.40e-6/F average', seen: 'read' },
    celsius: [20],
    expansion: [18.7],
  },
  // free-cutting brass UNS C36000 (60Cu-37Zn-3Pb)
  {
    key: 'free-cutting-brass',
    source: { clause: 'handbook value 20-300 C', seen: 'memory' },
    celsius: [20],
    expansion: [20.5],
  },
  // copper UNS C12200
  {
    key: 'copper',
    source: { clause: 'ASME B31.9 Table 919.3.1: 9.50e-6/F', seen: 'read' },
    celsius: [20],
    expansion: [17.1],
  },
  // tin/gunmetal bronze (C90500 class)
  {
    key: 'bronze',
    source: { clause: 'handbook value', seen: 'memory' },
    celsius: [20],
    expansion: [18],
  },
  // aluminium
  {
    key: 'aluminium',
    source: { clause: 'ASME B31.9 Table 919.3.1: 12.69e-6/F', seen: 'read' },
    celsius: [20],
    expansion: [22.8],
  },
  // grey cast iron
  {
    key: 'grey-iron',
    source: { clause: 'ASME B31.9 Table 919.3.1: 5.76e-6/F', seen: 'read' },
    celsius: [20],
    expansion: [10.4],
  },
  // ductile iron
  {
    key: 'ductile-iron',
    source: { clause: 'ASME B31.9 Table 919.3.1: 5.97e-6/F', seen: 'read' },
    celsius: [20],
    expansion: [10.7],
  },
  // titanium grade 2
  {
    key: 'titanium',
    source: { clause: 'handbook value', seen: 'memory' },
    celsius: [100, 200, 300],
    expansion: [8.6, 8.9, 9.2],
  },
  // PVC (type 1120)
  {
    key: 'pvc',
    source: { clause: 'ASME B31.9 Table 919.3.1: 30e-6/F', seen: 'read' },
    celsius: [20],
    expansion: [54],
  },
  // CPVC 4120
  {
    key: 'cpvc',
    source: { clause: 'ASME B31.9 Table 919.3.1: 35e-6/F', seen: 'read' },
    celsius: [20],
    expansion: [63],
  },
  // polyethylene PE 2306
  {
    key: 'pe',
    source: { clause: 'ASME B31.9 Table 919.3.1: 80e-6/F', seen: 'read' },
    celsius: [20],
    expansion: [144],
  },
  // polypropylene PP 1208
  {
    key: 'pp',
    source: { clause: 'ASME B31.9 Table 919.3.1: 43e-6/F', seen: 'read' },
    celsius: [20],
    expansion: [77.4],
  },
  // PTFE
  {
    key: 'ptfe',
    source: { clause: 'handbook value 20-100 C, transition at 19 C excluded', seen: 'memory' },
    celsius: [20],
    expansion: [125],
  },
  // glass-fibre reinforced plastic
  {
    key: 'grp',
    source: { clause: 'handbook value; depends on the maker, typically 18 to 35', seen: 'memory' },
    celsius: [20],
    expansion: [27],
  },
];
