import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { KEYS } from '../../../src/views/screen/shell/keys.table.ts';
import { causeWords, noticeWords } from '../../../src/views/screen/shell/standing.ts';

const sources = (folder: string): string =>
  readdirSync(folder)
    .filter((name) => name.endsWith('.ts') || name.endsWith('.tsx'))
    .map((name) => readFileSync(`${folder}/${name}`, 'utf8'))
    .join('\n');

/** Every code that app and persist hand to the screen as a notice. */
const codes = (): readonly string[] => {
  const [app, files] = [sources('src/app'), readFileSync('src/persist/files.ts', 'utf8')];
  const found = [
    ...app.matchAll(/code: '([a-z-]+)'/g),
    ...app.matchAll(/say\(desk, '(?:info|problem)', '([a-z-]+)'/g),
    ...files.matchAll(/cause: '([a-z-]+)'/g),
  ].flatMap(([, code]) => code ?? []);
  return [...new Set([...found, 'stored-damaged', 'stored-newer', 'stored-gone', 'storage-no-space'])];
};

describe('what the program says about the work it keeps', () => {
  it('finds the codes that are in use', () => expect(codes().length).toBeGreaterThan(15));

  it.each(codes())('%s has a sentence', (code) => {
    const sentence = noticeWords({
      code,
      kind: 'info',
      detail: { name: 'a.headwright.json', title: 'Tern Island works' },
    });
    expect(sentence).toMatch(/^[A-Z].*\.$|^a\.headwright\.json .*\.$/);
    expect(sentence).not.toContain(code);
  });

  it('says the cause of a file that is no project', () => {
    const detail = { name: 'notes.json', version: '7', known: '1' };
    expect(noticeWords({ code: 'newer-version', kind: 'problem', detail })).toMatch(/^notes\.json: .*version 7/);
  });

  it.each(['no-space', 'closed', 'newer', 'no-database', 'blocked', 'storage'])(
    'names the cause %s and what to do',
    (cause) => {
      expect(causeWords(cause)).toMatch(/\. (Save|Load|Close)/);
    },
  );
});

describe('keys', () => {
  it('gives each combination one order', () => {
    const combinations = KEYS.filter(({ key }) => key).map((row) => `${row.with ?? ''} ${row.key}`);
    expect(new Set(combinations).size).toBe(combinations.length);
  });
});
