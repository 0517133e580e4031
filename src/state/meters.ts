/** New meters and traverses, and the tags they get. */
import type { MeterText, TraverseText } from '../core/document/project.ts';

type Item = MeterText | TraverseText;

/** The item as an object; what stands in the list in a meter's place counts as an empty one. */
const asItem = (item: unknown): Item =>
  typeof item === 'object' && item !== null && !Array.isArray(item) ? (item as Item) : {};

/** Its tag, '' without one. */
export function tagOf(item: unknown): string {
  const { tag } = asItem(item);
  return typeof tag === 'string' ? tag : '';
}

/** The first tag FE-… above those in use; FE-101 in a project without one. */
function nextTag(items: readonly unknown[], letters: 'FE' | 'FP'): string {
  const tag = new RegExp(`^${letters}-(\\d{1,9})$`);
  const numbers = items.flatMap((item) => tag.exec(tagOf(item))?.slice(1) ?? []).map(Number);
  return `${letters}-${Math.max(100, ...numbers) + 1}`;
}

/** A flange-tapped orifice plate in water whose bore is to be found; sizes and duty are left for the user to state. */
export function newMeter(meters: readonly unknown[]): MeterText {
  return {
    tag: nextTag(meters, 'FE'),
    fluid: { kind: 'water' },
    element: { kind: 'orifice-plate', tappings: 'flange' },
    find: 'bore',
  };
}

/** Air in a rectangular duct, five lines of five points, read with a pitot-static tube; the sides are left to be stated. */
export function newTraverse(traverses: readonly unknown[]): TraverseText {
  return {
    tag: nextTag(traverses, 'FP'),
    section: { shape: 'rectangular', ports: 'width' },
    rule: 'log-tchebycheff',
    lines: 5,
    pointsPerLine: 5,
    probe: { kind: 'pitot-static' },
    fluid: { kind: 'air' },
  };
}

/** The item again under a tag that is free: 'FE-101 copy', 'FE-101 copy 2'. */
export function copyOf(item: unknown, items: readonly unknown[]): Item {
  const taken = new Set(items.map(tagOf));
  const stem = `${tagOf(item).replace(/ copy( \d+)?$/, '')} copy`.trim();
  let tag = stem;
  for (let count = 2; taken.has(tag); count += 1) tag = `${stem} ${count}`;
  return { ...asItem(item), tag };
}
