/** The hash by which a stored text is known to be whole. It guards against damage, not against forgery. */

const PRIME = 0x1b3; // the lower part of 2^40 + 0x1b3, the FNV prime of 64 bits (RFC 9923, clause 5)
const WORD = 2 ** 32;

/**
 * 'fnv1a:…', FNV-1a of 64 bits (RFC 9923) over UTF-8. Computed at once: a page that is being closed has no time to wait
 * for a digest of the browser.
 */
export function hashOf(text: string): string {
  let [high, low] = [0xcbf29ce4, 0x84222325];
  for (const byte of new TextEncoder().encode(text)) {
    const mixed = (low ^ byte) >>> 0;
    const product = mixed * PRIME; // below 2^41, exact
    high = (Math.imul(high, PRIME) + Math.floor(product / WORD) + (mixed << 8)) >>> 0;
    low = product >>> 0;
  }
  return `fnv1a:${hexadecimal(high)}${hexadecimal(low)}`;
}

/** Whether `text` still has `hash`: 'fnv1a:…', or 'sha256:…' as earlier versions wrote it, where the browser gives it. */
export async function hasHash(text: string, hash: string): Promise<boolean> {
  if (hash.startsWith('fnv1a:')) return hashOf(text) === hash;
  return globalThis.crypto?.subtle !== undefined && (await sha256(text)) === hash;
}

async function sha256(text: string): Promise<string> {
  const digest = await crypto.subtle.digest('SHA-256', new TextEncoder().encode(text));
  return `sha256:${Array.from(new Uint8Array(digest), (byte) => byte.toString(16).padStart(2, '0')).join('')}`;
}

const hexadecimal = (word: number): string => word.toString(16).padStart(8, '0');
