import { afterEach, expect, test, vi } from 'vitest';
import { hasHash, hashOf } from '../../src/persist/hash.ts';

afterEach(() => vi.unstubAllGlobals());

test('SHA-256 of "abc" is that of FIPS 180-4', async () => {
  expect(await hashOf('abc')).toBe('sha256:ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad');
});

test('without a secure page, FNV-1a of "foobar" and "" are those of RFC 9923', async () => {
  const sha = await hashOf('foobar');
  vi.stubGlobal('crypto', {});
  expect(await hashOf('foobar')).toBe('fnv1a:85944171f73967e8');
  expect(await hashOf('')).toBe('fnv1a:cbf29ce484222325');
  expect(await hasHash('foobar', sha)).toBe(false);
});

test('a hash of either kind is checked', async () => {
  expect(await hasHash('foobar', 'fnv1a:85944171f73967e8')).toBe(true);
  expect(await hasHash('foobaz', 'fnv1a:85944171f73967e8')).toBe(false);
  expect(await hasHash('foobar', await hashOf('foobar'))).toBe(true);
  expect(await hasHash('foobaz', await hashOf('foobar'))).toBe(false);
  expect(await hasHash('foobar', '')).toBe(false);
});
