import { describe, expect, test } from 'vitest';
import { orderReference } from '@/lib/domain/orders/order-reference';
import { findElectiveClashes } from '@/lib/domain/registration/find-elective-clashes';
import { quoteRegistration } from '@/lib/domain/registration/quote-registration';
import { refusePlaces } from '@/lib/domain/registration/refuse-places';
import { saleState } from '@/lib/domain/registration/sale-state';
import { foldSearch } from '@/lib/domain/shared/fold-search';
import { minor } from '@/lib/domain/shared/money';
import { suggestEmail } from '@/lib/domain/shared/suggest-email';
import { countryOfZone, sayPhone, toE164 } from '@/lib/domain/shared/to-e164';
import type { ProgrammeMeeting, ProgrammeWorkshop } from '@/lib/domain/timetable/programme';

describe('a phone number in E.164', () => {
  // libphonenumber's own documentation has 020 7183 8750 in GB as +442071838750; the 7946 0 numbers are those that
  // Ofcom keeps free for drama.
  test.each([
    ['020 7183 8750', 'GB', '+442071838750'],
    ['+44 20 7946 0018', undefined, '+442079460018'],
    ['0044 (0)20 7946-0018', 'DE', '+442079460018'],
    ['030/1234567', 'DE', '+49301234567'],
    ['(201) 555-0123', 'US', '+12015550123'],
    ['020 7946 0018', undefined, null],
    ['12', 'GB', null],
    ['call me', 'GB', null],
    ['', 'GB', null],
    ['+999 12345678', 'GB', null],
    ['+44 20 7946 0018 or ask for Sami', 'GB', null],
  ] as const)('%s in %s', (text, country, e164) => {
    expect(toE164(text, country)).toBe(e164);
  });
  test('is said with spaces, and the zone names the country', () => {
    expect(sayPhone('+442071838750')).toBe('+44 20 7183 8750');
    // IANA zone.tab.
    expect(['Europe/Berlin', 'America/New_York', 'Asia/Tokyo', 'UTC'].map(countryOfZone)).toEqual([
      'DE',
      'US',
      'JP',
      undefined,
    ]);
  });
});

describe('an address that looks mistyped', () => {
  test.each([
    ['noor@example.con', 'noor@example.com'],
    ['noor@example,org', 'noor@example.org'],
    ['noor@example..org', 'noor@example.org'],
    ['noor@www.example.org', 'noor@example.org'],
    ['noor@example.co.ku', 'noor@example.co.uk'],
    ['noor@example.ogr', 'noor@example.org'],
    ['noor@example.org', null],
    ['noor@example.co', null],
    ['noor@example.museum', null],
    ['@example.con', null],
    ['no at', null],
  ])('%s', (typed, meant) => expect(suggestEmail(typed)).toBe(meant));
});

test('names are folded for search', () => {
  expect(
    ['Łukasz Ångström', 'Þóra  Ægisdóttir', 'Nguyễn Thị Ánh', '山田 花子', 'STRASSE ß'].map(foldSearch),
  ).toEqual(['lukasz angstrom', 'thora aegisdottir', 'nguyen thi anh', '山田 花子', 'strasse ss']);
});

describe('places are given all or none', () => {
  const left = (camp: number, track: number, elective: number) => ({
    camp: { left: camp },
    tracks: [{ id: 'trk_a' as const, places: { left: track } }],
    electives: [{ id: 'wsh_e' as const, places: { left: elective } }],
  });
  const one = { trackId: 'trk_a', electives: ['wsh_e', 'wsh_unlimited'] } as const;
  test.each([
    ['room for one', left(1, 1, 1), [one], null],
    ['camp full', left(0, 1, 1), [one], { code: 'camp_full', left: 0 }],
    ['track full', left(1, 0, 1), [one], { code: 'track_full', trackId: 'trk_a', left: 0 }],
    ['elective full', left(1, 1, 0), [one], { code: 'elective_full', workshopId: 'wsh_e', left: 0 }],
    ['room for one of two', left(2, 1, 2), [one, one], { code: 'track_full', trackId: 'trk_a', left: 1 }],
    ['the second wants no elective', left(2, 2, 1), [one, { trackId: 'trk_a', electives: [] }], null],
  ] as const)('%s', (_what, places, wanted, refusal) =>
    expect(refusePlaces(places, wanted)).toEqual(refusal),
  );
});

