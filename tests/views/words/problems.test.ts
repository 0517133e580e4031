import { describe, expect, it } from 'vitest';
import { printSI } from '../../../src/views/words/print.ts';
import { problemSentence, problemSentences, problemWords } from '../../../src/views/words/problems.ts';
import { coreText } from './core-text.ts';

/** A detail that has everything, as a sentence asks for it. */
const texts: Record<string, string> = { written: '12x', unit: 'mm', reason: 'a bracket is open', phase: 'vapour' };
const lists = ['choices', 'known', 'offered', 'expected', 'nearest', 'actual'];
const anything = new Proxy({} as Record<string, string | number>, {
  get: (_, key) => texts[String(key)] ?? (lists.includes(String(key)) ? 'one, two' : 7),
});

describe.each(Object.keys(problemWords))('%s', (code) => {
  const { cause, next } = problemSentences({ code, field: 'upstream.pressure', detail: anything }, printSI);
  it('says what is wrong, in one sentence', () => {
    expect(cause).toMatch(/^[A-Z'0-9].{15,}\.$/);
    expect(cause).not.toMatch(/undefined|NaN|\[object|please|invalid|error/i);
  });
  it('says what to do, beginning with what is done', () => {
    expect(next).toMatch(
      /^(Check|Choose|Fill|Leave|Lower|Open|Put|Raise|State|Use|Write|It holds from .*: check) ?.{3,}\.$/,
    );
  });
  it('is short', () => expect(`${cause} ${next}`.length).toBeLessThan(300));
});

/** `fail('code', field, { a, b: c })` in the core, as far as its details are written out there. */
const written = [...coreText.values()]
  .flatMap((text) => [
    ...text.replace(/`[^`]*`/g, "''").matchAll(/(?:fail|report)\(\s*'([a-z-]+)',[^{};]*\{([^{}]*)\}/g),
  ])
  .map(([, code = '', detail = '']) => ({
    code,
    keys: detail
      .split(',')
      .map((part) => part.split(':')[0]?.trim() ?? '')
      .filter((key) => /^[a-zA-Z]+$/.test(key)),
  }));

describe('each sentence asks only for details that the core gives', () => {
  it('has seen enough of them', () => expect(written.length).toBeGreaterThan(20));
  it.each(written)('$code', ({ code, keys }) => {
    const detail = Object.fromEntries(keys.map((key) => [key, 1]));
    expect(() => problemSentence({ code, field: '', detail })).not.toThrow();
  });
});

describe('wording', () => {
  it('names the field and quotes what was written', () => {
    const problem = {
      code: 'pressure-reference-missing',
      field: 'upstream.pressure',
      detail: { unit: 'bar', choices: 'bar(a), bar(g)' },
    };
    expect(problemSentence(problem)).toBe(
      "The unit 'bar' of the upstream pressure does not say from where the pressure counts. " +
        'Write bar(a) or bar(g): (a) above vacuum, (g) above the atmosphere.',
    );
  });
  it('a missing field', () => {
    expect(problemSentence({ code: 'field-missing', field: 'duty.maximum', detail: {} })).toBe(
      'The maximum flow is not given. Fill it in.',
    );
    expect(problemSentence({ code: 'field-missing', field: 'meters.0.instrument.upper', detail: {} })).toBe(
      'The upper end of the range is not given. Fill it in.',
    );
  });
  it('a missing choice', () => {
    const detail = { choices: 'u-tube, well' };
    expect(problemSentence({ code: 'field-missing', field: 'instrument.kind', detail })).toBe(
      'The instrument is not given. Choose one.',
    );
  });
  it('a code or a detail that is not there is a defect', () => {
    expect(() => problemSentence({ code: 'nonsense', field: '', detail: {} })).toThrow(/expected words .*got none/);
    expect(() => problemSentence({ code: 'unit-missing', field: '', detail: {} })).toThrow(/expected detail/);
  });
});
