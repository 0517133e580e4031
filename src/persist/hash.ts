/** The hash by which a stored text is known to be whole. It guards against damage, not against forgery. */

/** 'sha256:…' where the browser gives it (a secure page), otherwise 'fnv1a:…'. */
export async function hashOf(text: string): Promise<string> {
  return hasDigest() ? sha256(text) : fnv1a(text);
}

/** Whether `text` still has `hash`; a hash this page cannot compute does not vouch for it. */
export async function hasHash(text: string, hash: string): Promise<boolean> {
  if (hash.startsWith('fnv1a:')) return fnv1a(text) === hash;
  return hasDigest() && (await sha256(text)) === hash;
}

const hasDigest = (): boolean => globalThis.crypto?.subtle !== undefined;

async function sha256(text: string): Promise<string> {
  const digest = await crypto.subtle.digest('SHA-256', new TextEncoder().encode(text));
  return `sha256:${hexadecimal(new Uint8Array(digest))}`;
}

const hexadecimal = (bytes: Uint8Array): string =>
  Array.from(bytes, (byte) => byte.toString(16).padStart(2, '0')).join('');

/** FNV-1a, 64 bits (RFC 9923). */
function fnv1a(text: string): string {
  let hash = 0xcbf29ce484222325n;
  for (const byte of new TextEncoder().encode(text)) hash = BigInt.asUintN(64, (hash ^ BigInt(byte)) * 0x100000001b3n);
  return `fnv1a:${hash.toString(16).padStart(16, '0')}`;
}
