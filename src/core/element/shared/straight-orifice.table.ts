/**
 * Straight lengths for orifice plates, multiples of D from the face of the plate, columns A and B.
 * Source: ISO 5167-2:2003, Table 3. S is the gap between the ends of the curved parts of two bends.
 */
import type { StraightTable } from './straight.ts';

const source = { clause: 'ISO 5167-2:2003, 6.2, Table 3', seen: 'read' } as const;
const memory = { clause: 'ISO 5167-2:2003, Table 3, footnotes', seen: 'memory' } as const;

/** The first row stands for beta <= 0.2. */
export const orificeLengths: StraightTable = {
  source,
  fittings: [
    'single-bend', // one 90 degree bend, or two in any planes, S > 30D
    'two-bends-same-plane-far', // S-shaped, 10D < S <= 30D
    'two-bends-same-plane-close', // S-shaped, S <= 10D
    'two-bends-perpendicular-far', // 5D <= S <= 30D
    'two-bends-perpendicular-close', // S < 5D
    'tee-or-mitre', // one 90 degree tee, with or without extension, or mitre bend
    'bend-45', // one 45 degree bend, or two in one plane, S >= 2D
    'reducer', // concentric, 2D to D over 1.5D to 3D
    'expander', // concentric, 0.5D to D over D to 2D
    'full-bore-valve', // ball or gate valve, fully open
    'abrupt-reduction', // abrupt, symmetrical
    'pocket-small', // thermometer pocket, diameter <= 0.03D
    'downstream', // any of the fittings above, and a densitometer pocket
  ],
  rows: [
    {
      ratio: 0.2,
      columns: [[6, 3], [10], [10], [19, 18], [34, 17], [3], [7], [5], [6], [12, 6], [30, 15], [5, 3], [4, 2]],
    },
    {
      ratio: 0.4,
      columns: [[16, 3], [10], [10], [44, 18], [50, 25], [9, 3], [30, 9], [5], [12, 8], [12, 6], [30, 15], [5, 3], [6, 3]],
    },
    {
      ratio: 0.5,
      columns: [[22, 9], [18, 10], [22, 10], [44, 18], [75, 34], [19, 9], [30, 18], [8, 5], [20, 9], [12, 6], [30, 15], [5, 3], [6, 3]],
    },
    {
      ratio: 0.6,
      columns: [[42, 13], [30, 18], [42, 18], [44, 18], [65, 25], [29, 18], [30, 18], [9, 5], [26, 11], [14, 7], [30, 15], [5, 3], [7, 3.5]],
    },
    {
      ratio: 0.67,
      columns: [[44, 20], [44, 18], [44, 20], [44, 20], [60, 18], [36, 18], [44, 18], [12, 6], [28, 14], [18, 9], [30, 15], [5, 3], [7, 3.5]],
    },
    {
      ratio: 0.75,
      columns: [[44, 20], [44, 18], [44, 22], [44, 20], [75, 18], [44, 18], [44, 18], [13, 8], [36, 18], [24, 12], [30, 15], [5, 3], [8, 4]],
    },
  ],
  anyRatio: [
    { fitting: 'pocket-large', columns: [20, 10], source: memory }, // 0.03D to 0.13D, footnote d
  ],
  notes: [
    {
      fitting: 'two-bends-perpendicular-close', // footnote h: S < 2D
      code: 'straight-perpendicular-high-reynolds',
      source: memory,
      replaces: { ratio: 0.6, full: 95, aboveReynolds: 2e6 },
    },
    { fitting: 'two-bends-perpendicular-close', code: 'straight-perpendicular-conditioner', source: memory },
  ],
};
