/** A traverse as the file contract writes it. Velocities are listed once every point is read; until then by point. */
import type { SolvedTraverse } from '../../core/result/record.ts';
import type { Print } from '../words/print.ts';
import { type Asked, checkOf } from './checks.ts';

export function traverseOf(result: SolvedTraverse, print: Print, { working = false }: Asked): object {
  const { lines, flow, quality, uncertainty, checks } = result;
  const { reynolds, ...flows } = flow ?? {};
  const complete = result.measured === result.points;
  return {
    tag: result.tag,
    status: result.status,
    rule: result.rule,
    area_m2: result.area_m2,
    state: result.state,
    positions_m: lines.map(({ points }) => points.map(({ position_m }) => position_m)),
    depths_m: lines.map(({ points }) => points.map(({ depth_m }) => depth_m)),
    weights: lines.map(({ points }) => points.map(({ weight }) => weight)),
    ...(complete
      ? { velocities_m_s: lines.map(({ points }) => points.flatMap(({ velocity_m_s = [] }) => velocity_m_s)) }
      : {}),
    ...flows,
    ...(reynolds === undefined ? {} : { reynolds }),
    points: result.points,
    measured: result.measured,
    ...(complete ? {} : { read: readOf(result) }),
    ...(quality === undefined ? {} : { quality }),
    ...(uncertainty === undefined ? {} : { uncertainty: sourced(uncertainty) }),
    suggestions: result.suggestions.map(sourced),
    checks: checks.map((finding) => checkOf(finding, print)),
    ...(working ? { working: result.working } : {}),
  };
}

/** A figure with its source in two words. */
const sourced = <Figure extends { readonly source: SolvedTraverse['sources'][number] }>({
  source,
  ...figure
}: Figure): object => ({
  ...figure,
  source: source.clause,
  seen: source.seen,
});

/** The points that are read so far, where not all of them are. */
const readOf = ({ lines }: SolvedTraverse): object[] =>
  lines.flatMap(({ points }, line) =>
    points.flatMap(({ number, differential_Pa, velocity_m_s }) =>
      velocity_m_s === undefined ? [] : [{ line: line + 1, number, differential_Pa, velocity_m_s }],
    ),
  );
