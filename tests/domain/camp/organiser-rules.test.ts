import fc from 'fast-check';
import { expect, test } from 'vitest';
import { isCampCurrency } from '@/lib/domain/camp/camp-currency';
import { dayAfter, dayOffset } from '@/lib/domain/camp/day-offset';
import { nextStep } from '@/lib/domain/camp/next-step';
import { scarcestFirst } from '@/lib/domain/camp/scarcest-first';
import { suggestSlug } from '@/lib/domain/camp/suggest-slug';
import { readTimeZone } from '@/lib/domain/camp/time-zones';
import { moveByOne } from '@/lib/domain/shared/move-by-one';

test.each([
  ['Kettle Lake Harp Week', 'kettle-lake-harp-week'],
  ['Łódź & Söhne: Bläserstraße', 'lodz-sohne-blaserstrasse'],
  ["O'Hara’s  --  Days 2027", 'oharas-days-2027'],
  ['東京ハープ', 'camp'],
  ['<b>', 'camp'],
])('web name of %s', (name, slug) => expect(suggestSlug(name, 'camp')).toBe(slug));

test('any name gives a web name that the form takes', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'grapheme', maxLength: 100 }), (name) => {
      expect(suggestSlug(name, 'camp')).toMatch(/^(?=.{3,60}$)[a-z0-9]+(-[a-z0-9]+)*$/);
    }),
  );
});

// ISO 4217 list one: XAU, XTS, XDR and the fund codes are no money to pay with.
test.each(['EUR', 'JPY', 'BHD', 'XOF', 'XAF', 'XPF', 'XCD'])('%s can be paid in', (code) =>
  expect(isCampCurrency(code)).toBe(true),
);
test.each(['XAU', 'XTS', 'XDR', 'CLF', 'USN', 'XXX', 'ABC', ''])('“%s” cannot', (code) =>
  expect(isCampCurrency(code)).toBe(false),
);

// IANA time zone database: names, links, and what is neither.
test.each([
  ['europe/berlin', 'Europe/Berlin'],
  ['Australia/Lord_Howe', 'Australia/Lord_Howe'],
  ['Asia/Kolkata', 'Asia/Kolkata'],
  ['UTC', 'UTC'],
])('zone %s', (text, zone) => expect(readTimeZone(text)).toBe(zone));
test.each(['+01:00', 'CET+1', 'Berlin', 'Mars/Base', '../etc', ''])('no zone: “%s”', (text) =>
  expect(readTimeZone(text)).toBeNull(),
);

test('days are counted over clock changes, leap days and year ends alike', () => {
  expect(dayOffset('2027-03-27', '2027-03-29')).toBe(2);
  expect(dayOffset('2028-02-28', '2028-03-01')).toBe(2);
  expect(dayOffset('2027-06-07', '2026-06-08')).toBe(-364);
  expect(dayAfter('2027-12-31', 1)).toBe('2028-01-01');
});

test('moving by one keeps every row, and does nothing at the edge or for a stranger', () => {
  expect(moveByOne(['a', 'b', 'c'], 'b', 'up')).toEqual(['b', 'a', 'c']);
  expect(moveByOne(['a', 'b', 'c'], 'b', 'down')).toEqual(['a', 'c', 'b']);
  expect(moveByOne(['a', 'b'], 'a', 'up')).toEqual(['a', 'b']);
  expect(moveByOne(['a', 'b'], 'b', 'down')).toEqual(['a', 'b']);
  expect(moveByOne(['a', 'b'], 'x', 'down')).toEqual(['a', 'b']);
});

test('what runs out first is on top, and a track has no more left than the camp', () => {
  const places = (capacity: number, taken: number) => ({ capacity, taken, left: capacity - taken });
  const rows = scarcestFirst(
    {
      camp: places(60, 55),
      tracks: [
        { id: 'trk_1', places: places(40, 20) },
        { id: 'trk_2', places: places(20, 18) },
      ],
      electives: [{ id: 'wsh_1', places: places(8, 8) }],
    },
    {
      tracks: [
        { id: 'trk_1', name: 'Clean' },
        { id: 'trk_2', name: 'Bending' },
      ],
      workshops: [{ id: 'wsh_1', title: 'Repair' }],
    },
  );
  expect(rows.map(({ name, places: { left } }) => [name, left])).toEqual([
    ['Repair', 0],
    ['Bending', 2],
    ['The whole camp', 5],
    ['Clean', 5],
  ]);
});

test.each([
  ['draft', '2026-05-01', 'Before you publish: venue.'],
  ['published', '2026-05-01', null],
  ['published', '2026-06-01', 'Begins in 7 days: look through the people and who still owes.'],
  ['published', '2026-06-07', 'Begins tomorrow: try the door on a phone.'],
  ['published', '2026-06-08', 'Begins today: the door is open.'],
  ['published', '2026-06-12', 'It is running.'],
  ['published', '2026-06-13', 'It is over: close the sale.'],
  ['closed', '2026-06-13', null],
] as const)('next for a %s camp on %s', (state, today, said) => {
  const items = [
    { code: 'venue', level: 'must', title: 'Venue', missing: 'No venue.', mend: 'details' },
  ] as const;
  expect(nextStep({ state, startsOn: '2026-06-08', endsOn: '2026-06-12' }, items, today)).toBe(said);
});
