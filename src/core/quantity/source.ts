/**
 * Where a figure comes from. It travels with every limit, table and coefficient set, to the screen and the sheet.
 *
 * `read`        seen in the standard, a release or a public copy of it
 * `second-hand` seen only through an open library or a reprint that quotes the standard
 * `memory`      from memory: "check against your copy"
 * `derived`     derived here, from the named relation
 * `practice`    custom of the trade, not a standard
 */
export type Seen = 'read' | 'second-hand' | 'memory' | 'derived' | 'practice';

export interface Source {
  /** Document and clause, for example `ISO 5167-2:2022, 5.3.1`. */
  readonly clause: string;
  readonly seen: Seen;
}
