import { expect, test } from 'vitest';
import { failed, openForm } from '../../../src/core/input/form.ts';

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
