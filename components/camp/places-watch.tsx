'use client';

import { useEffect, useSyncExternalStore } from 'react';
import { placesStore } from '@/lib/client/places-store';
import { placesWords } from '@/lib/domain/camp/places-words';

type PlacesWatchProps = { slug: string; left: number };

/**
 * Keeps the counts of the page fresh. What asks the server is loaded after the page has settled, so that it costs the
 * first view nothing; a change of the camp's own count is announced, politely, and nothing else is.
 */
export function PlacesWatch({ slug, left }: PlacesWatchProps) {
  const live = useSyncExternalStore(
    placesStore.subscribe,
    () => placesStore.get(slug),
    () => undefined,
  );
  useEffect(() => {
    let gone = false;
    let stop: (() => void) | undefined;
    const settled = setTimeout(async () => {
      const { watchPlaces } = await import('@/lib/client/watch-places');
      if (!gone) stop = watchPlaces(slug);
    }, 1500);
    return () => {
      gone = true;
      clearTimeout(settled);
      stop?.();
    };
  }, [slug]);
  return (
    <p role="status" className="sr-only">
      {live && live.camp.left !== left ? `Now ${placesWords(live.camp)}` : ''}
    </p>
  );
}
