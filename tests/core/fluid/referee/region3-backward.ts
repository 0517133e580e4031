/**
 * The backward equations v(p, T) of region 3, IAPWS SR5-05(2016): a closed form made from other coefficients than the
 * basic equation that the product solves, so that the one can judge the other. p in MPa, T in K, v in m3/kg.
 */
import { readFileSync } from 'node:fs';
import { saturationTemperature } from '../../../../src/core/fluid/if97/saturation.ts';
import type { AbsolutePressure } from '../../../../src/core/quantity/kinds.ts';

interface Subregion {
  v_star: number;
  p_star: number;
  T_star: number;
  a: number;
  b: number;
  c?: number;
  d?: number;
  e?: number;
  form: 'power' | 'exp';
  terms: [number, number, number][];
}

interface Row {
  above: number;
  upTo: number;
  sequence: string[];
  side?: 'liquid' | 'vapour' | 'both';
}

interface Table {
  borders: {
    polynomials: Record<string, number[]>;
    logarithms: Record<string, [number, number][]>;
    straight: Record<string, { slope: number; p0: number; T0: number }>;
  };
  selection: Row[];
  nearCritical: Row[];
  subregions: Record<string, Subregion>;
}

const table = JSON.parse(readFileSync(new URL('./region3-backward.json', import.meta.url), 'utf8')) as Table;

/** Temperature of a border between two subregions. SR5-05(2016), Eq. 1 to 3. */
export function borderTemperature(name: string, p: number): number {
  if (name === 'Tsat') return saturationTemperature((p * 1e6) as AbsolutePressure);
  const { polynomials, logarithms, straight } = table.borders;
  const line = straight[name];
  if (line) return line.slope * (p - line.p0) + line.T0;
  const powers = polynomials[name];
  if (powers) return powers.reduce((sum, n, k) => sum + n * p ** k, 0);
  const logs = logarithms[name];
  if (logs) return logs.reduce((sum, [I, n]) => sum + n * Math.log(p) ** I, 0);
  throw new Error(`expected a border of region 3, got ${name}`);
}

/** The subregion that holds a point of region 3. SR5-05(2016), Tables 2 and 10. */
export function subregionOf(p: number, T: number): string {
  const letter = choose(rowOf(table.selection, p), p, T);
  if (letter !== 'near-critical') return letter;
  const side = p <= 22.064 ? (T <= borderTemperature('Tsat', p) ? 'liquid' : 'vapour') : 'both';
  const rows = table.nearCritical.filter((row) => row.side === side);
  return choose(rowOf(rows, p), p, T);
}

function rowOf(rows: Row[], p: number): Row {
  const row = rows.find(({ above, upTo }) => p > above && p <= upTo);
  if (!row) throw new Error(`expected a pressure of region 3, got ${p} MPa`);
  return row;
}

/** Letters and borders alternate; a point on a border or below it takes the letter to its left. */
function choose({ sequence }: Pick<Row, 'sequence'>, p: number, T: number): string {
  const [letter, border, ...rest] = sequence;
  if (letter === undefined) throw new Error('expected a subregion, got the end of the row');
  if (border === undefined || T <= borderTemperature(border, p)) return letter;
  return choose({ sequence: rest }, p, T);
}

/** Specific volume by one subregion's equation. SR5-05(2016), Eq. 4 and 5. */
export function volumeIn(letter: string, p: number, T: number): number {
  const z = table.subregions[letter];
  if (!z) throw new Error(`expected a subregion of region 3, got ${letter}`);
  const x = p / z.p_star - z.a;
  const y = T / z.T_star - z.b;
  const { c = 1, d = 1, e = 1 } = z;
  if (z.form === 'exp') return z.v_star * Math.exp(z.terms.reduce((sum, [I, J, n]) => sum + n * x ** I * y ** J, 0));
  return z.v_star * z.terms.reduce((sum, [I, J, n]) => sum + n * (x ** c) ** I * (y ** d) ** J, 0) ** e;
}