describe('a quote', () => {
  const track = (price: number | null) => ({
    id: 'trk_a' as const,
    name: 'Bending',
    level: 'bending' as const,
    gate: '',
    capacity: 1,
    price: price === null ? null : minor(price),
  });
  const camp = (price: number | null) => ({
    name: 'Kettle Lake',
    currency: 'JPY',
    price: price === null ? null : minor(price),
  });
  test.each([
    ['the camp’s price', null, 52_000, 52_000],
    ['the track’s own', 61_000, 52_000, 61_000],
    ['a track that costs nothing', 0, 52_000, 0],
  ])('%s', (_what, own, general, total) => {
    const quote = quoteRegistration({ camp: camp(general), tracks: [track(own)] }, ['trk_a']);
    expect(quote).toMatchObject({
      currency: 'JPY',
      total,
      lines: [{ label: 'Kettle Lake, Bending', quantity: 1, unit: total, amount: total }],
    });
  });
  test('of two attendees is the sum of two lines; without a price, or for a strange track, there is none', () => {
    expect(quoteRegistration({ camp: camp(1), tracks: [track(3)] }, ['trk_a', 'trk_a'])?.total).toBe(6);
    expect(quoteRegistration({ camp: camp(null), tracks: [track(null)] }, ['trk_a'])).toBeNull();
    expect(quoteRegistration({ camp: camp(1), tracks: [track(3)] }, ['trk_b'])).toBeNull();
  });
});

describe('sale', () => {
  // Midnight where the camp is: Pacific/Auckland is 12 hours ahead of UTC in June, America/Los_Angeles 7 behind.
  test.each([
    ['Pacific/Auckland', '2026-06-08T11:59:59Z', 'open'],
    ['Pacific/Auckland', '2026-06-08T12:00:00Z', 'begun'],
    ['America/Los_Angeles', '2026-06-09T06:59:59Z', 'open'],
    ['America/Los_Angeles', '2026-06-09T07:00:00Z', 'begun'],
  ])('%s at %s', (timeZone, at, state) =>
    expect(saleState({ state: 'published', startsOn: '2026-06-08', timeZone }, Date.parse(at))).toBe(state),
  );
});

describe('electives that meet at the same time', () => {
  const workshop = (id: string, audience: 'core' | 'elective' | 'everyone') =>
    ({
      id: `wsh_${id}`,
      title: id,
      description: '',
      kind: 'jam',
      audience,
      lengthMinutes: 60,
      capacity: null,
      trackIds: ['trk_a'],
      instructorIds: [],
      needs: [],
    }) satisfies ProgrammeWorkshop;
  const meets = (id: string, starts: string, day = '2026-06-08') =>
    ({
      id: `mtg_${id}${day}${starts.replace(':', '')}`,
      workshopId: `wsh_${id}`,
      roomId: 'rom_a',
      day,
      starts,
      lengthMinutes: 60,
      sequence: 0,
      updatedAt: 0,
    }) satisfies ProgrammeMeeting;
  const programme = (...meetings: ProgrammeMeeting[]) => ({
    camp: { timeZone: 'Europe/Berlin' },
    workshops: [
      workshop('core', 'core'),
      workshop('one', 'elective'),
      workshop('two', 'elective'),
      workshop('jam', 'everyone'),
    ],
    meetings,
  });
  const both = { trackId: 'trk_a', electives: ['wsh_one', 'wsh_two'] } as const;
  const titles = (...meetings: ProgrammeMeeting[]) =>
    findElectiveClashes(programme(...meetings), both).map(({ title, other }) => [title, other]);
  test('clash with each other and with the track’s own', () => {
    expect(titles(meets('one', '10:00'), meets('two', '10:59'))).toEqual([['two', 'one']]);
    expect(titles(meets('one', '10:30'), meets('core', '10:00'))).toEqual([['one', 'core']]);
    expect(titles(meets('one', '23:30'), meets('two', '00:15', '2026-06-09'))).toEqual([['two', 'one']]);
  });
  test('do not clash back to back, on another day, or with what is for everyone', () => {
    expect(titles(meets('one', '10:00'), meets('two', '11:00'))).toEqual([]);
    expect(titles(meets('one', '10:00'), meets('two', '10:00', '2026-06-09'))).toEqual([]);
    expect(titles(meets('one', '10:00'), meets('jam', '10:00'))).toEqual([]);
    expect(
      findElectiveClashes(programme(meets('one', '10:00'), meets('two', '10:00')), {
        trackId: 'trk_a',
        electives: ['wsh_one'],
      }),
    ).toEqual([]);
  });
});

test('a reference is eight letters of an alphabet without look-alikes, or nothing when the bytes run out', () => {
  expect(orderReference(Uint8Array.from([0, 1, 2, 3, 27, 28, 252, 255, 55, 251]))).toBe('2345Z2ZZ');
  expect(orderReference(Uint8Array.from([255, 254]))).toBeNull();
  expect('23456789BCDFGHJKMNPQRSTVWXYZ').not.toMatch(/[01OILAEU]/);
});
