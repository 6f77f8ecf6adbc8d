import { expect, test } from 'vitest';
import { isRefused } from '@/lib/domain/timetable/clash';
import { clashSentence } from '@/lib/domain/timetable/clash-sentence';
import { findClashes } from '@/lib/domain/timetable/find-clashes';
import type { Programme } from '@/lib/domain/timetable/programme';
import { INSTRUCTORS, input, meeting, workshop } from './programme-parts';

function say(changes: Parameters<typeof meeting>[2], more: Parameters<typeof workshop>[1] = {}, camp = {}) {
  const of = input(
    [
      workshop('Jam basics', { kind: 'jam', instructorIds: ['ins_ana'] }),
      workshop('Scales', { trackIds: ['trk_b'], ...more }),
    ],
    [
      meeting('a', 'Jam basics', { day: '2026-06-09' }),
      meeting('b', 'Scales', { day: '2026-06-09', ...changes }),
    ],
    camp,
  );
  const names = { ...of, instructors: INSTRUCTORS } as unknown as Programme;
  return findClashes(of, 15).map((clash) => clashSentence(clash, names, 'mtg_b'));
}

test('who or what is taken, when, and by which workshop', () => {
  expect(say({})).toEqual(['Hall is taken Tuesday 10:00–11:15 by Jam basics.']);
  expect(say({ starts: '11:20' })).toEqual([
    'Hall is taken Tuesday 10:00–11:15 by Jam basics: only 5 minutes to change over.',
  ]);
  expect(say({ starts: '11:15', roomId: 'rom_barn' }, { instructorIds: ['ins_ana'], capacity: 8 })).toEqual([
    'Ana Teixeira teaches Jam basics Tuesday 10:00–11:15: no time to change over.',
  ]);
  expect(say({ starts: '10:30', roomId: 'rom_barn' }, { trackIds: ['trk_a'], capacity: 8 })).toEqual([
    'First breath has Jam basics Tuesday 10:00–11:15.',
  ]);
  expect(say({ starts: '10:30', roomId: 'rom_barn' }, { audience: 'everyone', capacity: 8 })).toEqual([
    'Jam basics is Tuesday 10:00–11:15, and one of the two is for everyone.',
  ]);
});

test('room size, loudness and days', () => {
  expect(say({ starts: '14:00', roomId: 'rom_barn' }, { kind: 'band-lab' })).toEqual([
    'Barn seats 12; 20 may come to Scales.',
    'Scales is amplified, louder than Barn can take.',
  ]);
  expect(say({ day: '2026-06-13' })).toEqual([
    'Scales is Saturday 13 June 10:00–11:15, outside the camp’s days.',
  ]);
});

test('a camp longer than a week needs the date', () => {
  expect(say({}, {}, { endsOn: '2026-06-16' })).toEqual([
    'Hall is taken Tuesday 9 June 10:00–11:15 by Jam basics.',
  ]);
});

test('what is only worth a look is not among the refusals', () => {
  const of = input([workshop('Jam', { kind: 'jam' })], [meeting('a', 'Jam', { roomId: 'rom_barn' })]);
  const clashes = findClashes(of, 15);
  expect(clashes).toHaveLength(2);
  expect(clashes.filter(isRefused)).toEqual([]);
});
