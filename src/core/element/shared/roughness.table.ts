/** Limits of pipe roughness, 1e-4 Ra/D by diameter ratio (rows) and pipe Reynolds number (columns). From memory. */
import type { Source } from '../../quantity/source.ts';

export interface RoughnessTable {
  readonly source: Source;
  readonly ratios: readonly number[];
  readonly reynolds: readonly number[];
  readonly values: readonly (readonly number[])[];
}

/** ISO 5167-2:2003, Table 1: the first row stands for beta <= 0.2, the last for >= 0.65, the first column for <= 1e4. */
export const orificeRoughest: RoughnessTable = {
  source: { clause: 'ISO 5167-2:2003, 5.3.1, Tables 1 and 2', seen: 'memory' },
  ratios: [0.2, 0.3, 0.4, 0.5, 0.6, 0.65],
  reynolds: [1e4, 3e4, 1e5, 3e5, 1e6, 3e6, 1e7, 3e7, 1e8],
  values: [
    [15, 15, 15, 15, 15, 15, 15, 15, 15],
    [15, 15, 15, 15, 15, 15, 15, 14, 13],
    [15, 15, 10, 7.2, 5.2, 4.1, 3.5, 3.1, 2.7],
    [11, 7.7, 4.9, 3.3, 2.2, 1.6, 1.3, 1.1, 0.9],
    [5.6, 4.0, 2.5, 1.6, 1.0, 0.7, 0.6, 0.5, 0.4],
    [4.2, 3.0, 1.9, 1.2, 0.8, 0.6, 0.4, 0.3, 0.3],
  ],
};

/** ISO 5167-2:2003, Table 2: the first row stands for beta <= 0.5, the last for >= 0.65; no minimum below 3e6. */
export const orificeSmoothest: RoughnessTable = {
  source: { clause: 'ISO 5167-2:2003, 5.3.1, Tables 1 and 2', seen: 'memory' },
  ratios: [0.5, 0.6, 0.65],
  reynolds: [3e6, 1e7, 3e7, 1e8],
  values: [
    [0, 0, 0, 0],
    [0, 0, 0.003, 0.004],
    [0, 0.013, 0.016, 0.012],
  ],
};

/** ISO 5167-2:2003, 5.3.1: the band of Ra, m, accepted in bores of at least 150 mm, and up to which Re_D. */
export const smoothBand = (ratio: number): { min: number; max: number; reynolds: number } =>
  ratio <= 0.6 ? { min: 1e-6, max: 6e-6, reynolds: 5e7 } : { min: 1.5e-6, max: 6e-6, reynolds: 1.5e7 };

/** ISO 5167-3:2003, Tables 1 and 2 (ISA 1932 and Venturi nozzles): the first row stands for beta <= 0.35. */
export const nozzleRoughest: RoughnessTable = {
  source: { clause: 'ISO 5167-3:2003, Tables 1 and 2', seen: 'memory' },
  ratios: [0.35, 0.36, 0.38, 0.4, 0.42, 0.44, 0.46, 0.48, 0.5, 0.6, 0.7, 0.77, 0.8],
  reynolds: [1],
  values: [[8.0], [5.9], [4.3], [3.4], [2.8], [2.4], [2.1], [1.9], [1.8], [1.4], [1.3], [1.2], [1.2]],
};
