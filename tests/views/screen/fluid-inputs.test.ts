import { describe, expect, it } from 'vitest';
import { unitOf } from '../../../src/core/quantity/units.ts';
import { solveSite } from '../../../src/core/run/site.ts';
import { solveTraverse } from '../../../src/core/run/traverse.ts';
import { solveMeter } from '../../../src/core/run.ts';
import { createWorkbench } from '../../../src/state/create.ts';
import { compositionSum } from '../../../src/views/present/composition.ts';
import {
  compositionIn,
  entriesOf,
  inUnit,
  renamed,
  tableUnit,
  without,
  withShare,
} from '../../../src/views/screen/fluid/composition.ts';
import { LIQUID_TABLE } from '../../../src/views/screen/fluid/liquid-columns.ts';
import { columnUnit, convertedCell, fileCell, rowsIn, shownCell } from '../../../src/views/screen/fluid/rows.ts';
import { convertShare, fileShare, shownShare, unitOfShare } from '../../../src/views/screen/fluid/share.ts';
import { baseStateChoices, baseStateNamed, baseStateOf, usualBase } from '../../../src/views/words/base-states.ts';

describe('shares', () => {
  it('are written in the unit of their box, or in their own', () => {
    expect(fileShare('94,5', '%')).toBe('94.5 %');
    expect(fileShare('0,945', '1')).toBe('0.945');
    expect(fileShare('94 mol %', '1')).toBe('94 %');
    expect(fileShare('120 ppm', '%')).toBe('120 ppm');
    expect(fileShare('', '%')).toBe('');
    expect(fileShare('much', '%')).toBe('much');
    expect(fileShare('94 kg', '%')).toBe('94 kg');
  });
  it('stand without the unit of their box', () => {
    expect(shownShare('94.5 %', '%')).toBe('94.5');
    expect(shownShare('94.5 %', '1')).toBe('94.5 %');
    expect(shownShare('0.945', '1')).toBe('0.945');
    expect(shownShare('much', '%')).toBe('much');
  });
  it.each([
    ['94.5 %', '1', '0.945'],
    ['0.945', '%', '94.5 %'],
    ['120 ppm', '%', '0.012 %'],
    ['0.1 %', '1', '0.001'],
    ['29 %', '1', '0.29'],
    ['much', '1', 'much'],
  ] as const)('%s in %s is %s, no digit more', (text, unit, converted) => {
    expect(convertShare(text, unit)).toBe(converted);
  });
  it('say the unit they are written in', () => {
    expect([unitOfShare('94 %'), unitOfShare('0.9'), unitOfShare('3 ppm'), unitOfShare('')]).toEqual([
      '%',
      '1',
      'ppm',
      undefined,
    ]);
  });
});

describe('a composition', () => {
  const gas = { methane: '94 %', nitrogen: 0.04, 'carbon-dioxide': '' };
  it('keeps the order of its names through every change', () => {
    expect(Object.keys(renamed(gas, 'methane', 'ethane'))).toEqual(['ethane', 'nitrogen', 'carbon-dioxide']);
    expect(Object.keys(withShare(gas, 'nitrogen', '5 %'))).toEqual(Object.keys(gas));
    expect(Object.keys(without(gas, 'nitrogen') ?? {})).toEqual(['methane', 'carbon-dioxide']);
    expect(without({ methane: '1' }, 'methane')).toBeUndefined();
  });
  it('never loses a share to a name that is already there', () => {
    expect(renamed(gas, 'methane', 'nitrogen')).toBe(gas);
  });
  it('shows what a file may hold and takes nothing for granted', () => {
    expect(entriesOf(gas).map(({ text }) => text)).toEqual(['94 %', '0.04', '']);
    for (const none of [undefined, null, 'methane', 7, ['methane']]) expect(compositionIn(none)).toEqual({});
    expect(entriesOf({ methane: { much: 1 } })).toEqual([{ name: 'methane', text: '' }]);
  });
  it('changes its unit without changing a figure', () => {
    expect(tableUnit(gas)).toBe('%');
    const fractions = inUnit(gas, '1');
    expect(fractions).toEqual({ methane: '0.94', nitrogen: '0.04', 'carbon-dioxide': '' });
    expect(tableUnit(fractions)).toBe('1');
    expect(inUnit(fractions, '%')).toEqual({ methane: '94 %', nitrogen: '4 %', 'carbon-dioxide': '' });
  });
  it('adds up, and says what is missing', () => {
    const sum = (...texts: readonly string[]) => {
      const { sum: whole, missing, above, count } = compositionSum(texts);
      return [whole.plain, missing?.plain, above?.plain, count];
    };
    expect(sum('94 %', '0.05')).toEqual(['99 %', '1 %', undefined, 2]);
    expect(sum('94 %', '7 %', '', 'much')).toEqual(['101 %', undefined, '1 %', 2]);
    expect(sum('10 %', '20 %', '70 %')).toEqual(['100 %', undefined, undefined, 3]); // 0.1 + 0.2 + 0.7 in doubles
    expect(sum()).toEqual(['0 %', '100 %', undefined, 0]);
  });
});

