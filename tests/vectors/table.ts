/** The accuracy table of README.md: one row for each source, with what it was asked and how far the core is off. */
import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { type Compared, compareAll, type VectorFile, vectorFiles } from './measure.ts';

const OPEN = '<!-- accuracy -->';
const CLOSE = '<!-- /accuracy -->';

const MISSES = JSON.parse(readFileSync(join(import.meta.dirname, 'known-misses.json'), 'utf8')) as readonly {
  readonly file: string;
  readonly name: string;
  readonly field: string;
}[];

const isMiss = ({ path, name, field }: Compared): boolean =>
  MISSES.some((miss) => miss.file === path && miss.name === name && miss.field === field);

const most = (values: readonly number[]): number => values.reduce((one, other) => Math.max(one, other), 0);

/** A tolerance as `5e-9` or `±5e-7`; several fields of one file may differ. */
const tolerances = ({ tolerance }: VectorFile): string => {
  const texts = Object.values(tolerance).map(({ rel, abs, digits }) =>
    [
      ...(digits === undefined ? [] : [`${digits} digits`]),
      ...(abs === undefined ? [] : [`±${abs}`]),
      ...(rel === undefined ? [] : [rel === 0 ? 'exact' : `${rel}`]),
    ].join(' + '),
  );
  return [...new Set(texts)].join(', ');
};

/** Up, to one digit, and not finer than a double: another machine must print the same. */
const FINEST = 1e-12;
function roundedUp(value: number): string {
  if (value === 0) return '0';
  if (value <= FINEST) return `< ${FINEST}`;
  const power = Math.floor(Math.log10(value));
  const digit = Math.ceil(value / 10 ** power - 1e-6);
  return digit === 10 ? `1e${power + 1}` : `${digit}e${power}`;
}

const percent = (share: number): string => `${Math.ceil(share * 100 - 1e-6)} %`;

/** Where rounding alone is left of the error, its share of a tolerance near rounding says nothing and would wander. */
const shareOf = (compared: readonly Compared[]): string =>
  most(compared.map(({ relative }) => relative)) <= FINEST
    ? 'rounding'
    : percent(most(compared.map((one) => one.share)));

const ORIGINS = { published: 'printed', independent: 'computed', unseen: 'computed, unseen' } as const;

const row = (entry: { readonly path: string; readonly file: VectorFile }): string => {
  const all = compareAll(entry);
  const compared = all.filter((one) => !isMiss(one));
  const { file } = entry;
  const left = all.length - compared.length;
  const figures = `${compared.length}${left > 0 ? ` (and ${left} known to miss)` : ''}`;
  const relative = roundedUp(most(compared.map((one) => one.relative)));
  const cells = [file.source, file.subject.replaceAll('-', ' '), ORIGINS[file.origin], figures, tolerances(file)];
  return `| ${[...cells, shareOf(compared), relative].join(' | ')} |`;
};

export function accuracyTable(): string {
  const head = [
    'Source',
    'What',
    'Its figures',
    'Compared',
    'Tolerance',
    'Largest error, of the tolerance',
    'relative',
  ];
  return [`| ${head.join(' | ')} |`, `|${head.map(() => '---').join('|')}|`, ...vectorFiles().map(row)].join('\n');
}

/** The text with the table between its marks. */
export function withTable(text: string, table: string): string {
  const [from, to] = [text.indexOf(OPEN), text.indexOf(CLOSE)];
  if (from < 0 || to < from) throw new Error(`expected ${OPEN} and ${CLOSE} in the text, got none`);
  return `${text.slice(0, from + OPEN.length)}\n${table}\n${text.slice(to)}`;
}
