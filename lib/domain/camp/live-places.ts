import { placesLeft } from './camp-standing';
import type { CampPlaces } from './places';

/** What the page asks for every few seconds: places left, of the camp as a whole and by track id. */
export type LivePlaces = {
  camp: { left: number; of: number };
  tracks: Record<string, { left: number; of: number }>;
};

export const toLivePlaces = (places: CampPlaces): LivePlaces => ({
  camp: { left: placesLeft(places), of: places.camp.capacity },
  tracks: Object.fromEntries(
    places.tracks.map((track) => [track.id, { left: track.places.left, of: track.places.capacity }]),
  ),
});
