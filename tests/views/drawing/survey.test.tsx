/** The section of a survey and its velocities: to scale, every point drawn once, numbers clear of each other. */
import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import type { TraverseText } from '../../../src/core/document/project.ts';
import { SurveyProfile } from '../../../src/views/drawing/SurveyProfile.tsx';
import { SurveySection } from '../../../src/views/drawing/SurveySection.tsx';
import { surveyLayout } from '../../../src/views/drawing/survey-layout.ts';
import { presentSurvey } from '../../../src/views/present/survey.ts';
import { rectangular, round, solved } from '../../core/traverse/sample.ts';

const survey = (traverse: TraverseText) =>
  presentSurvey(traverse, { format: 'headwright', version: 1, meters: [] }, solved(traverse));
const box = { width: 400, height: 280, type: 10 };
const layoutOf = (traverse: TraverseText) => surveyLayout(survey(traverse).shape, box);

const plans: readonly (readonly [name: string, traverse: TraverseText])[] = [
  ['two diameters', round],
  ['three diameters of ten', { ...round, lines: 3, pointsPerLine: 10, readings: [] }],
  ['a grid', rectangular],
  ['a grid from the side', { ...rectangular, section: { ...rectangular.section, ports: 'height' } }],
  ['the pattern of 26', { ...rectangular, rule: 'log-linear', lines: 4, pointsPerLine: 7, readings: [] }],
  [
    'a single point',
    { ...round, rule: 'single-point', profile: { kind: 'power', at: 'centre' }, readings: [['61 Pa']] },
  ],
];

describe.each(plans)('%s', (_name, traverse) => {
  const { outline, spots, ports, width, height } = layoutOf(traverse);
  it('has every point once, inside the wall, and a port for every line', () => {
    const plan = survey(traverse);
    expect(spots.map(({ number }) => number)).toEqual(
      plan.lines.flatMap(({ points }) => points.map((one) => one.number)),
    );
    expect(ports.map(({ title }) => title)).toEqual(plan.lines.map(({ at }) => String(at + 1)));
    for (const { x, y } of spots) {
      if (outline.shape === 'circle') expect(Math.hypot(x - outline.x, y - outline.y)).toBeLessThan(outline.radius);
      else {
        expect(x).toBeGreaterThan(outline.x);
        expect(x).toBeLessThan(outline.x + outline.width);
        expect(y).toBeGreaterThan(outline.y);
        expect(y).toBeLessThan(outline.y + outline.height);
      }
    }
  });
  it('keeps numbers inside the picture and clear of each other', () => {
    const labels = spots.flatMap(({ label, number }) => (label ? [{ ...label, number }] : []));
    expect(labels.length).toBeGreaterThan(0);
    for (const one of labels) {
      expect(one.x).toBeGreaterThan(0);
      expect(one.x).toBeLessThan(width);
      expect(one.y).toBeLessThan(height);
      const others = labels.filter(({ number }) => number !== one.number);
      expect(others.every(({ x, y }) => Math.hypot(x - one.x, y - one.y) > 7)).toBe(true);
    }
  });
});

it.each([92, 168, 280])('names every point of two diameters of six, %i high', (height) => {
  const six = { ...round, lines: 2, pointsPerLine: 6, readings: [] };
  const { spots } = surveyLayout(survey(six).shape, { ...box, height });
  const named = spots.filter(({ label }) => label !== undefined).map(({ number }) => number);
  if (height < 168) expect(named.length).toBeLessThan(12);
  else expect(named).toEqual(spots.map(({ number }) => number));
});

it('is to scale, and the probe goes in from the side that holds the ports', () => {
  const { outline, spots, ports } = layoutOf(rectangular);
  if (outline.shape !== 'rect') throw new Error('expected a rectangle');
  expect(outline.width / outline.height).toBeCloseTo(1.5, 9);
  const points = survey(rectangular).lines[0]?.points ?? [];
  expect(((spots[1]?.y ?? 0) - outline.y) / outline.height).toBeCloseTo((points[1]?.position_m ?? 0) / 0.6, 9);
  expect(ports.every(({ to }) => Math.abs(to[1] - outline.y) < 1e-9)).toBe(true);
  const side = layoutOf({ ...rectangular, section: { ...rectangular.section, ports: 'height' } });
  expect(side.ports.every(({ from, to }) => from[0] < to[0])).toBe(true);
});

it('puts the points of a diameter on both sides of the axis, the first below its port on top', () => {
  const { outline, spots } = layoutOf(round);
  if (outline.shape !== 'circle') throw new Error('expected a circle');
  const points = survey(round).lines[0]?.points ?? [];
  for (const [at, { position_m }] of points.entries()) {
    expect(spots[at]?.x).toBeCloseTo(outline.x, 9);
    const share = ((spots[at]?.y ?? 0) - (outline.y - outline.radius)) / (2 * outline.radius);
    expect(share).toBeCloseTo(position_m / 0.6, 9);
  }
});

describe('the markup', () => {
  const half: TraverseText = { ...round, readings: [['61 Pa', '74 Pa', '', '86 Pa', '75 Pa', '60 Pa']] };
  it('names the pictures, marks the point at hand and joins neighbours that are read', () => {
    const section = renderToStaticMarkup(<SurveySection survey={survey(half)} width={400} height={280} current={3} />);
    expect(section).toContain('Section of the duct with its points');
    expect(section.match(/data-point="\d+"/g)).toHaveLength(12);
    expect(section.match(/class="[^"]*ring[^"]*"/g)).toHaveLength(1);
    const { profile } = survey(half);
    const picture = renderToStaticMarkup(<SurveyProfile profile={profile} width={500} height={240} current={3} />);
    expect(picture).toContain(profile.summary);
    expect(picture.match(/<circle/g)).toHaveLength(5);
    const curve = /class="[^"]*curve[^"]*" d="([^"]+)"/.exec(picture)?.[1] ?? '';
    expect(curve.match(/M/g)).toHaveLength(2); // parted at the open point
  });

  it('a moved point is a square', () => {
    const moved = survey({ ...round, wallRule: 'move', probe: { kind: 'pitot-static', head: '30 mm' } });
    const markup = renderToStaticMarkup(<SurveySection survey={moved} width={400} height={280} />);
    expect(markup.match(/<rect[^>]*class="[^"]*read/g)).toHaveLength(4);
  });
});
