import { expect, test } from 'vitest';
import { failed, openForm, readNumber } from '../../../src/core/input/form.ts';

test('a form that cannot be used answers with all its problems, in the order of reading', () => {
  const form = openForm({ bore: '0 mm' });
  form.positive('bore', ['length'], true);
  form.positive('length', ['length'], true);
  const outcome = failed(form);
  expect(outcome.ok ? [] : outcome.problems.map(({ code, field }) => `${code} at ${field}`)).toEqual([
    'not-positive at bore',
    'field-missing at length',
  ]);
});

test('one that says no reason is a defect', () => {
  expect(() => failed(openForm({}))).toThrow('expected a problem');
});

test.each([
  [{}, 'number-expected', 'object'],
  [['1'], 'number-expected', 'a list'],
  [true, 'number-expected', 'boolean'],
  ['1,3', 'number-unreadable', '1,3'],
  ['', 'number-unreadable', ''],
  ['1e9999', 'number-too-large', '1e9999'],
])('%j is no plain number', (value, code, written) => {
  expect(readNumber(value, 'field')).toEqual({ ok: false, problems: [{ code, field: 'field', detail: { written } }] });
});
