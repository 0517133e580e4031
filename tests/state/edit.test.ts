import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { writeAt } from '../../src/state/edit.ts';

describe('writeAt', () => {
  test('writes nested keys and leaves what is beside them the same object', () => {
    const root = { pipe: { bore: '1 m' }, fluid: { kind: 'water' } };
    const next = writeAt(root, 'pipe.material', 'carbon-steel');
    expect(next).toEqual({ pipe: { bore: '1 m', material: 'carbon-steel' }, fluid: { kind: 'water' } });
    expect(next.fluid).toBe(root.fluid);
    expect(root.pipe).toEqual({ bore: '1 m' });
  });

  test('removes on empty text and on undefined, with the parents that it leaves empty', () => {
    const root: Record<string, unknown> = {
      tag: 'FE-1',
      upstream: { pressure: '7 bar(g)' },
      deep: { er: { still: '1' } },
    };
    expect(writeAt(root, 'upstream.pressure', '')).toEqual({ tag: 'FE-1', deep: { er: { still: '1' } } });
    expect(writeAt(root, 'deep.er.still', undefined)).toEqual({ tag: 'FE-1', upstream: { pressure: '7 bar(g)' } });
    expect(writeAt({ tag: 'FE-1' }, 'tag', '')).toEqual({});
  });

  test('gives back the same object where nothing changes', () => {
    const root: Record<string, unknown> = { tag: 'FE-1', preparedBy: '', fluid: {} };
    for (const [path, value] of [
      ['tag', 'FE-1'],
      ['preparedBy', ''],
      ['pipe.bore', ''],
      ['pipe.bore', undefined],
      ['a.0.b', ''],
    ]) {
      expect(writeAt(root, path ?? '', value)).toBe(root);
    }
  });

  test('counts rows of a list, adds one at its end and keeps the places of rows that follow an emptied one', () => {
    const one = writeAt({}, 'element.calibration.0.reynolds', '1e5');
    expect(one).toEqual({ element: { calibration: [{ reynolds: '1e5' }] } });
    const two = writeAt(one, 'element.calibration.1.reynolds', '2e5');
    const gap = writeAt(two, 'element.calibration.0.reynolds', '');
    expect(gap).toEqual({ element: { calibration: [{}, { reynolds: '2e5' }] } });
    expect(writeAt(gap, 'element.calibration.1.reynolds', '')).toEqual({});
    expect(writeAt(two, 'element.calibration.0', undefined)).toEqual({
      element: { calibration: [{ reynolds: '2e5' }] },
    });
    expect(() => writeAt({}, 'element.calibration.7.reynolds', '1')).toThrow('expected a row up to 0, got 7');
  });

  test('keeps keys it does not know', () => {
    const root = { log: { time: 'timestamp' }, pipe: { bore: '1 m', coating: ['epoxy'] } };
    expect(writeAt(root, 'pipe.bore', '2 m')).toEqual({
      log: { time: 'timestamp' },
      pipe: { bore: '2 m', coating: ['epoxy'] },
    });
  });

  test('reaches no prototype', () => {
    for (const path of [
      '__proto__.polluted',
      'constructor.prototype.polluted',
      'pipe.__proto__.polluted',
      'prototype',
      'a..b',
      '',
    ]) {
      expect(() => writeAt({}, path, 'yes')).toThrow('expected a path');
    }
    const inherited = writeAt({}, 'toString.length', '9');
    expect(Object.hasOwn(inherited, 'toString')).toBe(true);
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
    expect(Object.prototype.toString.length).toBe(0);
  });

  test('what was written is read, and removed again it leaves the text as it was', () => {
    const key = fc.constantFrom('a', 'b', 'c', 'bore', 'kind');
    const path = fc.array(key, { minLength: 1, maxLength: 4 }).map((keys) => keys.join('.'));
    const leaf = fc.string({ minLength: 1 });
    fc.assert(
      fc.property(fc.array(fc.tuple(path, leaf), { maxLength: 8 }), path, leaf, (writes, at, value) => {
        const root = writes.reduce<Record<string, unknown>>((node, [where, what]) => writeAt(node, where, what), {});
        const before = JSON.stringify(root);
        const next = writeAt(root, at, value);
        expect(at.split('.').reduce<unknown>((node, part) => (node as Record<string, unknown>)[part], next)).toBe(
          value,
        );
        expect(JSON.stringify(root)).toBe(before);
        const removed = writeAt(next, at, '');
        expect(
          at.split('.').reduce<unknown>((node, part) => (node as Record<string, unknown> | undefined)?.[part], removed),
        ).toBeUndefined();
        expect(JSON.stringify(removed)).not.toContain('{}}');
      }),
    );
  });
});
