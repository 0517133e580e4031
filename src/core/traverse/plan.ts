/** The plan of a traverse: every point with its place in the duct, its weight and its depth on the tube. */
import { MOST_COUNT, type TraverseInput } from '../input/traverse.ts';
import { hydraulicDiameter, type Section } from '../input/traverse-section.ts';
import { isInside } from '../numeric/bounds.ts';
import type { Length } from '../quantity/kinds.ts';
import { fail, gather, type Outcome, ok } from '../quantity/outcome.ts';
import type { Source } from '../quantity/source.ts';
import { CIRCULAR_COUNTS, circularLayout } from './circular.ts';
import type { Layout, Line } from './layout.ts';
import { singlePoint } from './profile.ts';
import { logLinearPattern, RECTANGULAR_COUNTS, rectangularLayout } from './rectangular.ts';
import { distanced, leastDistance } from './wall.ts';

export interface PlannedPoint {
  /** Distance from the inside of the wall at which the probe enters. */
  readonly position: Length;
  /** Mark on the tube, from the outer end of the port. */
  readonly depth: Length;
  readonly weight: number;
  /** Whether the wall rule took it from where the rule of the traverse has it. */
  readonly moved: boolean;
}

export interface PlannedLine {
  readonly angle?: number; // rad, of a diameter
  readonly across?: Length; // from the inside of the wall, of a line in a rectangular section
  readonly points: readonly PlannedPoint[];
}

export interface Plan {
  readonly lines: readonly PlannedLine[];
  readonly area: number; // m2
  readonly hydraulicDiameter: Length;
  /** Inside length along which the probe goes. */
  readonly reach: Length;
  readonly wall: { readonly least: Length; readonly source: Source } | undefined;
  /** The layout of the rule, before any point was moved. */
  readonly layout: Layout;
  readonly source: Source;
}

/** Where the probe goes. Problems: points-not-of-rule, choice-unknown, readings-too-many. */
export function planOf(input: TraverseInput): Outcome<Plan> {
  const layout = layoutOf(input);
  if (!layout.ok) return layout;
  const { section, port, wallRule } = input;
  const reach = reachOf(section);
  const wall = leastDistance(input);
  const lines = layout.value.lines.map((line): PlannedLine => {
    const along = distanced(line.points, wall === undefined ? 0 : wall.least / reach, wallRule);
    const points = along.map(({ at, weight, moved }) => {
      const position = (at * reach) as Length;
      return { position, depth: (port + position) as Length, weight, moved };
    });
    return { ...placeOf(line, section), points };
  });
  const excess = tooMany(input, lines);
  if (!excess.ok) return excess;
  const { source } = layout.value;
  const De = hydraulicDiameter(section);
  return ok({ lines, area: areaOf(section), hydraulicDiameter: De, reach, wall, layout: layout.value, source });
}

/** Inside area of the section, m2. */
const areaOf = (section: Section): number =>
  section.shape === 'circular' ? (Math.PI / 4) * section.diameter ** 2 : section.width * section.height;

/** Inside length of a line, from wall to wall. */
function reachOf(section: Section): Length {
  if (section.shape === 'circular') return section.diameter;
  return section.ports === 'width' ? section.height : section.width;
}

const placeOf = ({ angle, across = 0.5 }: Line, section: Section): Omit<PlannedLine, 'points'> => {
  if (section.shape === 'circular') return { angle: angle ?? 0 };
  return { across: (across * (section.ports === 'width' ? section.width : section.height)) as Length };
};

/** What is chosen of a plan, whatever the sizes of the section. */
export type Chosen = Pick<TraverseInput, 'rule' | 'lines' | 'pointsPerLine'>;

/** Whether a shape of section has a rule with so many lines and points. */
export function fits(shape: Section['shape'], chosen: Chosen): boolean {
  if (chosen.rule === 'single-point') return shape === 'circular';
  const { lines = 0 } = chosen;
  const turned = Number.isInteger(lines) && isInside(lines, { min: 1, max: MOST_COUNT });
  return (shape === 'rectangular' || turned) && layoutOf({ section: { shape }, ...chosen }).ok;
}

type Laid = Chosen & Pick<TraverseInput, 'profile'> & { readonly section: Pick<Section, 'shape'> };

function layoutOf({ section, rule, lines = 0, pointsPerLine = 0, profile }: Laid): Outcome<Layout> {
  const counted = (field: string, written: number, counts: readonly number[]): Outcome<number> =>
    counts.includes(written)
      ? ok(written)
      : fail('points-not-of-rule', field, { written, choices: counts.map(String).join(', ') });
  if (section.shape === 'circular') {
    if (rule === 'single-point') {
      if (profile === undefined) throw new Error('layoutOf: expected a profile with a single point, got none');
      return ok(singlePoint(profile));
    }
    const count = counted('pointsPerLine', pointsPerLine, CIRCULAR_COUNTS[rule]);
    return count.ok ? ok(circularLayout(rule, lines, count.value)) : count;
  }
  if (rule === 'single-point') {
    const choices = ['log-linear', ...Object.keys(RECTANGULAR_COUNTS)].join(', ');
    return fail('choice-unknown', 'rule', { written: rule, choices });
  }
  if (rule === 'log-linear') {
    const own = [
      lines === 0 ? ok(4) : counted('lines', lines, [4]),
      pointsPerLine === 0 ? ok(7) : counted('pointsPerLine', pointsPerLine, [7]),
    ];
    return own.every((count) => count.ok) ? ok(logLinearPattern()) : gather(...own);
  }
  const counts = RECTANGULAR_COUNTS[rule];
  const [over, along] = [counted('lines', lines, counts), counted('pointsPerLine', pointsPerLine, counts)];
  return over.ok && along.ok ? ok(rectangularLayout(rule, over.value, along.value)) : gather(over, along);
}

/** Readings for which the plan has no point: the plan or the readings are wrong, and nobody can say which. */
function tooMany({ readings }: TraverseInput, lines: readonly PlannedLine[]): Outcome<true> {
  const [first, ...rest] = readings.flatMap((line, at) => {
    const most = lines[at]?.points.length ?? 0;
    if (line.length <= most) return [];
    return [{ code: 'readings-too-many', field: `readings.${at}`, detail: { written: line.length, most } }];
  });
  return first === undefined ? ok(true) : { ok: false, problems: [first, ...rest] };
}
