import type { TrackId, WorkshopId } from '../shared/ids';

export type Wanted = { trackId: TrackId; electives: readonly WorkshopId[] };
export type PlacesLeft = {
  camp: { left: number };
  tracks: readonly { id: TrackId; places: { left: number } }[];
  /** Electives without a limit are absent. */
  electives: readonly { id: WorkshopId; places: { left: number } }[];
};
export type PlaceRefusal =
  | { code: 'camp_full'; left: number }
  | { code: 'track_full'; trackId: TrackId; left: number }
  | { code: 'elective_full'; workshopId: WorkshopId; left: number };

/** Places for all attendees of an order, or the first thing that is short: all or nothing. Null when there is room. */
export function refusePlaces(left: PlacesLeft, wanted: readonly Wanted[]): PlaceRefusal | null {
  if (left.camp.left < wanted.length) return { code: 'camp_full', left: left.camp.left };
  for (const { id, places } of left.tracks) {
    const asked = wanted.filter(({ trackId }) => trackId === id).length;
    if (asked > places.left) return { code: 'track_full', trackId: id, left: places.left };
  }
  for (const { id, places } of left.electives) {
    const asked = wanted.filter(({ electives }) => electives.includes(id)).length;
    if (asked > places.left) return { code: 'elective_full', workshopId: id, left: places.left };
  }
  return null;
}
