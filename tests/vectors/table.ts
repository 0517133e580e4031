/** The accuracy tables of README.md, by what is asked: one row for each source, and how far the core is off. */
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

/** A tolerance without the rounding of the product it came from. */
const tidy = (tolerance: number): number => Number(tolerance.toPrecision(12));

/** Tolerances as `5e-9` or `±5e-7`; the columns of one source may differ, and more than three are not listed. */
const tolerances = (files: readonly VectorFile[]): string => {
  const texts = files.flatMap(({ tolerance }) =>
    Object.values(tolerance).map(({ rel, abs, digits }) =>
      [
        ...(digits === undefined ? [] : [`${digits} digits`]),
        ...(abs === undefined ? [] : [`±${tidy(abs)}`]),
        ...(rel === undefined ? [] : [rel === 0 ? 'exact' : `${tidy(rel)}`]),
      ].join(' + '),
    ),
  );
  const each = [...new Set(texts)];
  return each.length > 3 ? 'by column' : each.join(', ');
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

const ORIGINS: Readonly<Record<string, string>> = {
  published: 'printed',
  independent: 'computed',
  unseen: 'printed, unseen',
};

/** Where a figure comes from, and whether it was typed from memory or taken over from a third place. */
const originOf = ({ origin, seen }: VectorFile): string => {
  const [way] = /^(memory|second-hand)/.exec(seen ?? '') ?? [];
  return [ORIGINS[origin], ...(way === undefined ? [] : [way === 'memory' ? '**from memory**' : way])].join(', ');
};

type Entry = ReturnType<typeof vectorFiles>[number];

/** One row for all files that ask one source for one thing. */
function row(entries: readonly Entry[], { file }: Entry): string {
  const all = entries.flatMap(compareAll);
  const compared = all.filter((one) => !isMiss(one));
  const left = all.length - compared.length;
  const figures = `${compared.length}${left > 0 ? ` (${left} known to miss)` : ''}`;
  const relative = roundedUp(most(compared.map((one) => one.relative)));
  const what = file.subject.replaceAll('-', ' ');
  const cells = [file.source, what, originOf(file), figures, tolerances(entries.map((one) => one.file))];
  return `| ${[...cells, shareOf(compared), relative].join(' | ')} |`;
}

/** What the folders of vectors are about, in the order of the table. */
const GROUPS: Readonly<Record<string, string>> = {
  iso5167: 'Elements',
  handbook: 'Worked examples of books',
  iapws: 'Water and steam',
  aga8: 'Gas by composition',
  'gas-viscosity': 'Viscosity of gas',
  'other-gases': 'Other gases',
  air: 'Air',
  liquids: 'Liquids',
  gauge: 'Liquids of gauges',
  pitot: 'Pitot tubes and traverses',
  reading: 'What instruments show',
  logs: 'Logs',
  site: 'Site',
  units: 'Units',
};

const HEAD = ['Source', 'What', 'Its figures', 'Compared', 'Tolerance', 'Largest error, of the tolerance', 'relative'];

const folderOf = ({ path }: Entry): string => path.slice(0, path.indexOf('/'));

function group(folder: string, entries: readonly Entry[]): string {
  const key = ({ file }: Entry): string => [file.source, file.subject, originOf(file)].join();
  const rows = [...new Set(entries.map(key))].map((one) => entries.filter((entry) => key(entry) === one));
  const lines = rows.flatMap((alike) => (alike[0] === undefined ? [] : [row(alike, alike[0])]));
  return [
    `### ${GROUPS[folder]}`,
    '',
    `| ${HEAD.join(' | ')} |`,
    `|${HEAD.map(() => '---').join('|')}|`,
    ...lines,
  ].join('\n');
}

export function accuracyTable(): string {
  // A table of our own against the copy it was typed from proves the typing, not the accuracy.
  const entries = vectorFiles().filter(({ file }) => file.origin !== 'copied');
  const unknown = entries.map(folderOf).filter((folder) => GROUPS[folder] === undefined);
  if (unknown.length > 0) throw new Error(`expected a group of the table for ${unknown[0]}, got none`);
  const tables = Object.keys(GROUPS).map((folder) =>
    group(
      folder,
      entries.filter((entry) => folderOf(entry) === folder),
    ),
  );
  return `\n${tables.join('\n\n')}\n`;
}

/** The text with the table between its marks. */
export function withTable(text: string, table: string): string {
  const [from, to] = [text.indexOf(OPEN), text.indexOf(CLOSE)];
  if (from < 0 || to < from) throw new Error(`expected ${OPEN} and ${CLOSE} in the text, got none`);
  return `${text.slice(0, from + OPEN.length)}\n${table}\n${text.slice(to)}`;
}
