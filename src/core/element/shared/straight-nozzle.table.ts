/**
 * Straight lengths for nozzles and Venturi nozzles, multiples of D from the upstream face, columns A and B.
 * Source: ISO 5167-3:2003, Table 3.
 */
import type { StraightTable } from './straight.ts';

const source = { clause: 'ISO 5167-3:2003, 6.2, Table 3', seen: 'memory' } as const;

/** The first row stands for beta <= 0.2. */
export const nozzleLengths: StraightTable = {
  source,
  fittings: [
    'single-bend', // one 90 degree bend or tee, flow from one branch only
    'bends-same-plane', // two or more 90 degree bends in one plane
    'bends-different-planes', // two or more 90 degree bends in different planes
    'reducer', // 2D to D over 1.5D to 3D
    'expander', // 0.5D to D over D to 2D
    'globe-valve', // fully open
    'full-bore-valve', // ball or gate valve, fully open
    'downstream', // any of the fittings above
  ],
  rows: [
    { ratio: 0.2, columns: [[10, 6], [14, 7], [34, 17], [5], [16, 8], [18, 9], [12, 6], [4, 2]] },
    { ratio: 0.25, columns: [[10, 6], [14, 7], [34, 17], [5], [16, 8], [18, 9], [12, 6], [4, 2]] },
    { ratio: 0.3, columns: [[10, 6], [16, 8], [34, 17], [5], [16, 8], [18, 9], [12, 6], [5, 2.5]] },
    { ratio: 0.35, columns: [[12, 6], [16, 8], [36, 18], [5], [16, 8], [18, 9], [12, 6], [5, 2.5]] },
    { ratio: 0.4, columns: [[14, 7], [18, 9], [36, 18], [5], [16, 8], [20, 10], [12, 6], [6, 3]] },
    { ratio: 0.45, columns: [[14, 7], [18, 9], [38, 19], [5], [17, 9], [20, 10], [12, 6], [6, 3]] },
    { ratio: 0.5, columns: [[14, 7], [20, 10], [40, 20], [6, 5], [18, 9], [22, 11], [12, 6], [6, 3]] },
    { ratio: 0.55, columns: [[16, 8], [22, 11], [44, 22], [8, 5], [20, 10], [24, 12], [14, 7], [6, 3]] },
    { ratio: 0.6, columns: [[18, 9], [26, 13], [48, 24], [9, 5], [22, 11], [26, 13], [14, 7], [7, 3.5]] },
    { ratio: 0.65, columns: [[22, 11], [32, 16], [54, 27], [11, 6], [25, 13], [28, 14], [16, 8], [7, 3.5]] },
    { ratio: 0.7, columns: [[28, 14], [36, 18], [62, 31], [14, 7], [30, 15], [32, 16], [20, 10], [7, 3.5]] },
    { ratio: 0.75, columns: [[36, 18], [42, 21], [70, 35], [22, 11], [38, 19], [36, 18], [24, 12], [8, 4]] },
    { ratio: 0.8, columns: [[46, 23], [50, 25], [80, 40], [30, 15], [54, 27], [44, 22], [30, 15], [8, 4]] },
  ],
  anyRatio: [
    { fitting: 'abrupt-reduction', columns: [30, 15], source }, // symmetrical, diameter ratio >= 0.5
    { fitting: 'pocket-small', columns: [5, 3], source }, // thermometer pocket, diameter <= 0.03D
    { fitting: 'pocket-large', columns: [20, 10], source }, // 0.03D to 0.13D
  ],
  notes: [],
};
