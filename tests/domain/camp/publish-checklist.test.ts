import { describe, expect, test } from 'vitest';
import { mayPublish, publishChecklist } from '@/lib/domain/camp/publish-checklist';
import { minor } from '@/lib/domain/shared/money';
import type { Programme } from '@/lib/domain/timetable/programme';
import { buildProgramme, CLASS, JAM, meetingOf } from '../../builders/build-programme';

const TODAY = '2026-05-01';
/** Both tracks have their core workshop, placed; a jam for everyone. */
const whole = (over: Parameters<typeof buildProgramme>[0] = {}): Programme =>
  buildProgramme({
    workshops: [{ ...CLASS, trackIds: ['trk_1a', 'trk_1b'] }, JAM],
    meetings: [
      meetingOf('wsh_1a', 'mtg_1a', { roomId: 'rom_1a' }),
      meetingOf('wsh_1b', 'mtg_1b', { starts: '20:00', lengthMinutes: 90 }),
    ],
    ...over,
  });
const missing = (programme: Programme, today = TODAY) =>
  publishChecklist(programme, today)
    .filter((item) => item.level === 'must' && item.missing)
    .map(({ code }) => code);

test('a whole programme may be published', () => {
  expect(missing(whole())).toEqual([]);
  expect(mayPublish(publishChecklist(whole(), TODAY))).toBe(true);
});

describe('each must stands in the way by itself', () => {
  const cases: [string, Programme][] = [
    ['venue', whole({ camp: { venueAddress: '' } })],
    ['price', whole({ camp: { price: null } })],
    ['capacity', whole({ camp: { capacity: 0 } })],
    ['refund-terms', whole({ camp: { refundTerms: '' } })],
    ['gates', whole({ tracks: [{ ...track('trk_1a'), gate: '' }, track('trk_1b')] })],
    ['core-workshops', whole({ tracks: [track('trk_1a'), track('trk_1b'), track('trk_1c')] })],
    ['core-meetings', whole({ meetings: [meetingOf('wsh_1b', 'mtg_1b')] })],
    [
      'meeting-days',
      whole({
        meetings: [meetingOf('wsh_1a', 'mtg_1a'), meetingOf('wsh_1a', 'mtg_1c', { day: '2026-06-13' })],
      }),
    ],
    [
      'clashes',
      whole({
        meetings: [meetingOf('wsh_1a', 'mtg_1a'), meetingOf('wsh_1b', 'mtg_1b', { starts: '10:00' })],
      }),
    ],
  ];
  test.each(cases)('%s', (code, programme) => {
    expect(missing(programme)).toEqual([code]);
    expect(mayPublish(publishChecklist(programme, TODAY))).toBe(false);
  });
  test('dates, once the last day is over in the camp’s zone', () => {
    expect(missing(whole(), '2026-06-12')).toEqual([]);
    expect(missing(whole(), '2026-06-13')).toEqual(['dates']);
  });
  test('tracks and rooms of an empty camp', () => {
    const empty: Programme = { ...whole({ tracks: [], workshops: [], meetings: [] }), rooms: [] };
    expect(missing(empty)).toEqual(['tracks', 'rooms']);
  });
});

test('a price of 0 is a price, and so is one on every track', () => {
  expect(missing(whole({ camp: { price: minor(0) } }))).toEqual([]);
  const priced = [track('trk_1a'), track('trk_1b')].map((row) => ({ ...row, price: minor(1000) }));
  expect(missing(whole({ camp: { price: null }, tracks: priced }))).toEqual([]);
});

test('advice is given and blocks nothing', () => {
  const items = publishChecklist(
    whole({
      camp: { summary: '', description: '', capacity: 100 },
      workshops: [
        { ...CLASS, trackIds: ['trk_1a', 'trk_1b'], needs: [], instructorIds: [] },
        JAM,
        { ...JAM, id: 'wsh_1c', title: 'Repair', audience: 'elective', kind: 'repair-bench' },
      ],
    }),
    TODAY,
  );
  const said = Object.fromEntries(
    items.filter((item) => item.missing).map((item) => [item.code, item.missing]),
  );
  expect(Object.keys(said).sort()).toEqual(
    [
      'description',
      'elective-places',
      'fit',
      'harps',
      'instructors',
      'meetings',
      'pictures',
      'summary',
      'track-places',
    ].sort(),
  );
  expect(said['track-places']).toBe('The tracks hold 80 together, the camp 100: 20 can never be sold.');
  expect(said.instructors).toBe('Bends in crossharp and Repair have no instructor.');
  expect(mayPublish(items)).toBe(true);
});

test('rules about nothing are not called done', () => {
  const codes = publishChecklist(whole({ tracks: [], workshops: [], meetings: [] }), TODAY).map(
    ({ code }) => code,
  );
  for (const moot of ['gates', 'core-workshops', 'core-meetings', 'clashes', 'harps'])
    expect(codes).not.toContain(moot);
});

function track(id: `trk_${string}`): Programme['tracks'][number] {
  return { id, name: id, level: 'start', gate: 'None.', capacity: 40, price: null };
}
