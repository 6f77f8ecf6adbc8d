import type { InstructorId, MeetingId, RoomId, TrackId, WorkshopId } from '@/lib/domain/shared/ids';
import type { ClashInput } from '@/lib/domain/timetable/find-clashes';

type Workshop = ClashInput['workshops'][number];
type Meeting = ClashInput['meetings'][number];

export const CAMP: ClashInput['camp'] = {
  startsOn: '2026-06-08',
  endsOn: '2026-06-12',
  timeZone: 'Europe/Berlin',
  capacity: 60,
};
export const TRACKS = [
  { id: 'trk_a' as TrackId, name: 'First breath', capacity: 20 },
  { id: 'trk_b' as TrackId, name: 'Bending', capacity: 20 },
];
export const ROOMS = [
  { id: 'rom_hall' as RoomId, name: 'Hall', seats: 80, loudness: 'amplified' as const },
  { id: 'rom_barn' as RoomId, name: 'Barn', seats: 12, loudness: 'quiet' as const },
];
export const INSTRUCTORS = [
  { id: 'ins_ana' as InstructorId, name: 'Ana Teixeira', bio: '' },
  { id: 'ins_bo' as InstructorId, name: 'Bo Lindqvist', bio: '' },
];

/** A core technique class of the first track without an instructor, unless said otherwise. */
export const workshop = (id: string, more: Partial<Workshop> = {}): Workshop & { title: string } => ({
  kind: 'technique',
  audience: 'core',
  capacity: null,
  trackIds: ['trk_a'],
  instructorIds: [],
  title: id,
  ...more,
  id: `wsh_${id}` as WorkshopId,
});

/** Monday 10:00 to 11:15 in the hall, unless said otherwise. */
export const meeting = (id: string, of: string, more: Partial<Meeting> = {}): Meeting => ({
  roomId: 'rom_hall',
  day: '2026-06-08',
  starts: '10:00',
  lengthMinutes: 75,
  ...more,
  id: `mtg_${id}` as MeetingId,
  workshopId: `wsh_${of}` as WorkshopId,
});

export const input = (
  workshops: Workshop[],
  meetings: Meeting[],
  camp: Partial<ClashInput['camp']> = {},
): ClashInput => ({ camp: { ...CAMP, ...camp }, tracks: TRACKS, rooms: ROOMS, workshops, meetings });
