/** The points of a survey in the order of measuring, and the picture of their velocities. */
import { fromSI } from '../../core/quantity/units.ts';
import type { TraverseFigures } from '../../core/result/traverse-record.ts';
import { pointsRead, surveyWords as words } from '../words/surveys.ts';
import type { Context } from './context.ts';
import type { Value } from './model.ts';
import type { PresentedSurvey, SurveyLine, SurveyPoint, SurveyProfile } from './survey-model.ts';
import { written } from './units.ts';

type Figures = Pick<Context, 'value' | 'units'>;

export function linesOf(at: Context, { lines, port_m }: TraverseFigures, readings: unknown): readonly SurveyLine[] {
  return lines.map(({ points, across_m, angle_rad, meanVelocity_m_s }, line): SurveyLine => {
    const place =
      across_m !== undefined
        ? words.at(at.value(across_m, 'depth').text)
        : lines.length === 1 || angle_rad === undefined
          ? ''
          : words.turned(at.value(angle_rad, 'angle').text);
    return {
      at: line,
      title: words.line(line + 1),
      place: line === 0 && across_m === undefined ? '' : place,
      points: points.map((point, order) => {
        const text = textIn(readings, line, order);
        return pointOf(at, { ...point, text }, line, order, port_m > 0);
      }),
      ...(meanVelocity_m_s === undefined ? {} : { mean: at.value(meanVelocity_m_s, 'velocity') }),
      ...(across_m === undefined ? {} : { across_m }),
      ...(angle_rad === undefined ? {} : { angle_rad }),
    };
  });
}

type Point = TraverseFigures['lines'][number]['points'][number] & { readonly text: unknown };

/** What is written for a point; a file may hold anything there. */
function textIn(readings: unknown, line: number, point: number): unknown {
  const own: unknown = Array.isArray(readings) ? readings[line] : undefined;
  return Array.isArray(own) ? own[point] : undefined;
}

/** As it was read, where that is in the unit of the column. */
function differentialOf(at: Context, text: unknown, si: number): Value {
  const own = at.given(text, ['pressure difference'], si, 'differential');
  return own.unit === at.units.differential.print ? own : at.value(si, 'differential');
}

function pointOf(at: Context, point: Point, line: number, order: number, fromPort: boolean): SurveyPoint {
  const { number, position_m, depth_m, weight, moved, differential_Pa, velocity_m_s } = point;
  return {
    number,
    line,
    point: order,
    depth: at.value(fromPort ? depth_m : position_m, 'depth'),
    position: at.value(position_m, 'depth'),
    weight: at.value(weight, 'factor'),
    moved,
    position_m,
    ...(differential_Pa === undefined ? {} : { differential: differentialOf(at, point.text, differential_Pa) }),
    ...(velocity_m_s === undefined ? {} : { velocity: at.value(velocity_m_s, 'velocity'), velocity_m_s }),
  };
}

/** Inside length of the lines, m. */
export function reachOf({ section }: TraverseFigures): number {
  if (section.shape === 'circular') return section.diameter_m;
  return section.ports === 'width' ? section.height_m : section.width_m;
}

/** Steps of the scale of velocities: 1, 2, 5 in each power of ten, in pairs. */
const STEPS = [1, 1.2, 1.6, 2, 2.4, 3, 4, 5, 6, 8, 10];

export function profileOf(at: Figures, result: TraverseFigures): SurveyProfile {
  const { quality, flow, lines, measured, points } = result;
  const unit = at.units.velocity;
  const shown = (si: number): number => fromSI(si, unit);
  const reach = reachOf(result);
  const top = scaleTop(shown(quality?.mostVelocity_m_s ?? 0));
  const mark = (share: number): { at: number; text: string } => ({ at: share * top, text: String(share * top) });
  const mean = flow?.meanVelocity_m_s ?? quality?.meanSoFar_m_s;
  return {
    lines: lines.map((line, index) => ({
      at: index,
      title: words.line(index + 1),
      points: line.points.map(({ number, position_m, velocity_m_s }) => ({
        number,
        at: position_m / reach,
        ...(velocity_m_s === undefined ? {} : { velocity: shown(velocity_m_s) }),
      })),
      ...(line.meanVelocity_m_s === undefined ? {} : { mean: shown(line.meanVelocity_m_s) }),
    })),
    mean: mean === undefined ? undefined : { at: shown(mean), text: at.value(mean, 'velocity').text },
    top: mark(1),
    half: mark(0.5),
    unit: unit.print,
    summary: summaryOf(at, result, pointsRead(measured, points)),
  };
}

/** The next step at or above a velocity; 10 before anything is read. */
function scaleTop(most: number): number {
  if (most <= 0) return 10;
  const power = 10 ** Math.floor(Math.log10(most));
  const step = STEPS.find((one) => one * power >= most * (1 + 1e-9)) ?? 12;
  return Number((step * power).toPrecision(6));
}

function summaryOf(at: Figures, { quality }: TraverseFigures, progress: string): string {
  if (quality === undefined) return `${progress}.`;
  const figure = (si: number): string => at.value(si, 'velocity').text;
  const [least, most] = [figure(quality.leastVelocity_m_s), figure(quality.mostVelocity_m_s)];
  return `${progress}. The velocities lie from ${least} to ${most}, their mean is ${figure(quality.meanSoFar_m_s)}.`;
}

/** The section in words: '900 mm by 600 mm', as it is written where it is at home in the display. */
export function sectionText(
  at: Context,
  { section }: TraverseFigures,
  texts: Readonly<Record<string, unknown>>,
): string {
  const side = (name: string, si: number): Value => {
    const read = written(texts[name], ['length']);
    return read === undefined ? at.value(si, 'length') : at.given(texts[name], ['length'], si, 'length');
  };
  if (section.shape === 'circular') return side('diameter', section.diameter_m).text;
  return `${side('width', section.width_m).text} by ${side('height', section.height_m).text}`;
}

/** Marks for tube and table. */
export const unitsOf = (at: Figures): PresentedSurvey['units'] => ({
  depth: at.units.depth.print,
  differential: at.units.differential.print,
  velocity: at.units.velocity.print,
});
