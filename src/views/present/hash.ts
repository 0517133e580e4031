/**
 * A short fingerprint of the inputs of one meter or survey, printed on its sheet and beside its result: two papers with the same
 * fingerprint were computed from the same inputs. It tells inputs apart; it is no seal against forgery.
 */
import type { MeterText, Project, TraverseText } from '../../core/document/project.ts';

/** Twelve hexadecimal digits over the meter or traverse, the site and the base state; the order of keys does not matter. */
export function inputsHash(item: MeterText | TraverseText, { site, base }: Pick<Project, 'site' | 'base'>): string {
  const hash = fnv1a(canonical({ meter: item, site, base }));
  return ((hash >> 48n) ^ (hash & 0xffffffffffffn)).toString(16).padStart(12, '0'); // RFC 9923: folded to 48 bits
}

/** FNV-1a of the UTF-8 bytes, 64 bits. RFC 9923. */
export function fnv1a(text: string): bigint {
  let hash = 0xcbf29ce484222325n;
  for (const byte of new TextEncoder().encode(text)) hash = BigInt.asUintN(64, (hash ^ BigInt(byte)) * 0x100000001b3n);
  return hash;
}

/** JSON with the keys of every object in the order of their code units, without the absent ones. */
export function canonical(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(canonical).join(',')}]`;
  if (typeof value !== 'object' || value === null) return JSON.stringify(value) ?? 'null';
  const entries = Object.entries(value)
    .filter(([, inner]) => inner !== undefined)
    .toSorted(([a], [b]) => (a < b ? -1 : 1));
  return `{${entries.map(([key, inner]) => `${JSON.stringify(key)}:${canonical(inner)}`).join(',')}}`;
}