describe('the table of a liquid', () => {
  const [temperature, density, viscosity] = LIQUID_TABLE;
  const column = (one: (typeof LIQUID_TABLE)[number] | undefined) => {
    if (one === undefined) throw new Error('expected a column, got none');
    return one;
  };
  const unit = (symbol: string, of: (typeof LIQUID_TABLE)[number]) => {
    const found = unitOf(symbol, of.kind.measures);
    if (found === undefined) throw new Error(`expected a unit, got ${symbol}`);
    return found;
  };
  it('writes the unit of the column and shows the number alone', () => {
    const T = column(temperature);
    expect(fileCell('20,5', T, unit('degC', T))).toBe('20.5 degC');
    expect(fileCell('68 F', T, unit('degC', T))).toBe('68 degF');
    expect(fileCell('68 ells', T, unit('degC', T))).toBe('68 ells'); // what cannot be read stays, with its problem
    expect(shownCell('20.5 degC', T, unit('degC', T))).toBe('20.5');
    expect(shownCell('68 degF', T, unit('degC', T))).toBe('68 degF');
  });
  it('takes the unit of its first readable row', () => {
    const rows = rowsIn([{ density: 'thick' }, { density: '62.3 lb/ft3' }]);
    expect(columnUnit(rows, column(density))?.symbol).toBe('lb/ft3');
    expect(rowsIn('no list')).toEqual([]);
  });
  it('converts a column, but no viscosity of one kind into one of the other', () => {
    const mu = column(viscosity);
    expect(convertedCell('1 cP', mu, unit('Pa.s', mu))).toBe('0.001 Pa.s');
    expect(convertedCell('1 cP', mu, unit('cSt', mu))).toBe('1 cP');
    expect(convertedCell('68 degF', column(temperature), unit('degC', column(temperature)))).toBe('20 degC');
  });
});

describe('base states', () => {
  it('are known by their texts, and the usual one is in the list', () => {
    for (const { value } of baseStateChoices) {
      const state = baseStateOf(value);
      expect(state && baseStateNamed(state)).toBe(value);
    }
    expect(baseStateNamed(usualBase)).toBe('iso-13443');
    expect(baseStateNamed({ temperature: '16 degC', pressure: '1 bar(a)' })).toBe('');
  });
  it('of the list can all be computed', () => {
    const store = createWorkbench({ solveMeter, solveTraverse, solveSite });
    const meter = {
      fluid: { kind: 'gas', composition: { methane: '100 %' } },
      upstream: { pressure: '8 bar(g)', temperature: '15 degC' },
      pipe: { bore: '154.05 mm' },
      element: { kind: 'orifice-plate', tappings: 'flange' },
      duty: { maximum: '12000 base m3/h' },
      differential: '250 mbar',
      find: 'bore' as const,
    };
    store.getState().open({ format: 'headwright', version: 1, meters: [meter] }, '');
    const flows = baseStateChoices.map(({ value }) => {
      store.getState().writeProject('base', baseStateOf(value));
      const result = store.getState().results.results[0];
      return result?.status === 'solved' ? result.points.maximum?.massFlow_kg_s : undefined;
    });
    expect(flows.every((flow) => flow !== undefined && flow > 2)).toBe(true);
    expect(new Set(flows).size).toBe(flows.length);
  });
});
