import { describe, expect, it } from 'vitest';
import { dimensionNames } from '../../../src/views/words/dimensions.ts';
import { elementChoices, elementLabel } from '../../../src/views/words/elements.ts';
import { findingWords } from '../../../src/views/words/findings.ts';
import { fittingChoices } from '../../../src/views/words/fittings.ts';
import { fluidChoices } from '../../../src/views/words/fluids.ts';
import { materialChoices } from '../../../src/views/words/materials.ts';
import { remarks } from '../../../src/views/words/notes.ts';
import { problemWords } from '../../../src/views/words/problems.ts';
import { quantityNames } from '../../../src/views/words/quantities.ts';
import { workingTitles } from '../../../src/views/words/working.ts';
import { coreText, workerText } from './core-text.ts';

/** Comments may name a code that no statement makes. */
const source = new Map(
  [...coreText]
    .filter(([file]) => !/quantity\/(units|factors)\.table/.test(file))
    .map(([file, text]) => [file, text.replace(/\/\*\*?[\s\S]*?\*\/|\/\/.*/g, '')]),
);

/** Every first group of a pattern in the files whose path matches. */
function found(pattern: RegExp, path = /./): string[] {
  const texts = [...source].filter(([file]) => path.test(file)).map(([, text]) => text);
  return [...new Set(texts.flatMap((text) => [...text.matchAll(pattern)].map((match) => match[1] ?? '')))].sort();
}

/** Kebab-case literals inside the statements that make a problem. */
function problemCodes(): string[] {
  const statements = found(
    /((?:\bfail|\breport|\bwithin|\bcode\b)[^;{}]*(?:\{[^{}]*\}[^;{}]*)?;?)/g,
    /document|input|fluid|solve|quantity|registry|averaging-pitot|straight\.ts|traverse|reading|log|run\.ts/,
  );
  const literals = statements.flatMap((text) =>
    [...text.matchAll(/'([a-z]+(?:-[a-z0-9]+)+)'/g)].map((match) => match[1] ?? ''),
  );
  return [...new Set(literals)].filter((code) => !fittings.has(code) && remarks[code] === undefined).sort();
}

const fittings = new Set(fittingChoices.map(({ value }) => value));

describe('every code of the core has its words', () => {
  it('problems', () => {
    const codes = problemCodes();
    expect(codes.length).toBeGreaterThan(30);
    expect(codes.filter((code) => problemWords[code] === undefined)).toEqual([]);
  });
  it('troubles of the worker of logs', () => {
    const texts = [...workerText.values()];
    const made = texts.flatMap((text) => [...text.matchAll(/(?:trouble|OutputFull)\('([a-z-]+)'/g)]);
    const codes = [...new Set(made.map(([, code = '']) => code))];
    expect(codes.length).toBeGreaterThan(4);
    expect(codes.filter((code) => problemWords[code] === undefined)).toEqual([]);
  });
  it('and no words stand for a problem that is not there', () => {
    const whole = [...source.values(), ...workerText.values()].join('\n');
    expect(Object.keys(problemWords).filter((code) => !whole.includes(`'${code}'`))).toEqual([]);
  });
  it('findings', () => {
    const ids = found(/\bid: '([a-z]+-[a-z-]+)'/g, /reading\//)
      .concat(found(/id: '([a-z-]+)'(?!, percent)/g, /check\//))
      .concat(found(/(?:size\(subject|thickness\(subject|judge\()[, ]*'([a-z-]+)'/g, /check\//));
    expect(ids.length).toBeGreaterThan(12);
    expect(ids.filter((id) => findingWords[id] === undefined)).toEqual([]);
    const ternary = found(/id: \w+ \? '([a-z-]+)'/g, /check\//);
    expect(ternary.filter((id) => findingWords[id] === undefined)).toEqual([]);
  });
  it('working, quantities and remarks', () => {
    const ids = found(/\bid: '([A-Za-z-]+)',\s*symbol/g);
    expect(ids.length).toBeGreaterThan(12);
    expect(ids.filter((id) => workingTitles[id] === undefined)).toEqual([]);
    const quantities = found(/words: '([a-z-]+)'/g).concat(
      found(/(?:given|named)\('[^']+', [^;]+?, '([a-z]+(?:-[a-z]+)*)'\)/g, /element|fluid|result|reading/),
    );
    expect(quantities.length).toBeGreaterThan(20);
    expect(quantities.filter((code) => quantityNames[code] === undefined)).toEqual([]);
    const notes = found(/(?:remark|between|held|code): '([a-z0-9-]+)'/g, /element|result/);
    expect(notes.length).toBeGreaterThan(8);
    expect(notes.filter((code) => remarks[code] === undefined)).toEqual([]);
  });
  it('dimensions', () => {
    const ids = found(/\.(?:length|angle|ratio)\('([a-z-]+)'/g, /element/);
    expect(ids.length).toBeGreaterThan(40);
    expect(ids.filter((id) => dimensionNames[id] === undefined)).toEqual([]);
  });
  it('fittings of the tables of straight lengths', () => {
    const codes = found(/fitting: '([a-z-]+)'/g, /straight-/);
    const tables = [...coreText].filter(([file]) => file.includes('shared/straight-')).map(([, text]) => text);
    const listed = tables.flatMap((text) =>
      [...text.matchAll(/^\s+'([a-z0-9-]+)', \/\//gm)].map((match) => match[1] ?? ''),
    );
    expect(listed.length).toBeGreaterThan(25);
    expect([...codes, ...listed].filter((code) => !fittings.has(code))).toEqual([]);
  });
  it('materials, elements and fluids that can be chosen', () => {
    expect(materialChoices.map(({ value }) => value).sort()).toEqual(found(/key: '([a-z0-9-]+)'/g, /materials\.table/));
    expect(elementChoices.map(({ kind }) => kind).sort()).toEqual(
      found(/\bkind: '([a-z0-9-]+)'/g, /element\/[^/]+\.ts/),
    );
    expect(fluidChoices.map(({ value }) => value).sort()).toEqual(found(/FluidModel = \{\s*kind: '([a-z]+)'/g));
  });
});

it('names an element with its variant', () => {
  expect(elementLabel('orifice-plate.flange')).toBe('Orifice plate, flange tappings');
  expect(elementLabel('venturi-tube.as-cast')).toBe('Venturi tube, as-cast convergent');
  expect(elementLabel('isa-1932-nozzle')).toBe('ISA 1932 nozzle');
  expect(elementLabel('wedge')).toBe('wedge');
});
