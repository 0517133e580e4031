/**
 * Straight lengths for classical Venturi tubes, multiples of D to the plane of the upstream tappings, columns A and B.
 * Source: ISO 5167-4:2003, Table 1.
 */
import type { StraightTable } from './straight.ts';

const source = { clause: 'ISO 5167-4:2003, 6.2, Table 1', seen: 'memory' } as const;

export const venturiLengths: StraightTable = {
  source,
  fittings: [
    'single-bend', // one 90 degree bend, radius >= D
    'bends-any-plane', // two or more 90 degree bends, same or different planes
    'reducer-slight', // 1.33D to D over 2.3D
    'expander-strong', // 0.67D to D over 2.5D
    'reducer-strong', // 3D to D over 3.5D
    'expander-slight', // 0.75D to D over D
    'full-bore-valve', // ball or gate valve, fully open
  ],
  rows: [
    { ratio: 0.3, columns: [[8, 3], [8, 3], [4], [4], [2.5], [2.5], [2.5]] },
    { ratio: 0.4, columns: [[8, 3], [8, 3], [4], [4], [2.5], [2.5], [2.5]] },
    { ratio: 0.5, columns: [[9, 3], [10, 3], [4], [5, 4], [5.5, 2.5], [2.5], [3.5, 2.5]] },
    { ratio: 0.6, columns: [[10, 3], [10, 3], [4], [6, 4], [8.5, 2.5], [3.5, 2.5], [4.5, 2.5]] },
    { ratio: 0.7, columns: [[14, 3], [18, 3], [4], [7, 5], [10.5, 2.5], [5.5, 3.5], [5.5, 3.5]] },
    { ratio: 0.75, columns: [[16, 8], [22, 8], [4], [7, 6], [11.5, 3.5], [6.5, 4.5], [5.5, 3.5]] },
  ],
  anyRatio: [],
  notes: [],
};
