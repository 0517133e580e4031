/** Pipe sizes by name: how they are written in the project, their nominal bore and how a search finds them. */
import type { Source } from '../quantity/source.ts';
import { PIPE_SIZE_ROWS, PIPE_SIZE_SOURCES, type PipeSizeRow } from './pipe-sizes.table.ts';

export interface PipeSize {
  /** As the project keeps it in pipe.size: 'DN 100, 40'. */
  readonly name: string;
  readonly dn: number;
  readonly nps: string; // '1 1/2'
  readonly schedule: string;
  readonly outside: string; // mm, decimal text
  readonly wall: string; // mm, decimal text
  /** Outside diameter less two walls, mm, exact decimal text. */
  readonly bore: string;
  readonly source: Source;
}

/** Decimal text of millimetres as whole hundredths; the table has two decimals at most. */
const hundredths = (text: string): number => {
  const [whole = '0', fraction = ''] = text.split('.');
  return Number(whole) * 100 + Number(fraction.padEnd(2, '0'));
};

const decimalText = (count: number): string => {
  const fraction = String(count % 100)
    .padStart(2, '0')
    .replace(/0+$/, '');
  const whole = String(Math.floor(count / 100));
  return fraction === '' ? whole : `${whole}.${fraction}`;
};

const QUARTERS = ['', '1/4', '1/2', '3/4'] as const;

const inches = (nps: number): string => {
  const whole = Math.floor(nps);
  const part = QUARTERS[(nps - whole) * 4] ?? '';
  return [whole === 0 ? '' : String(whole), part].filter(Boolean).join(' ');
};

const pipeSize = ([nps, dn, schedule, outside, wall]: PipeSizeRow): PipeSize => ({
  name: `DN ${dn}, ${schedule}`,
  dn,
  nps: inches(nps),
  schedule,
  outside,
  wall,
  bore: decimalText(hundredths(outside) - 2 * hundredths(wall)),
  source: /^\d+S$/.test(schedule) ? PIPE_SIZE_SOURCES.stainless : PIPE_SIZE_SOURCES.plain,
});

/** Every size of the table, smallest first. */
export const PIPE_SIZES: readonly PipeSize[] = PIPE_SIZE_ROWS.map(pipeSize);

/** Words of a query: 'DN', 'NPS', 'schedule', 'in', commas and crosses only part them. */
const wordsOf = (query: string): readonly string[] =>
  query
    .toUpperCase()
    .replace(/\b(DN|NPS|SCH|SCHEDULE|IN|MM|X)\b\.?/g, ' ')
    .replace(/DN(?=\d)/g, '')
    .split(/[\s,"″×]+/)
    .filter(Boolean);

/** How many words of a query only begin what they stand for; undefined when one stands for nothing of the size. */
function guesses(size: PipeSize, words: readonly string[]): number | undefined {
  const keys = [String(size.dn), size.schedule, size.outside, size.wall, ...size.nps.split(' ')];
  if (!words.every((word) => keys.some((key) => key.startsWith(word)))) return undefined;
  return words.filter((word) => !keys.includes(word)).length;
}

/**
 * Sizes that a query finds, those it names outright first: each of its words must be the DN, the NPS, the schedule, the
 * outside diameter or the wall of the size, or begin it ('100 40', 'DN100', '4" 40S', '114.3 x 6.02'). An empty query
 * finds all.
 */
export function searchPipeSizes(query: string): readonly PipeSize[] {
  const words = wordsOf(query);
  return PIPE_SIZES.flatMap((size) => {
    const guessed = guesses(size, words);
    return guessed === undefined ? [] : [{ size, guessed }];
  })
    .toSorted((one, other) => one.guessed - other.guessed)
    .map(({ size }) => size);
}

/** The one size that a query names outright; undefined when it names none, or several. */
export function namedOutright(query: string): PipeSize | undefined {
  const words = wordsOf(query);
  const [first, ...others] = words.length < 2 ? [] : PIPE_SIZES.filter((size) => guesses(size, words) === 0);
  return others.length === 0 ? first : undefined;
}

/** The size of a name as the project keeps it; undefined for a name that is not in the table. */
export const pipeSizeNamed = (name: string): PipeSize | undefined => PIPE_SIZES.find((size) => size.name === name);
