import { minor } from '@/lib/domain/shared/money';
import type { Programme, ProgrammeMeeting, ProgrammeWorkshop } from '@/lib/domain/timetable/programme';
import { NOW } from './build-camp';

/** A small programme as plain data, for what needs no database: two tracks, two rooms, a class and a jam past midnight. */
export function buildProgramme(
  over: {
    camp?: Partial<Programme['camp']>;
    workshops?: ProgrammeWorkshop[];
    meetings?: ProgrammeMeeting[];
  } & Partial<Pick<Programme, 'tracks' | 'pictures' | 'instructors' | 'blocks'>> = {},
): Programme {
  return {
    camp: {
      id: 'cmp_1',
      organisationId: 'org_1',
      organisationName: 'Slate Ridge Harp Society',
      organisationEmail: 'office@slateridge.example',
      slug: 'kettle-lake-2026',
      name: 'Kettle Lake Harp Week',
      summary: 'Five days of harmonica by the lake.',
      description: 'Bring a chair for the jam.\n\nThe hall is heated.',
      startsOn: '2026-06-08',
      endsOn: '2026-06-12',
      timeZone: 'Europe/Berlin',
      currency: 'EUR',
      venueName: 'Kettle Lake Hall',
      venueAddress: '1 Lake Road',
      capacity: 60,
      price: minor(46_000),
      refundTerms: 'Until 60 days before: all but 50 EUR.',
      arrivalFrom: '14:00',
      state: 'published',
      version: 1,
      updatedAt: NOW,
      ...over.camp,
    },
    tracks: over.tracks ?? [
      { id: 'trk_1a', name: 'First breath', level: 'start', gate: 'None.', capacity: 40, price: null },
      { id: 'trk_1b', name: 'Bending', level: 'bending', gate: 'Bends 4 draw.', capacity: 40, price: null },
    ],
    rooms: [
      { id: 'rom_1a', name: 'Hall', seats: 80, loudness: 'amplified', kit: '' },
      { id: 'rom_1b', name: 'Barn', seats: 20, loudness: 'quiet', kit: '' },
    ],
    instructors: over.instructors ?? [{ id: 'ins_1a', name: 'Ana Teixeira', bio: '' }],
    workshops: over.workshops ?? [CLASS, JAM],
    meetings: over.meetings ?? [
      meetingOf('wsh_1a', 'mtg_1a'),
      meetingOf('wsh_1b', 'mtg_1b', { starts: '23:00', lengthMinutes: 120 }),
    ],
    blocks: over.blocks ?? [],
    pictures: over.pictures ?? [],
  };
}

export const CLASS: ProgrammeWorkshop = {
  id: 'wsh_1a',
  title: 'Bends in crossharp',
  description: 'Slow and clean.',
  kind: 'technique',
  audience: 'core',
  lengthMinutes: 75,
  capacity: null,
  trackIds: ['trk_1b'],
  instructorIds: ['ins_1a'],
  needs: [
    {
      level: 'required',
      anyOf: [
        {
          by: 'song',
          songKey: { tonic: 'E', minor: false },
          position: 2,
          tuning: 'richter',
          register: 'standard',
        },
        { by: 'harp', labelKey: 'D', tuning: 'richter', register: 'standard' },
      ],
    },
  ],
};

export const JAM: ProgrammeWorkshop = {
  id: 'wsh_1b',
  title: 'Late jam',
  description: '',
  kind: 'jam',
  audience: 'everyone',
  lengthMinutes: 120,
  capacity: null,
  trackIds: [],
  instructorIds: [],
  needs: [],
};

export const meetingOf = (
  workshopId: ProgrammeMeeting['workshopId'],
  id: ProgrammeMeeting['id'],
  over: Partial<ProgrammeMeeting> = {},
): ProgrammeMeeting => ({
  id,
  workshopId,
  roomId: 'rom_1a',
  day: '2026-06-09',
  starts: '09:30',
  lengthMinutes: 75,
  sequence: 0,
  updatedAt: NOW,
  ...over,
});
