/** Which place is shown, kept in the hash so that the browser's back button works. */
import { type ReadonlySignal, signal } from '@preact/signals';

export const places = ['size', 'drift', 'book'] as const;
export type Place = (typeof places)[number];

export interface Route {
  readonly place: ReadonlySignal<Place>;
  go(place: Place): void;
}

export const hashOf = (place: Place): string => `#/${place}`;

const placeOf = (hash: string): Place => places.find((place) => hashOf(place) === hash) ?? 'size';

export function createRoute(page: Pick<Window, 'location' | 'addEventListener'>): Route {
  const place = signal(placeOf(page.location.hash));
  page.addEventListener('hashchange', () => {
    place.value = placeOf(page.location.hash);
  });
  return {
    place,
    go: (next) => {
      page.location.hash = hashOf(next);
    },
  };
}
