import { describe, expect, it } from 'vitest';
import { elementOf, elements, notOffered } from '../../../src/core/element/registry.ts';
import { geometry, primaries } from './primaries.ts';

describe('the registry', () => {
  it('finds each of its elements by its kind', () => {
    for (const element of elements) expect(elementOf(element.kind)).toEqual({ ok: true, value: element });
    expect(elements).toHaveLength(6);
  });

  it('names every variant once, with the kind of its element in front', () => {
    const names = primaries.map((one) => one.name);
    expect(new Set(names).size).toBe(11);
    for (const one of primaries) expect(one.name.split('.')[0]).toBe(one.kind);
  });

  it('tells a kind that is not computed from a kind that does not exist', () => {
    for (const kind of notOffered) {
      expect(elementOf(kind)).toMatchObject({
        ok: false,
        problems: [{ code: 'element-not-offered', field: 'element.kind' }],
      });
    }
    const unknown = { code: 'element-unknown', field: 'element.kind', detail: { written: 'toString' } };
    expect(elementOf('toString')).toMatchObject({ ok: false, problems: [unknown] });
  });

  it('throws a defect for a variant that input must have refused', () => {
    for (const element of elements.filter((one) => one.fields.length > 0 && one.bore !== 'none')) {
      expect(() => element.primary({})).toThrow(/expected .* got undefined/);
    }
    const bare = elementOf('averaging-pitot');
    if (!bare.ok) throw new Error('expected an averaging pitot in the registry');
    expect(() => bare.value.primary({}).discharge(geometry(0.1, 1))(1e5)).toThrow(/expected .* got undefined/);
  });
});
