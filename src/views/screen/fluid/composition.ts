/** Changes of a composition as the document holds it: a group of names, each with its share, in the order of writing. */
import { convertShare, type ShareUnit, unitOfShare } from './share.ts';

export type Composition = Readonly<Record<string, unknown>>;

export interface Entry {
  readonly name: string;
  readonly text: string;
}

const isGroup = (value: unknown): value is Composition =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** What stands in the document; nothing where it is no group. */
export const compositionIn = (value: unknown): Composition => (isGroup(value) ? value : {});

export const entriesOf = (composition: Composition): readonly Entry[] =>
  Object.entries(composition).map(([name, share]) => ({
    name,
    text: typeof share === 'string' || typeof share === 'number' ? String(share) : '',
  }));

export const withShare = (composition: Composition, name: string, text: string): Composition => ({
  ...composition,
  [name]: text,
});

/** The share of `from` under another name, in its place. A name that is already there keeps its own share. */
export function renamed(composition: Composition, from: string, to: string): Composition {
  if (Object.hasOwn(composition, to)) return composition;
  return Object.fromEntries(Object.entries(composition).map(([name, share]) => [name === from ? to : name, share]));
}

/** Undefined when nothing is left, so that the key goes. */
export function without(composition: Composition, name: string): Composition | undefined {
  const left = Object.entries(composition).filter(([other]) => other !== name);
  return left.length === 0 ? undefined : Object.fromEntries(left);
}

/** The unit the boxes show: that of the first share, per cent where none is written. */
export function tableUnit(composition: Composition): ShareUnit {
  const first = entriesOf(composition).find(({ text }) => text.trim() !== '');
  const unit = first && unitOfShare(first.text);
  return unit === '1' ? '1' : '%';
}

/** Every share in another unit, figures unchanged. */
export const inUnit = (composition: Composition, unit: ShareUnit): Composition =>
  Object.fromEntries(
    Object.entries(composition).map(([name, share]) => {
      const number = typeof share === 'number' ? String(share) : share;
      return [name, typeof number === 'string' && number !== '' ? convertShare(number, unit) : share];
    }),
  );
