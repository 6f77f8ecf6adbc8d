import type { RoomLoudness } from '../camp/camp-words';
import type { InstructorId, MeetingId, RoomId, TrackId } from '../shared/ids';

type Pair = { meetingId: MeetingId; otherId: MeetingId };
/** Minutes between the two, less than a changeover; null when they overlap. */
type Near = { gapMinutes: number | null };

/**
 * Something wrong with a timetable, as plain data. Of a pair the earlier meeting comes first. `everyone`:
 * one of the two is for everybody, so that whoever is at the other misses it.
 */
export type Clash =
  | ({ kind: 'room'; roomId: RoomId } & Pair & Near)
  | ({ kind: 'instructor'; instructorId: InstructorId } & Pair & Near)
  | ({ kind: 'track'; trackId: TrackId } & Pair)
  | ({ kind: 'everyone' } & Pair)
  | ({ kind: 'same-workshop' } & Pair)
  | { kind: 'outside-days'; meetingId: MeetingId }
  | { kind: 'seats'; meetingId: MeetingId; roomId: RoomId; seats: number; people: number }
  | { kind: 'loudness'; meetingId: MeetingId; roomId: RoomId; needs: RoomLoudness };

/** Room size and loudness are the organiser's to weigh, so they are shown; the rest cannot work and is refused. */
export const isRefused = (clash: Clash): boolean => clash.kind !== 'seats' && clash.kind !== 'loudness';

export const touches = (clash: Clash, meetingId: MeetingId): boolean =>
  clash.meetingId === meetingId || ('otherId' in clash && clash.otherId === meetingId);
