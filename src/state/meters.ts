/** New meters, and the tags they get. */
import type { MeterText } from '../core/document/project.ts';

/** The meter as an object; what stands in the list in a meter's place counts as an empty one. */
const asMeter = (meter: unknown): MeterText =>
  typeof meter === 'object' && meter !== null && !Array.isArray(meter) ? (meter as MeterText) : {};

/** Its tag, '' without one. */
export function tagOf(meter: unknown): string {
  const { tag } = asMeter(meter);
  return typeof tag === 'string' ? tag : '';
}

/** The first tag FE-… above those in use; FE-101 in a project without one. */
function nextTag(meters: readonly unknown[]): string {
  const numbers = meters.flatMap((meter) => /^FE-(\d{1,9})$/.exec(tagOf(meter))?.slice(1) ?? []).map(Number);
  return `FE-${Math.max(100, ...numbers) + 1}`;
}

/** A flange-tapped orifice plate in water whose bore is to be found; sizes and duty are left for the user to state. */
export function newMeter(meters: readonly unknown[]): MeterText {
  return {
    tag: nextTag(meters),
    fluid: { kind: 'water' },
    element: { kind: 'orifice-plate', tappings: 'flange' },
    find: 'bore',
  };
}

/** The meter again under a tag that is free: 'FE-101 copy', 'FE-101 copy 2'. */
export function copyOf(meter: unknown, meters: readonly unknown[]): MeterText {
  const taken = new Set(meters.map(tagOf));
  const stem = `${tagOf(meter).replace(/ copy( \d+)?$/, '')} copy`.trim();
  let tag = stem;
  for (let count = 2; taken.has(tag); count += 1) tag = `${stem} ${count}`;
  return { ...asMeter(meter), tag };
}
