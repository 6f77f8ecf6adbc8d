import type { TrackId } from '../shared/ids';
import type { ProgrammeWorkshop } from './programme';

/**
 * The most people that may come to a workshop: its own size, its tracks' places or the camp's, whichever is least.
 * Null for an elective without a size: it takes as many as the room seats.
 */
export function expectedPeople(
  workshop: Pick<ProgrammeWorkshop, 'audience' | 'capacity' | 'trackIds'>,
  tracks: readonly { id: TrackId; capacity: number }[],
  campCapacity: number,
): number | null {
  const { audience, capacity } = workshop;
  if (audience === 'elective') return capacity;
  const whole =
    audience === 'everyone'
      ? campCapacity
      : tracks
          .filter(({ id }) => workshop.trackIds.includes(id))
          .reduce((sum, track) => sum + track.capacity, 0);
  return Math.min(whole, campCapacity, capacity ?? Infinity);
}
