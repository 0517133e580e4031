/** A result as JSON text with two spaces. What JSON cannot carry is a defect, never a null. */

/** Throws a defect, with its path, at a number that is not finite and at a null or an empty place in a list. */
export function serialise(value: unknown): string {
  assertSound(value, 'results');
  return `${JSON.stringify(value, null, 2)}\n`;
}

function assertSound(value: unknown, path: string): void {
  if (typeof value === 'number' && !Number.isFinite(value)) {
    throw new Error(`expected a finite number at ${path}, got ${value}`);
  }
  if (value === null || value === undefined) throw new Error(`expected a value at ${path}, got ${value}`);
  if (typeof value !== 'object') return;
  for (const [key, inner] of Object.entries(value)) {
    if (inner === undefined && !Array.isArray(value)) continue; // an absent key is left out
    assertSound(inner, `${path}.${key}`);
  }
}
