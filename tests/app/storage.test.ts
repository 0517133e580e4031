import 'fake-indexeddb/auto';
import { IDBFactory } from 'fake-indexeddb';
import { afterEach, expect, test, vi } from 'vitest';
import { openStorage } from '../../src/app/storage.ts';

afterEach(() => vi.unstubAllGlobals());

const refusing = (name: string) => ({
  open: () => {
    throw new DOMException('refused', name);
  },
});

test('opens the database of the browser', async () => {
  vi.stubGlobal('indexedDB', new IDBFactory());
  const port = await openStorage({});
  expect(port.transient).toBeUndefined();
  port.close();
});

test.each([
  ['there is none', undefined, 'no-database'],
  ['it cannot be opened', refusing('UnknownError'), 'no-database'],
  ['a newer program has changed it', refusing('VersionError'), 'newer'],
  ['it never answers', { open: () => new EventTarget() }, 'no-database'],
])('works in memory when %s', async (_name, indexedDB, cause) => {
  vi.stubGlobal('indexedDB', indexedDB);
  const start = performance.now();
  expect((await openStorage({})).transient).toBe(cause);
  expect(performance.now() - start).toBeLessThan(3000);
});
