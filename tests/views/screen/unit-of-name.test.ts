import { expect, it } from 'vitest';
import { unitOfName } from '../../../src/views/screen/log/unit-of-name.ts';

it.each([
  ['dp_mbar', 'mbar'],
  ['Differential [inH2O]', 'inH2O'],
  ['dp / kPa', 'kPa'],
  ['dp (Pa)', 'Pa'],
  ['dp mbar', 'mbar'],
  ['dp', undefined],
  ['dp_filtered', undefined],
  ['T_degC', undefined],
])('the name %s carries the unit %s of a differential', (name, unit) =>
  expect(unitOfName(name, ['pressure difference'])).toBe(unit),
);

it('a gauge pressure keeps its reference, and a bare bar is none', () => {
  const measures = ['gauge pressure', 'absolute pressure'] as const;
  expect([
    unitOfName('p / bar(g)', measures),
    unitOfName('p [bar(a)]', measures),
    unitOfName('p_bar', measures),
  ]).toEqual(['bar(g)', 'bar(a)', undefined]);
});
