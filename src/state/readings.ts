/** The readings of a survey as one list of texts for each line; an empty text is a point that is not read yet. */

/** A text for one point of one line, both counted from 0. */
export interface ReadingCell {
  readonly line: number;
  readonly point: number;
  readonly text: string;
}

const textsOf = (line: unknown): readonly unknown[] => (Array.isArray(line) ? line : []);

/** The text of a point, '' where there is none. */
export function readingAt(readings: unknown, line: number, point: number): string {
  const text = textsOf(textsOf(readings)[line])[point];
  return typeof text === 'string' ? text : '';
}

/** The readings with these cells in them: as short as they can be, undefined where nothing is read. */
export function withReadings(readings: unknown, cells: readonly ReadingCell[]): readonly unknown[] | undefined {
  const lines = textsOf(readings).map((line) => (Array.isArray(line) ? [...line] : line));
  for (const { line, point, text } of cells) {
    while (lines.length <= line) lines.push([]);
    const own = [...textsOf(lines[line])];
    while (own.length <= point) own.push('');
    own[point] = text;
    lines[line] = withoutEnd(own, (one) => one === '');
  }
  const kept = withoutEnd(lines, (line) => Array.isArray(line) && line.length === 0);
  return kept.length === 0 ? undefined : kept;
}

function withoutEnd(items: readonly unknown[], isEmpty: (item: unknown) => boolean): unknown[] {
  const last = items.findLastIndex((item) => !isEmpty(item));
  return items.slice(0, last + 1);
}
