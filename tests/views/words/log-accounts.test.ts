/** Every account of a row has its words, and no words stand for an account that is not there. */
import { expect, test } from 'vitest';
import { accounts } from '../../../src/core/log/account.ts';
import { accountWordsOf } from '../../../src/views/words/log-accounts.ts';

test.each(accounts)('$code', ({ code, fate }) => {
  const { label, meaning } = accountWordsOf(code);
  expect(label).toMatch(/^[A-Z][^.]+$/);
  expect(meaning).toMatch(/^[A-Z].+\.$/);
  if (fate === 'converted') expect(meaning).toContain('was converted');
});

test('labels tell accounts apart', () => {
  const labels = accounts.map(({ code }) => accountWordsOf(code).label);
  expect(new Set(labels).size).toBe(accounts.length);
});

test('an account without words is a defect', () => {
  expect(() => accountWordsOf('gone')).toThrow('expected words for the account gone');
});
