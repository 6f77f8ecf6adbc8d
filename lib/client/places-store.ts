import type { LivePlaces } from '@/lib/domain/camp/live-places';

type Listener = () => void;
const held = new Map<string, LivePlaces>();
const listeners = new Set<Listener>();

/** The newest places by camp, for every count on the page; empty until the first answer. */
export const placesStore = {
  subscribe(listener: Listener): () => void {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
  get: (slug: string): LivePlaces | undefined => held.get(slug),
  put(slug: string, places: LivePlaces): void {
    held.set(slug, places);
    for (const listener of listeners) listener();
  },
};
