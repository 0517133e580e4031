/** The words after `convert FILE` on the command line. */
import type { ConvertOrder } from './convert.ts';

const MOST_DIGITS = 17; // more no double has

/** What they ask for; undefined where they cannot be understood, or leave out what is needed. */
export function readConvert(words: readonly string[]): Omit<ConvertOrder, 'file'> | undefined {
  const values = new Map<string, string>();
  let exact = false;
  for (let at = 0; at < words.length; at += 1) {
    const word = words[at] as string;
    if (word === '--exact') exact = true;
    else {
      const value = words[at + 1];
      if (!['--tag', '--log', '--out', '--digits'].includes(word) || value === undefined || values.has(word))
        return undefined;
      values.set(word, value);
      at += 1;
    }
  }
  const [tag, log, out] = ['--tag', '--log', '--out'].map((word) => values.get(word));
  const digits = digitsOf(values.get('--digits'));
  if (tag === undefined || log === undefined || out === undefined || digits === undefined) return undefined;
  return { tag, log, out, exact, manner: digits };
}

function digitsOf(text: string | undefined): ConvertOrder['manner'] | undefined {
  if (text === undefined) return {};
  if (text === 'all') return { digits: 'all' };
  const digits = Number(text);
  return /^\d+$/.test(text) && digits >= 1 && digits <= MOST_DIGITS ? { digits } : undefined;
}
