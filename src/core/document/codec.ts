/**
 * Text of a project file <-> project. The reader answers with the project as it is written, unknown keys and all, or
 * says why this is no project it can read; the writer is its inverse.
 */
import * as v from 'valibot';
import { fail, type Outcome, ok } from '../quantity/outcome.ts';
import type { Project } from './project.ts';

/** How a project file names its format. */
export const FORMAT = 'headwright';
/** The version this program writes, and the newest it reads. */
export const VERSION = 1;
/** No project comes near this; more is another kind of file. */
export const MOST_CHARACTERS = 20_000_000;

const Envelope = v.looseObject({ meters: v.array(v.unknown()) });
const FORBIDDEN_KEYS = new Set(['__proto__', 'constructor', 'prototype']);

/**
 * Reads a project file. Problems: too-long, not-json, not-headwright, version-missing, newer-version, no-meters,
 * list-expected (traverses that are no list).
 */
export function decode(text: string): Outcome<Project> {
  if (text.length > MOST_CHARACTERS) return fail('too-long', '', { length: text.length, most: MOST_CHARACTERS });
  let data: unknown;
  try {
    data = JSON.parse(text, dropForbidden);
  } catch (cause) {
    return fail('not-json', '', { reason: cause instanceof Error ? cause.message : String(cause) });
  }
  if (!isRecord(data) || data.format !== FORMAT) return fail('not-headwright', 'format');
  const version = data.version;
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1)
    return fail('version-missing', 'version');
  if (version > VERSION) return fail('newer-version', 'version', { version, known: VERSION });
  if (!v.is(Envelope, data)) return fail('no-meters', 'meters');
  const { traverses } = data;
  if (traverses !== undefined && !Array.isArray(traverses))
    return fail('list-expected', 'traverses', { written: traverses === null ? 'null' : typeof traverses });
  return ok(data as unknown as Project);
}

/** Writes a project file: two spaces, a newline at the end. */
export function encode(project: Project): string {
  return `${JSON.stringify(project, null, 2)}\n`;
}

/** An empty project of today's version. */
export function emptyProject(): Project {
  return { format: FORMAT, version: VERSION, title: '', display: 'SI', meters: [] };
}

function isRecord(data: unknown): data is Record<string, unknown> {
  return typeof data === 'object' && data !== null && !Array.isArray(data);
}

/** Keys that would reach an object's prototype are dropped, wherever they stand. */
function dropForbidden(this: unknown, key: string, value: unknown): unknown {
  return FORBIDDEN_KEYS.has(key) ? undefined : value;
}
