import type { TrackId } from '../shared/ids';
import { ownMeetings } from '../timetable/own-meetings';
import type { Programme } from '../timetable/programme';
import { buildPackingList } from './build-packing-list';
import type { PackingList } from './packing-list';
import { toPackingMeetings } from './to-packing-meetings';

export type TrackHarps = ReadonlyMap<TrackId, PackingList>;

/** What somebody who owns no harp and takes no elective packs for a track: what the camp page tells before one buys. */
export const trackHarps = (
  programme: Pick<Programme, 'workshops' | 'meetings' | 'rooms'>,
  trackId: TrackId,
): PackingList =>
  buildPackingList({
    meetings: toPackingMeetings(programme, ownMeetings(programme, { trackId, electives: [] })),
    owned: [],
  });
