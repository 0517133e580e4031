/** Surveys as they are presented: their own units, what is read so far, slips that hide nothing, open checks. */
import { describe, expect, it } from 'vitest';
import type { Project, TraverseText } from '../../../src/core/document/project.ts';
import { solveTraverse } from '../../../src/core/run/traverse.ts';
import { presentSurvey } from '../../../src/views/present/survey.ts';
import { listSurvey } from '../../../src/views/present/survey-list.ts';
import { presentSurveySheet } from '../../../src/views/present/survey-sheet.ts';
import { rectangular, round } from '../../core/traverse/sample.ts';

const project = (display: 'SI' | 'US' = 'SI'): Project => ({ format: 'headwright', version: 1, display, meters: [] });

function shown(traverse: TraverseText, display: 'SI' | 'US' = 'SI') {
  const result = solveTraverse(traverse, 0, project(display));
  const solved = result.status === 'solved' ? result : result.besides;
  if (solved === undefined) throw new Error(`expected a survey, got ${JSON.stringify(result)}`);
  return presentSurvey(traverse, project(display), solved);
}

const sentence = (traverse: TraverseText): string =>
  shown(traverse)
    .answer.map(({ text }) => text)
    .join('');
const { readings: _, ...unread } = rectangular;

describe('the answer', () => {
  it('says what flows once all is read, and until then how far it is', () => {
    expect(sentence(round)).toMatch(
      /^11\u202f\d{3}\u00a0m³\/h flows through the section at a mean of 11\.\d\u00a0m\/s\.$/,
    );
    expect(sentence(unread)).toBe('25 points wait to be read.');
    expect(sentence({ ...rectangular, readings: [['61 Pa', '60 Pa']] })).toBe('2 of 25 points are read.');
  });

  it('keeps the capital of a name within the rule', () => {
    expect(shown(rectangular).under).toMatch(/ · log-Tchebycheff · /);
    expect(
      shown(rectangular)
        .suggestions.map(({ text }) => text)
        .join(),
    ).toContain(': log-Tchebycheff, ');
  });
  it('is in the units of the trade of the display', () => {
    const { answer, units } = shown(round, 'US');
    expect(answer[0]?.text).toMatch(/ft³\/min$/);
    expect(units).toEqual({ depth: 'in', differential: 'inH₂O', velocity: 'ft/min' });
  });
});

describe('the points', () => {
  it('count depths from the port where it is entered, else from the wall', () => {
    const first = (traverse: TraverseText) => shown(traverse).lines[0]?.points[0];
    expect(first(rectangular)?.depth.number).toBe('84.1');
    const { port: __, ...bare } = rectangular;
    expect(first(bare)?.depth.number).toBe('44.1');
    expect(first(bare)?.position).toEqual(first(rectangular)?.position);
  });

  it('show what was typed, digit for digit', () => {
    const points = shown({ ...unread, readings: [['61.0 Pa', '0.6 mbar']] }).lines[0]?.points ?? [];
    expect(points.map(({ differential }) => differential?.number)).toEqual([
      '61.0',
      '60.00',
      undefined,
      undefined,
      undefined,
    ]);
  });

  it('say which were moved from the wall', () => {
    const near = shown({ ...round, wallRule: 'move', probe: { kind: 'pitot-static', head: '30 mm' } });
    expect(near.lines[0]?.points.map(({ moved }) => moved)).toEqual([true, false, false, false, false, true]);
  });
});

describe('a slip in one reading', () => {
  const slipped = { ...round, readings: [['61 Pa', 'x', '85 Pa'], []] };
  it('is a problem of its field, and the others are still shown', () => {
    const result = solveTraverse(slipped, 0, project());
    expect(result.status).toBe('refused');
    expect(listSurvey(slipped, project(), result).problems.map(({ field }) => field)).toEqual(['readings.0.1']);
    expect(shown(slipped).profile.lines[0]?.points.map(({ velocity }) => velocity !== undefined)).toEqual([
      true,
      false,
      true,
      false,
      false,
      false,
    ]);
  });

  it('beside another fault shows nothing', () => {
    const result = solveTraverse({ ...slipped, section: { shape: 'circular' } }, 0, project());
    expect(result.status === 'refused' && result.besides).toBeUndefined();
  });
});

describe('verdicts and checks', () => {
  const listed = (traverse: TraverseText) => listSurvey(traverse, project(), solveTraverse(traverse, 0, project()));
  it('a survey is judged once it is read', () => {
    expect(listed(unread).verdict).toEqual({ worst: 'unchecked', words: '0 of 25 read' });
    expect(listed(round).verdict.worst).not.toBe('unchecked');
    expect(listed({ tag: 'x' }).verdict).toEqual({ worst: 'refused', words: 'not solved' });
  });

  it('what could not be checked is said under its assumption', () => {
    const open = shown(round).checks.flatMap(({ open: own }) => own);
    expect(open).toContain('Not checked: the mean null angle is not given.');
    const told = shown({ ...round, nullAngle: '3 deg' }).checks.flatMap(({ open: own }) => own);
    expect(told).not.toContain('Not checked: the mean null angle is not given.');
  });

  it('the uncertainty says what it leaves out', () => {
    expect(shown(round).certainty).toMatch(/^The uncertainty is at least .*readings/);
    const stated = { reading: '1 %', coefficient: '1 %', area: '1 %', points: '1 %', density: '1 %' };
    expect(shown({ ...round, uncertainty: { ...stated, reading: '1 % of reading' } }).certainty).toBe('');
  });
});

describe('the picture of the velocities', () => {
  it('has a scale that holds the fastest point and a mean of what is read', () => {
    const { top, mean, lines } = shown(round).profile;
    const all = lines.flatMap(({ points }) => points.flatMap(({ velocity = [] }) => velocity));
    expect(top.at).toBeGreaterThanOrEqual(Math.max(...all));
    expect(top.at).toBeLessThan(1.7 * Math.max(...all));
    expect(mean?.at).toBeGreaterThan(Math.min(...all));
    expect(shown(unread).profile.mean).toBeUndefined();
  });
});

describe('sheets', () => {
  it('the form is there before the fluid is known, with every depth of the solved one', () => {
    const { state: __, ...dry } = unread;
    const sheetOf = (traverse: TraverseText) =>
      presentSurveySheet(traverse, project(), solveTraverse(traverse, 0, project()));
    const [open, whole] = [sheetOf(dry), sheetOf(unread)];
    if (open.status !== 'refused' || whole.status !== 'survey') throw new Error('expected a form and a survey');
    expect(open.form?.survey.lines).toEqual(whole.survey.lines);
    expect(open.form?.facts).toEqual(whole.facts);
    expect(open.form?.survey).toMatchObject({ status: 'planned', state: [], results: [], checks: [] });
    expect(open.form?.survey.verdict).toEqual({ worst: 'unchecked', words: '0 of 25 read' });
    expect(open.problems.map(({ field }) => field)).toHaveLength(2);
    const result = solveTraverse(dry, 0, project());
    expect(listSurvey(dry, project(), result).progress).toEqual({ measured: 0, points: 25 });
  });

  it('a survey without a result prints why, with its inputs as written', () => {
    const sheet = presentSurveySheet(
      { tag: 'FP-9', rule: 'log-linear' },
      project(),
      solveTraverse({ tag: 'FP-9', rule: 'log-linear' }, 0, project()),
    );
    if (sheet.status !== 'refused') throw new Error('expected a refusal');
    expect(sheet.lead).toContain('no result');
    expect(sheet.inputs).toContainEqual({ field: 'Rule of the points', text: 'log-linear' });
  });
});
