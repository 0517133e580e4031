import { afterEach, expect, test, vi } from 'vitest';
import { hasHash, hashOf } from '../../src/persist/hash.ts';

afterEach(() => vi.unstubAllGlobals());

/** FNV-1a of 64 bits in whole numbers of any size, as RFC 9923 writes it. */
const written = (text: string): string => {
  let hash = 0xcbf29ce484222325n;
  for (const byte of new TextEncoder().encode(text)) hash = BigInt.asUintN(64, (hash ^ BigInt(byte)) * 0x100000001b3n);
  return `fnv1a:${hash.toString(16).padStart(16, '0')}`;
};

test('FNV-1a of "foobar" and "" are those of RFC 9923', () => {
  expect(hashOf('foobar')).toBe('fnv1a:85944171f73967e8');
  expect(hashOf('')).toBe('fnv1a:cbf29ce484222325');
});

test('in two words of 32 bits it is what it is in one of 64', () => {
  const text = 'Tern Island works \u00e9\u2212\ud83d\udca7 \u0000\u007f\u0080\uffff'.repeat(50);
  for (let length = 0; length < text.length; length += 1)
    expect(hashOf(text.slice(0, length))).toBe(written(text.slice(0, length)));
});

test('a text that was changed by one bit or cut by one byte has another hash', async () => {
  expect(await hasHash('foobar', hashOf('foobar'))).toBe(true);
  expect(await hasHash('foobas', hashOf('foobar'))).toBe(false);
  expect(await hasHash('fooba', hashOf('foobar'))).toBe(false);
  expect(await hasHash('foobar', '')).toBe(false);
});

test('a record of an earlier version is known by its SHA-256; that of "abc" is in FIPS 180-4', async () => {
  const hash = 'sha256:ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad';
  expect(await hasHash('abc', hash)).toBe(true);
  expect(await hasHash('abd', hash)).toBe(false);
  vi.stubGlobal('crypto', {}); // a page that is not secure
  expect(await hasHash('abc', hash), 'what cannot be computed does not vouch').toBe(false);
});
