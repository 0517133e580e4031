/**
 * A liquid by the user's own table of temperature, density and viscosity.
 * Standard: none; density a straight line in T, viscosity by Andrade or by ASTM D341. Symbols: SI.
 */
import { interpolate, type Point } from '../../numeric/interpolate.ts';
import { fail, type Outcome, ok, type Problem } from '../../quantity/outcome.ts';
import type { Source } from '../../quantity/source.ts';
import type { Row } from '../model.ts';
import { furthestBeyond, type Liquid } from './contract.ts';
import { andrade, walther, waltherOf } from './walther.ts';

/** How the viscosity runs between the rows: ln μ over 1/T, or the line of D341. */
export type ViscosityRule = 'andrade' | 'walther';

const byTable: Source = { clause: 'table stated by the user, between its rows', seen: 'practice' };
const ofRow = (row: Row, column: string): number => {
  const amount = row[column];
  if (amount === undefined) throw new Error(`table: expected a ${column} in every row, got none`);
  return amount.si;
};
const temperatureOf = (row: Row): number => ofRow(row, 'temperature');

/** Rows in order of rising temperature, each once, at least two. Problems: table-too-short, table-order. */
export function orderedRows(rows: readonly Row[], path: string): Outcome<readonly Row[]> {
  if (rows.length < 2) return fail('table-too-short', path, { count: rows.length });
  const problems = rows.flatMap((row, index): Problem[] => {
    const before = rows[index - 1];
    if (before === undefined || temperatureOf(row) > temperatureOf(before)) return [];
    const detail = { row: index + 1, temperature: temperatureOf(row), before: temperatureOf(before) };
    return [{ code: 'table-order', field: `${path}.${index}.temperature`, detail }];
  });
  const [first, ...rest] = problems;
  return first === undefined ? ok(rows) : { ok: false, problems: [first, ...rest] };
}

/** Kinematic viscosity of a row, m2/s; a dynamic one is divided by the density. */
export function kinematicOf(row: Row, density: number): number {
  const viscosity = row.viscosity;
  return viscosity?.measure === 'kinematic viscosity' ? viscosity.si : ofRow(row, 'viscosity') / density; // ν = μ/ρ
}

/** The points of a line by ASTM D341. Problem walther-too-thin: a row has no such point. */
export function waltherPoints(
  rows: readonly Row[],
  densityAt: (T: number) => number,
  path: string,
): Outcome<readonly Point[]> {
  const points = rows.map((row): Outcome<Point> => {
    const T = temperatureOf(row);
    const nu = kinematicOf(row, densityAt(T));
    const W = waltherOf(nu);
    return W === undefined
      ? fail('walther-too-thin', `${path}.${rows.indexOf(row)}.viscosity`, { viscosity: nu })
      : ok([T, W]);
  });
  const refused = points.find((point) => !point.ok);
  if (refused !== undefined && !refused.ok) return refused;
  return ok(points.flatMap((point) => (point.ok ? [point.value] : [])));
}

/** The liquid of a table, up to 10 K beyond its rows. Problems: those of the rows. */
export function tableLiquid(rows: readonly Row[], rule: ViscosityRule, path: string): Outcome<Liquid> {
  const ordered = orderedRows(rows, path);
  if (!ordered.ok) return ordered;
  const densities = rows.map((row): Point => [temperatureOf(row), ofRow(row, 'density')]);
  const density = (T: number): number => interpolate(densities, T);
  const viscosity = viscosityAlong(rows, rule, density, path);
  if (!viscosity.ok) return viscosity;
  const range = {
    min: temperatureOf(rows[0] as Row),
    max: temperatureOf(rows[rows.length - 1] as Row),
    below: furthestBeyond,
    above: furthestBeyond,
    source: byTable,
  };
  return ok({
    name: 'table',
    density: { ...range, at: density, remark: 'liquid-own-density' },
    viscosity: { ...range, at: viscosity.value, remark: `liquid-own-${rule}` },
    boils: false,
  });
}

function viscosityAlong(
  rows: readonly Row[],
  rule: ViscosityRule,
  density: (T: number) => number,
  path: string,
): Outcome<(T: number) => number> {
  if (rule === 'andrade') {
    const points = rows.map((row): Point => {
      const T = temperatureOf(row);
      return [T, kinematicOf(row, density(T)) * density(T)]; // μ = ρ ν
    });
    return ok((T) => andrade(points, T));
  }
  const points = waltherPoints(rows, density, path);
  return points.ok ? ok((T) => walther(points.value, T) * density(T)) : points; // μ = ρ ν
}
