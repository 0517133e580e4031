/**
 * Typical gases to start a composition from, in mole fractions as a document writes them. They are customary figures,
 * not those of any supply: the analysis of the gas at hand replaces them. Dry air: that of CIPM-2007 without its traces.
 */
import type { Source } from '../quantity/source.ts';

export interface GasPreset {
  /** Code of its name, see views/words. */
  readonly name: string;
  readonly composition: Readonly<Record<string, string>>;
  readonly source: Source;
}

const typical: Source = { clause: 'typical composition', seen: 'practice' };

export const gasPresets: readonly GasPreset[] = [
  {
    name: 'lean-gas',
    composition: { methane: '0.965', nitrogen: '0.010', 'carbon-dioxide': '0.005', ethane: '0.016', propane: '0.003', 'n-butane': '0.001' },
    source: typical,
  },
  {
    name: 'rich-gas',
    composition: {
      methane: '0.855', nitrogen: '0.008', 'carbon-dioxide': '0.017', ethane: '0.080', propane: '0.029', isobutane: '0.004',
      'n-butane': '0.005', isopentane: '0.001', 'n-pentane': '0.001',
    },
    source: typical,
  },
  {
    name: 'high-nitrogen-gas',
    composition: { methane: '0.815', nitrogen: '0.135', 'carbon-dioxide': '0.012', ethane: '0.030', propane: '0.006', 'n-butane': '0.002' },
    source: typical,
  },
  {
    name: 'dry-air',
    composition: { nitrogen: '0.78085', oxygen: '0.20942', argon: '0.00933', 'carbon-dioxide': '0.0004' },
    source: { clause: 'CIPM-2007, Metrologia 45 (2008) 149, Table 1, without traces', seen: 'memory' },
  },
  {
    name: 'hydrogen-blend',
    composition: { methane: '0.772', nitrogen: '0.008', 'carbon-dioxide': '0.004', ethane: '0.013', propane: '0.003', hydrogen: '0.200' },
    source: typical,
  },
  {
    name: 'biogas',
    composition: { methane: '0.600', 'carbon-dioxide': '0.370', nitrogen: '0.008', oxygen: '0.002', water: '0.019', 'hydrogen-sulfide': '0.001' },
    source: typical,
  },
];
