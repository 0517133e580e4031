/** What a sentence may ask of a problem or a finding: where it stands, what was written, figures with their units. */
import type { Print, Role } from './print.ts';

export interface Detail {
  /** The field, as its label stands inside a sentence. */
  readonly place: string;
  has(key: string): boolean;
  /** What was written or named, as it is. */
  text(key: string): string;
  /** A list written with commas, as 'a, b or c'. */
  list(key: string): string;
  /** An SI figure in its display unit. */
  figure(key: string, role: Role): string;
  /** The same for a figure that is set. */
  limit(key: string, role: Role): string;
}

/** What a sentence says: what is wrong and where, then what to do. */
export interface Sentences {
  readonly cause: string;
  readonly next: string;
}
export type ProblemWords = Readonly<Record<string, (detail: Detail) => Sentences>>;

/** How one kind of finding is worded. `figure` is the printed value, or 'a to b' where it stands for a range. */
export interface FindingWords {
  readonly role: Role;
  readonly text: (figure: string, detail: Detail) => string;
  /** Where the plain 'at least', 'at most', 'a to b' does not say it. */
  readonly limit?: (bounds: string, detail: Detail) => string;
}

/** The details of `code`; one that is asked for and missing is a defect. */
export function detailOf(
  code: string,
  place: string,
  values: Readonly<Record<string, string | number>>,
  print: Print,
): Detail {
  const value = (key: string): string | number => {
    const found = values[key];
    if (found === undefined)
      throw new Error(`expected detail '${key}' of ${code}, got ${Object.keys(values).join(', ')}`);
    return found;
  };
  return {
    place,
    has: (key) => values[key] !== undefined && values[key] !== '',
    text: (key) => String(value(key)),
    list: (key) => oneOf(String(value(key))),
    figure: (key, role) => print.figure(Number(value(key)), role),
    limit: (key, role) => print.limit(Number(value(key)), role),
  };
}

/** 'a, b, c' as 'a, b or c'. */
export function oneOf(list: string): string {
  const items = list.split(', ');
  const last = items.pop() ?? '';
  return items.length === 0 ? last : `${items.join(', ')} or ${last}`;
}

/** A sentence begins with a capital, whatever stands first. */
export const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
