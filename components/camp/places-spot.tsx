'use client';

import { useSyncExternalStore } from 'react';
import { placesStore } from '@/lib/client/places-store';
import { PlacesLeft } from './places-left';

type PlacesSpotProps = {
  slug: string /** Of this track; of the whole camp without it. */;
  trackId?: string;
  left: number;
  of: number;
};

/** Places left as the server counted them, then as they change. */
export function PlacesSpot({ slug, trackId, left, of }: PlacesSpotProps) {
  const live = useSyncExternalStore(
    placesStore.subscribe,
    () => placesStore.get(slug),
    () => undefined,
  );
  const now = trackId ? live?.tracks[trackId] : live?.camp;
  return <PlacesLeft {...(now ?? { left, of })} />;
}
