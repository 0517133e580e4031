import { describe, expect, it } from 'vitest';
import { spellings } from '../../../src/core/fluid/gas/composition.table.ts';
import { componentNames } from '../../../src/core/fluid/helmholtz/components.ts';
import { liquidFamilies } from '../../../src/core/fluid/liquid/names.ts';
import { unitOf } from '../../../src/core/quantity/units.ts';
import { isTable, rowsOf } from '../../../src/views/screen/fluid/paste.ts';
import { compositionFrom, pastedComposition, repeated } from '../../../src/views/screen/fluid/paste-composition.ts';
import { pastedTable } from '../../../src/views/screen/fluid/paste-table.ts';
import { componentOf, components } from '../../../src/views/words/components.ts';
import { liquidGroups } from '../../../src/views/words/liquids.ts';

describe('cells of a pasted text', () => {
  it('are parted by tabs, by semicolons with quotes, by commas or by blanks', () => {
    expect(rowsOf('methane\t94,5\r\nN2\t5,5\r\n')).toEqual([
      ['methane', '94,5'],
      ['N2', '5,5'],
    ]);
    expect(rowsOf('"carbon; dioxide";"1,2"\n"say ""so""";2')).toEqual([
      ['carbon; dioxide', '1,2'],
      ['say so', '2'],
    ]);
    expect(rowsOf('methane,94.5')).toEqual([['methane', '94.5']]);
    expect(rowsOf('carbon dioxide 1,2 %')).toEqual([['carbon dioxide', '1,2 %']]);
    expect(rowsOf('n-butane,0,5')).toEqual([['n-butane', '0,5']]);
    expect(rowsOf('20 998,2 1,002')).toEqual([['20', '998,2', '1,002']]);
    expect(rowsOf('20,998.2,1.002')).toEqual([['20', '998.2', '1.002']]);
    expect(rowsOf('20, 998.2, 1.002')).toEqual([['20', '998.2', '1.002']]);
  });
  it('loses no-break spaces of a table copied from a page, and blank lines', () => {
    expect(rowsOf('\n methane\u00a0\t\u202f94.5 \n\n')).toEqual([['methane', '94.5']]);
  });
  it('tells a table from what belongs into one box', () => {
    expect(isTable('94,5 %')).toBe(false);
    expect(isTable('94.5\n')).toBe(false);
    expect(isTable('CH4\t94.5')).toBe(true);
    expect(isTable('94\n6')).toBe(true);
  });
});

describe('a pasted composition', () => {
  const names = (text: string) => pastedComposition(text).shares.map(({ component }) => component?.value);

  it('knows names and formulae, whatever their case, hyphens and lowered digits', () => {
    expect(names('CH₄\t90\nC2\t3\niC4\t1\nn-Butane\t1\nCarbon Dioxide (CO2)\t1\nH2S\t1\nWater vapour\t1')).toEqual([
      'methane',
      'ethane',
      'isobutane',
      'n-butane',
      'carbon-dioxide',
      'hydrogen-sulfide',
      'water',
    ]);
  });

  it('leaves header and total out, and tells the unit and basis that the header names', () => {
    const pasted = pastedComposition('Component;mol %\nmethane;94,5\nnitrogen;5,5\nTotal;100\n');
    expect(pasted).toMatchObject({ unit: '%', basis: 'mole', unread: [] });
    expect(compositionFrom(pasted, pasted.unit, {})).toEqual({ methane: '94.5 %', nitrogen: '5.5 %' });
    expect(pastedComposition('Gas\tmass fraction\nCH4\t1')).toMatchObject({ unit: '1', basis: 'mass' });
  });

  it('guesses per cent from a sum above a whole, fractions below, and keeps a unit of its own', () => {
    expect(pastedComposition('CH4\t94\nN2\t6').unit).toBe('%');
    expect(pastedComposition('CH4\t0.94\nN2\t0.06').unit).toBe('1');
    const mixed = pastedComposition('CH4\t0.99988\nH2S\t120 ppm');
    expect(compositionFrom(mixed, mixed.unit, {})).toEqual({ methane: '0.99988', 'hydrogen-sulfide': '120 ppm' });
    expect(compositionFrom(pastedComposition('CH4\t94\t%\nN2\t6\t%'), '1', {})).toEqual({
      methane: '94 %',
      nitrogen: '6 %',
    });
  });

  it('passes a running number and takes the name from where it stands', () => {
    const pasted = pastedComposition('1\tMethane\tCH4\t94\n2\tNitrogen\tN2\t6');
    expect(compositionFrom(pasted, pasted.unit, {})).toEqual({ methane: '94 %', nitrogen: '6 %' });
  });

  it('asks for what it does not know and takes nothing silently', () => {
    const pasted = pastedComposition('CH4\t94\nC6+\t3\nmystery\t2\ntrace of oil\tn.d.\nN2\t1');
    expect(pasted.shares.map(({ written, component }) => [written, component?.value])).toEqual([
      ['CH4', 'methane'],
      ['C6+', undefined],
      ['mystery', undefined],
      ['N2', 'nitrogen'],
    ]);
    expect(pasted.unread).toEqual(['trace of oil n.d.']);
    expect(compositionFrom(pasted, '%', { 1: 'n-hexane' })).toEqual({
      methane: '94 %',
      'n-hexane': '3 %',
      nitrogen: '1 %',
    });
  });

  it('points at a component that stands twice', () => {
    const { shares } = pastedComposition('butane\t1\nnC4\t2\nCH4\t97');
    expect([...repeated(shares, {})]).toEqual([1]);
    expect([...repeated(shares, { 1: 'isobutane' })]).toEqual([]);
  });

  it('reads nothing from words alone', () => {
    expect(pastedComposition('no table at all')).toMatchObject({ shares: [], unread: ['no table at all'] });
  });
});

