import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';

const picker = vi.hoisted(() => ({ fileOpen: vi.fn(), fileSave: vi.fn() }));
vi.mock('browser-fs-access', () => picker);

import { fileNameOf, MOST_BYTES, openFile, readFile, saveFile } from '../../src/persist/files.ts';

const cancelled = new DOMException('closed', 'AbortError');
const refused = new DOMException('no', 'NotAllowedError');
const bytes = (...values: number[]): File => new File([new Uint8Array(values)], 'p.json');

beforeEach(() => vi.resetAllMocks());
afterEach(() => vi.restoreAllMocks());

describe('reading', () => {
  test('gives the text byte for byte, mark at the start and line ends too', async () => {
    const text = '\ufeff{ "title":"\u2212\ud83d\udca7" }\r\n';
    expect(await readFile(new File([text], 'p.json'))).toEqual({ state: 'opened', name: 'p.json', text });
  });

  test('refuses what is too large, no text, or gone', async () => {
    const large = Object.defineProperty(new File(['x'], 'p.json'), 'size', { value: MOST_BYTES + 1 });
    expect(await readFile(large)).toEqual({ state: 'failed', cause: 'file-too-large', name: 'p.json' });
    expect(await readFile(bytes(0x7b, 0xff, 0x7d))).toEqual({
      state: 'failed',
      cause: 'file-not-text',
      name: 'p.json',
    });
    const gone = Object.defineProperty(new File(['x'], 'p.json'), 'arrayBuffer', {
      value: () => Promise.reject(new DOMException('gone', 'NotReadableError')),
    });
    expect(await readFile(gone)).toEqual({ state: 'failed', cause: 'file-unreadable', name: 'p.json' });
  });

  test('cancelled is not failed', async () => {
    picker.fileOpen.mockRejectedValueOnce(cancelled);
    expect(await openFile()).toEqual({ state: 'cancelled' });
    picker.fileOpen.mockRejectedValueOnce(refused);
    expect(await openFile()).toEqual({ state: 'failed', cause: 'file-unreadable', name: '' });
    const handle = { name: 'p.json' };
    picker.fileOpen.mockResolvedValueOnce(Object.assign(new File(['{}'], 'p.json'), { handle }));
    expect(await openFile()).toEqual({ state: 'opened', name: 'p.json', text: '{}', handle });
  });
});

describe('saving', () => {
  const handleTo = (content: string) => ({ name: 'kept.json', getFile: async () => new File([content], 'kept.json') });

  test('says saved after it has read back what it wrote', async () => {
    const handle = handleTo('\ufefftext');
    picker.fileSave.mockResolvedValueOnce(handle);
    expect(await saveFile('\ufefftext', 'p.json')).toEqual({ state: 'saved', name: 'kept.json', handle });
    picker.fileSave.mockResolvedValueOnce(handleTo(''));
    expect(await saveFile('text', 'p.json')).toEqual({ state: 'failed', cause: 'file-not-written', name: 'kept.json' });
  });

  test('downloaded, cancelled and refused are three answers', async () => {
    picker.fileSave.mockResolvedValueOnce(null);
    expect(await saveFile('text', 'p.json')).toEqual({ state: 'downloaded', name: 'p.json' });
    picker.fileSave.mockRejectedValueOnce(cancelled);
    expect(await saveFile('text', 'p.json')).toEqual({ state: 'cancelled' });
    picker.fileSave.mockRejectedValueOnce(refused);
    expect(await saveFile('text', 'p.json')).toEqual({ state: 'failed', cause: 'file-refused', name: 'p.json' });
  });
});

test('a file is named after the title', () => {
  expect(fileNameOf('Tern Island works')).toBe('tern-island-works.headwright.json');
  expect(fileNameOf('  ../Dampf & Öl:\u0000 2 ')).toBe('dampf-öl-2.headwright.json');
  expect(fileNameOf('')).toBe('project.headwright.json');
});
