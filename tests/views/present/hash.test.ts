import { describe, expect, it } from 'vitest';
import type { MeterText } from '../../../src/core/document/project.ts';
import { canonical, fnv1a, inputsHash } from '../../../src/views/present/hash.ts';
import { feedWater } from './meters.ts';

describe('FNV-1a, 64 bits', () => {
  // Test vectors of the authors of the function (Fowler, Noll, Vo), as in their reference suite.
  it.each([
    ['', 0xcbf29ce484222325n],
    ['a', 0xaf63dc4c8601ec8cn],
    ['foobar', 0x85944171f73967e8n],
  ])('%j', (text, hash) => expect(fnv1a(text)).toBe(hash));
  it('takes the bytes of UTF-8, not code units', () => expect(fnv1a('ρ')).not.toBe(fnv1a('\u00c1')));
});

describe('canonical form', () => {
  it('knows no order of keys and no absent ones, but the order of lists', () => {
    expect(canonical({ b: [2, 1], a: { d: undefined, c: 'x' } })).toBe('{"a":{"c":"x"},"b":[2,1]}');
    expect(canonical([undefined, null, 'é"'])).toBe('[null,null,"é\\""]');
  });
});

describe('fingerprint of the inputs', () => {
  const site = { atmosphere: '101.325 kPa(a)' };
  const base = { temperature: '15 degC' };
  const hash = (meter: MeterText, around: object = { site, base }) => inputsHash(meter, around);
  const first = hash(feedWater);
  it('is twelve hexadecimal digits that stay the same', () => expect(first).toBe('d639db454159'));
  it('does not care for the order in which a file writes its keys', () => {
    const turned = Object.fromEntries(Object.entries(feedWater).reverse()) as MeterText;
    expect(hash(turned, { base, site })).toBe(first);
  });
  it('changes with any input, the site and the base state', () => {
    const others = [
      hash({ ...feedWater, differential: '250.0 mbar' }),
      hash({ ...feedWater, tag: 'FE-1102' }),
      hash({ ...feedWater, pipe: { ...feedWater.pipe, bore: '102.27 mm' } }),
      hash(feedWater, { site: { atmosphere: '100 kPa(a)' }, base }),
      hash(feedWater, { site, base: { temperature: '0 degC' } }),
      hash(feedWater, {}),
    ];
    expect(new Set([first, ...others]).size).toBe(others.length + 1);
  });
  it('stands for whatever a file may hold in place of a meter', () => {
    for (const junk of [null, 17, 'x', [], [null]]) expect(hash(junk as never)).toMatch(/^[0-9a-f]{12}$/);
  });
});
