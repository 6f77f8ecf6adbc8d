import { QueryClient, QueryObserver } from '@tanstack/react-query';
import type { LivePlaces } from '@/lib/domain/camp/live-places';
import { placesStore } from './places-store';

const EVERY = 20_000;

async function fetchPlaces(slug: string, signal: AbortSignal): Promise<LivePlaces> {
  const response = await fetch(`/api/camps/${slug}/places`, { signal });
  if (!response.ok) throw new Error(`Places answered ${response.status}`);
  return response.json();
}

/**
 * Asks for the places of a camp every twenty seconds while the page is in view, and at once when it comes back into
 * view. A failed answer changes nothing on the page. Ends with the returned function.
 */
export function watchPlaces(slug: string): () => void {
  const client = new QueryClient();
  client.mount();
  const observer = new QueryObserver(client, {
    queryKey: ['places', slug],
    queryFn: ({ signal }) => fetchPlaces(slug, signal),
    refetchInterval: EVERY,
    staleTime: EVERY / 2,
    retry: 1,
  });
  const stop = observer.subscribe(({ data }) => {
    if (data) placesStore.put(slug, data);
  });
  return () => {
    stop();
    client.unmount();
    client.clear();
  };
}