describe('a pasted table of a liquid', () => {
  const columns = [
    { name: 'temperature', measures: ['temperature'] },
    { name: 'density', measures: ['density'] },
    { name: 'viscosity', measures: ['dynamic viscosity', 'kinematic viscosity'] },
  ] as const;
  const unit = (symbol: string, at: number) => {
    const found = unitOf(symbol, columns[at]?.measures ?? []);
    if (found === undefined) throw new Error(`expected a unit ${symbol}`);
    return found;
  };
  const usual = { temperature: unit('degC', 0), density: unit('kg/m3', 1), viscosity: unit('mPa.s', 2) };
  const read = (text: string) => pastedTable(text, columns, usual);

  it('takes its columns in the order of the form, in its units', () => {
    expect(read('20\t998,2\t1,002\n40\t992.2\t0.653').rows).toEqual([
      { temperature: '20 degC', density: '998.2 kg/m3', viscosity: '1.002 mPa.s' },
      { temperature: '40 degC', density: '992.2 kg/m3', viscosity: '0.653 mPa.s' },
    ]);
  });

  it('takes units and order from a header', () => {
    const table = read('ρ / (lb/ft3)\tν [cSt]\tT (°F)\n62.3\t1.0\t68');
    expect(table.rows).toEqual([{ temperature: '68 degF', density: '62.3 lb/ft3', viscosity: '1.0 cSt' }]);
    expect(table.units).toMatchObject({ temperature: { symbol: 'degF' }, viscosity: { symbol: 'cSt' } });
  });

  it('keeps a unit in the cell, a cell that cannot be read, and an empty one', () => {
    expect(read('68 °F;0.9982 g/cm3;thin\n80;;0.35').rows).toEqual([
      { temperature: '68 degF', density: '0.9982 g/cm3', viscosity: 'thin' },
      { temperature: '80 degC', viscosity: '0.35 mPa.s' },
    ]);
  });

  it('shows lines without figures', () => {
    expect(read('T;rho;mu\n20;998;1\nmeasured in May\n')).toMatchObject({ unread: ['measured in May'] });
  });
});

describe('the lists of names', () => {
  it('hold every component that the core knows, by every spelling', () => {
    expect(components.map(({ value }) => value).sort()).toEqual([...componentNames].sort());
    for (const [name, others] of Object.entries(spellings))
      for (const spelling of [name, ...others]) expect(componentOf(spelling)?.value, spelling).toBe(name);
  });
  it('hold every liquid that the core knows', () => {
    const offered = liquidGroups.flatMap(({ choices }) => choices.map(({ value }) => value));
    expect(offered.sort()).toEqual(Object.values(liquidFamilies).flat().sort());
  });
});
