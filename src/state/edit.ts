/**
 * Writing one value into a document that is never changed in place: what is not on the path keeps its identity, keys
 * this version does not know stay, and what becomes empty goes.
 */

type Plain = Readonly<Record<string, unknown>>;

const forbidden = new Set(['', '__proto__', 'constructor', 'prototype']);

const isPlain = (node: unknown): node is Plain => typeof node === 'object' && node !== null && !Array.isArray(node);
const isIndex = (key: string): boolean => /^(0|[1-9]\d*)$/.test(key);
const isEmpty = (node: unknown): boolean => isPlain(node) && Object.keys(node).length === 0;

/**
 * The document with `value` at `path` (keys joined by dots, a whole number counts rows of a list from 0).
 * undefined or '' removes the key, and every parent that it leaves empty. Where nothing changes, the same object.
 */
export function writeAt<Root extends object>(root: Root, path: string, value: unknown): Root {
  const keys = path.split('.');
  if (keys.some((key) => forbidden.has(key))) throw new Error(`expected a path of a document's keys, got '${path}'`);
  return (written(root, keys, value) ?? {}) as Root;
}

function written(node: unknown, keys: readonly string[], value: unknown): unknown {
  const [key, ...rest] = keys;
  if (key === undefined) return value === '' && node !== '' ? undefined : value;
  return isIndex(key) ? writtenRow(node, Number(key), rest, value) : writtenKey(node, key, rest, value);
}

function writtenKey(node: unknown, key: string, rest: readonly string[], value: unknown): unknown {
  const parent: Plain = isPlain(node) ? node : {};
  const before = Object.hasOwn(parent, key) ? parent[key] : undefined;
  const after = written(before, rest, value);
  if (after === before) return node;
  if (after !== undefined) return { ...parent, [key]: after };
  const { [key]: _removed, ...others } = parent;
  return isEmpty(others) ? undefined : others;
}

/** An emptied row stays while rows follow, so that these keep their places; removed as a whole, it goes. */
function writtenRow(node: unknown, index: number, rest: readonly string[], value: unknown): unknown {
  const rows: readonly unknown[] = Array.isArray(node) ? node : [];
  if (index > rows.length) throw new Error(`expected a row up to ${rows.length}, got ${index}`);
  const before = rows[index];
  const after = written(before, rest, value);
  if (after === before) return node;
  const next = [...rows];
  if (after !== undefined) next[index] = after;
  else if (rest.length > 0) next[index] = {};
  else next.splice(index, 1);
  while (after === undefined && isEmpty(next.at(-1))) next.pop();
  return next.length > 0 ? next : undefined;
}
