/** The places of the program, as hash routes. */
import { useSyncExternalStore } from 'react';

export const PLACES = [
  { id: 'size', label: 'Size' },
  { id: 'read', label: 'Read' },
  { id: 'survey', label: 'Survey' },
  { id: 'sheet', label: 'Sheet' },
] as const;

export type PlaceId = (typeof PLACES)[number]['id'];

const placeOf = (hash: string): PlaceId =>
  PLACES.find(({ id }) => hash === `#/${id}` || hash.startsWith(`#/${id}/`))?.id ?? 'size';

/** The place at hand, for what is done on a key. */
export const placeNow = (): PlaceId => placeOf(window.location.hash);

export function goTo(place: PlaceId): void {
  window.location.hash = `#/${place}`;
}

const subscribe = (changed: () => void): (() => void) => {
  window.addEventListener('hashchange', changed);
  return () => window.removeEventListener('hashchange', changed);
};

export const usePlace = (): PlaceId => useSyncExternalStore(subscribe, placeNow);
