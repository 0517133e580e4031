import { describe, expect, it } from 'vitest';
import { unitOf } from '../../../src/core/quantity/units.ts';
import { echoOf } from '../../../src/views/screen/field/echo.ts';
import { QUANTITIES, quantityKind, SHARED_KINDS } from '../../../src/views/screen/field/quantities.ts';
import { split, unitMenu } from '../../../src/views/screen/field/split.ts';
import { textAt, valueAt } from '../../../src/views/screen/text.ts';
import { fieldLabel } from '../../../src/views/words/fields.ts';

describe('quantity fields', () => {
  it.each(Object.entries(QUANTITIES))('%s starts in units it can read and has a label', (path, { measures, unit }) => {
    expect(unitOf(unit.SI, measures)).toBeDefined();
    expect(unitOf(unit.US, measures)).toBeDefined();
    expect(unitMenu(measures).every(({ units }) => units.length > 0)).toBe(true);
    expect(fieldLabel(path)).not.toBe(path);
  });

  it.each(Object.entries(SHARED_KINDS))('%s starts in units it can read', (_, { measures, unit }) => {
    expect(unitOf(unit.SI, measures)).toBeDefined();
    expect(unitOf(unit.US, measures)).toBeDefined();
  });

  it('throws a defect for a path that is no quantity', () => {
    expect(() => quantityKind('tag')).toThrow('expected a quantity field, got tag');
  });

  it('shows the number as written, apart from its unit', () => {
    expect(split('102.260 mm', ['length'])).toMatchObject({ number: '102.260', unit: { symbol: 'mm' } });
    expect(split('7 bar(g)', ['gauge pressure', 'absolute pressure'])).toMatchObject({
      number: '7',
      unit: { symbol: 'bar(g)' },
    });
  });

  it('keeps a text whole that it cannot read', () => {
    expect(split('250 mbar(g)', ['pressure difference'])).toEqual({ number: '250 mbar(g)', unit: undefined });
    expect(split('', ['length'])).toEqual({ number: '', unit: undefined });
  });

  it('says what was read only where it is spelled otherwise', () => {
    expect(echoOf('250', '250 mbar', ['pressure difference'])).toBe('');
    // 1 inch of water at 4 degC, conventional: 249.08891 Pa (ISO 80000-4 and NIST SP 811, B.8)
    expect(echoOf('12 inH2O', '12 inH2O', ['pressure difference'])).toContain('2989.07');
    expect(echoOf('abc', 'abc', ['pressure difference'])).toBe('');
  });
});

describe('text of a project that may hold anything', () => {
  it('reads by path and takes nothing for granted', () => {
    expect(textAt({ upstream: { pressure: '7 bar(g)' } }, 'upstream.pressure')).toBe('7 bar(g)');
    expect(textAt({ fluid: { isentropicExponent: 1.3 } }, 'fluid.isentropicExponent')).toBe('1.3');
    for (const root of [undefined, null, 7, 'meter', [], { upstream: null }, { upstream: { pressure: {} } }])
      expect(textAt(root, 'upstream.pressure')).toBe('');
    expect(valueAt({ list: ['a', 'b'] }, 'list.1')).toBe('b');
  });
});
