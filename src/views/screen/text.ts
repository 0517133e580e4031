/** Reads the project's text by path. A file may hold anything, so nothing is taken for granted on the way. */
const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null;

/** The value at a dotted path, undefined where there is none. */
export const valueAt = (root: unknown, path: string): unknown =>
  path.split('.').reduce<unknown>((value, key) => (isRecord(value) ? value[key] : undefined), root);

/** What a field shows: text as it stands, a plain number as it is spelled, else nothing. */
export function textAt(root: unknown, path: string): string {
  const value = valueAt(root, path);
  if (typeof value === 'string') return value;
  return typeof value === 'number' ? String(value) : '';
}
