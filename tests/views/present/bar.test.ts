/** An averaging pitot as the views print it: what it has no figure for is left out, not shown as nothing. */
import { describe, expect, it } from 'vitest';
import type { ElementText, MeterText } from '../../../src/core/document/project.ts';
import { presentSheet } from '../../../src/views/present/sheet.ts';
import { feedWater, meters, projectOf, solved } from './meters.ts';

const named = (tag: string): MeterText => {
  const meter = meters.find((one) => one.tag === tag);
  if (meter === undefined) throw new Error(`expected a meter ${tag}, got none`);
  return meter;
};
const bare: MeterText = { ...named('bar'), uncertainty: {} };
const full = named('bar in gas');
const answer = (meter: MeterText): string =>
  solved(meter)
    .presented.answer.map(({ text }) => text)
    .join('')
    .replaceAll('\u00a0', ' ');
const labels = (meter: MeterText): string[] =>
  solved(meter).presented.metal.map(({ symbol = '', value }) => `${symbol} ${value.text}`.replaceAll('\u00a0', ' '));
const withElement = (own: ElementText): MeterText => ({ ...bare, element: { ...bare.element, ...own } });

describe('the answer', () => {
  it('names K as it was entered, whichever way the question runs', () => {
    expect(answer(bare)).toMatch(/^An averaging pitot of K 0\.65 at 250 mbar passes [\d.]+ t\/h\.$/);
    expect(answer({ ...bare, find: 'differential' })).toMatch(
      /^An averaging pitot of K 0\.65 reads .+ mbar at 60 t\/h\.$/,
    );
    expect(answer(withElement({ coefficient: '.6500' }))).toContain('K .6500 at');
    expect(answer(withElement({ coefficient: '6.5e-1' }))).toContain('K 0.65 at');
  });
  it('names the K of the calibration where one stands in its place', () => {
    const calibration = [
      { reynolds: 1e5, coefficient: 0.6 },
      { reynolds: 1e8, coefficient: 0.66 },
    ];
    expect(answer(withElement({ calibration }))).toMatch(/K 0\.6[1-6]\d\d at/);
  });
  it('says below it whose figures these are, and that no uncertainty is stated', () => {
    expect(solved(bare).presented.under).toBe('bar · K on the pipe area · maker’s sheet · uncertainty not stated');
    expect(solved(full).presented.under).toMatch(/^bar in gas · K on the clear area · maker’s sheet · at least ±1\.3/);
  });
});

describe('rows and columns', () => {
  it('of the element are K and what else its sheet says', () => {
    expect(labels(bare)).toEqual(['K 0.65']);
    expect(labels(full)).toEqual(['K 0.7213', 'w 25.4 mm', 'a 0.2']);
  });
  it('of the flows have neither loss nor uncertainty where nothing says them', () => {
    const cells = Object.keys(solved(bare).presented.duty[0]?.cells ?? {});
    expect(cells).not.toContain('loss');
    expect(cells).not.toContain('uncertainty');
    expect(Object.keys(solved(full).presented.duty[0]?.cells ?? {})).toEqual(
      expect.arrayContaining(['loss', 'uncertainty']),
    );
  });
  it('of the uncertainty name K', () => {
    expect(solved(full).presented.duty[0]?.terms.map(({ label }) => label)).toContain('Flow coefficient');
  });
  it('have no head lines without a loss', () => {
    expect(solved(bare).presented).not.toHaveProperty('heads');
    expect(solved(full).presented.heads?.points).toHaveLength(5);
  });
});

describe('the certainty', () => {
  it('names everything that is not stated', () => {
    expect(solved(bare).presented.certainty).toMatch(
      /^The uncertainty cannot be said: the uncertainty of the coefficient /,
    );
    expect(solved(full).presented.certainty).toMatch(
      /^The uncertainty is at least what stands here: .*expansibility factor/,
    );
  });
  it('blames the sheet, not a standard', () => {
    const { presented } = solved({
      ...full,
      element: { ...full.element, reynoldsMin: 1e9 },
      installation: { before: '2 D', after: '5 D' },
    });
    expect(presented.certainty).toContain('outside the Reynolds numbers of the maker’s sheet');
    expect(presented.certainty).toContain('shorter than the maker’s sheet allows');
    expect(presented.chart.outside.map(({ label }) => label)).toEqual([
      'below the Reynolds numbers of the maker’s sheet',
    ]);
    expect(JSON.stringify([presented.certainty, presented.chart])).not.toContain('standard');
  });
});

describe('the curve', () => {
  it('has no band without an uncertainty, and speaks of no limits where there are none', () => {
    expect(solved(bare).presented.chart).toMatchObject({ banded: false, limited: false, outside: [] });
    expect(solved(bare).presented.chart.summary).not.toContain('Reynolds');
    expect(solved(full).presented.chart).toMatchObject({ banded: true, limited: true });
  });
});

describe('the sheet', () => {
  const sheetOf = (meter: MeterText) => {
    const project = projectOf('SI', meter);
    const sheet = presentSheet(meter, project, solved(meter).result);
    if (sheet.status === 'refused') throw new Error('expected a solved sheet, got a refusal');
    return sheet;
  };
  it('has a column for K and none for what is not known', () => {
    const columns = sheetOf(bare).duty.columns.map(({ symbol }) => symbol);
    expect(columns).toEqual(['q', 'Δp', 'Re_D', 'K', 'ε', 'V']);
    expect(sheetOf(full).duty.columns.map(({ symbol }) => symbol)).toEqual([
      'q',
      'Δp',
      'Re_D',
      'K',
      'ε',
      'Δϖ',
      'V',
      'U',
    ]);
    expect(sheetOf(feedWater).duty.columns.map(({ symbol }) => symbol)).toContain('C');
  });
  it('draws the pipe alone to scale, with the width beside the bar', () => {
    const { section, drawn } = sheetOf(full);
    expect(section).toMatchObject({ bore: '', scale: 'bar not to scale; scale of the pipe' });
    expect(section.caption).toBe('dimensions in mm; pipe bore as given, no thermal growth');
    expect(drawn.map(({ id, text }) => `${id} ${text}`)).toEqual(['bar-width 25.4\u00a0mm']);
  });
});
