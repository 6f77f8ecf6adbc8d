import { expect, test } from 'vitest';
import { campStanding, placesLeft } from '@/lib/domain/camp/camp-standing';
import { placesWords } from '@/lib/domain/camp/places-words';
import { priceFrom } from '@/lib/domain/camp/price-from';
import { minor } from '@/lib/domain/shared/money';

const camp = { startsOn: '2026-06-08', endsOn: '2026-06-12', timeZone: 'Pacific/Auckland' };
const places = (left: number, ...tracks: number[]) => ({
  camp: { left },
  tracks: tracks.map((each) => ({ places: { left: each } })),
});

// Auckland is UTC+12 in June, so its 9 June starts at noon UTC on the 8th.
test.each([
  ['published', '2026-05-01T00:00Z', places(5, 5), 'open'],
  ['published', '2026-05-01T00:00Z', places(0, 5), 'full'],
  ['published', '2026-05-01T00:00Z', places(5, 0, 0), 'full'],
  ['published', '2026-06-08T11:59Z', places(5, 5), 'open'],
  ['published', '2026-06-08T12:00Z', places(5, 5), 'begun'],
  ['published', '2026-06-12T11:59Z', places(5, 5), 'begun'],
  ['published', '2026-06-12T12:00Z', places(5, 5), 'past'],
  ['closed', '2026-05-01T00:00Z', places(5, 5), 'closed'],
  ['closed', '2026-06-12T12:00Z', places(5, 5), 'past'],
  ['draft', '2026-06-12T12:00Z', places(5, 5), 'draft'],
] as const)('%s at %s is %#: %j → %s', (state, at, left, standing) => {
  expect(campStanding({ ...camp, state }, left, Date.parse(at))).toBe(standing);
});

test('a camp has no more places than its tracks together', () => {
  expect(placesLeft(places(50, 3, 4))).toBe(7);
  expect(placesLeft(places(5, 30, 40))).toBe(5);
  expect(placesLeft(places(5))).toBe(0);
  expect([placesWords({ left: 1, of: 60 }), placesWords({ left: 0, of: 60 })]).toEqual([
    '1 of 60 places left',
    'Full',
  ]);
});

test('the price is the lowest of the tracks, and says when another costs more', () => {
  const at = (price: number | null) => ({ price: price === null ? null : minor(price) });
  expect(priceFrom(at(460), [at(null), at(500)])).toEqual({ price: 460, varies: true });
  expect(priceFrom(at(460), [at(null), at(null)])).toEqual({ price: 460, varies: false });
  expect(priceFrom(at(null), [at(300)])).toEqual({ price: 300, varies: false });
  expect(priceFrom(at(null), [at(null)])).toBeNull();
  expect(priceFrom(at(460), [])).toEqual({ price: 460, varies: false });
});
