/** What a unit measures, and what one row of the unit table says. */
import type { Source } from './source.ts';

/**
 * What can be asked of a field. Pressures, temperatures and volume flows that share a dimension but must not be
 * confused are different measures, as they are different kinds.
 */
export type Measure =
  | 'length'
  | 'area'
  | 'bores' // straight lengths as a multiple of the pipe bore D
  | 'absolute pressure'
  | 'gauge pressure'
  | 'pressure difference'
  | 'temperature'
  | 'temperature difference'
  | 'mass flow'
  | 'volume flow' // at the upstream state
  | 'base volume flow' // at the base state of the project
  | 'mass'
  | 'volume'
  | 'density'
  | 'dynamic viscosity'
  | 'kinematic viscosity'
  | 'velocity'
  | 'acceleration'
  | 'angle'
  | 'power'
  | 'current'
  | 'voltage'
  | 'share'
  | 'share of span'
  | 'share of reading'
  | 'molar mass';

export interface Unit {
  /** Spelling in files, for example `kg/m3`, `bar(g)`, `inH2O@60degF`. */
  readonly symbol: string;
  /** Spelling on screen and paper, for example `kg/m³`. Read back as the same unit. */
  readonly print: string;
  /** Name in words, for example `inch of water at 4 °C`. */
  readonly words: string;
  readonly measure: Measure;
  /** SI value of one unit: numbers and names of factors.table.ts joined by ` * ` and ` / `, read from left to right. */
  readonly factor: string;
  /** Decimal text added to the number before the factor is applied; absent when the scale starts at zero. */
  readonly offset?: string;
  /** Other spellings that are read, never written. */
  readonly aliases: readonly string[];
  readonly source: Source;
  /** Whether the factor holds by definition, with no measured or rounded figure in it. */
  readonly exact: boolean;
}
