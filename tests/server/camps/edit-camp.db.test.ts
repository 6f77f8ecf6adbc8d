import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, test } from 'vitest';
import { audit } from '@/db/schema/audit';
import { camp } from '@/db/schema/camp';
import { meeting } from '@/db/schema/workshop';
import type { EditCampInput } from '@/lib/schemas/camp';
import { editCamp } from '@/lib/server/camps/edit-camp';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildRegistration } from '../../builders/build-registration';
import { buildUser } from '../../builders/build-user';
import { buildWorkshop } from '../../builders/build-workshop';
import { staff } from '../../builders/staff';
import { useTestDatabase } from '../../setup/test-database';

const held = useTestDatabase();
const context = { actor: staff('organiser'), now: NOW + 1000 };
const INPUT: EditCampInput = {
  campId: 'cmp_1',
  version: 1,
  name: 'Kettle Lake Harp Week',
  slug: 'kettle-lake-1',
  startsOn: '2026-06-08',
  endsOn: '2026-06-12',
  moveMeetings: false,
  timeZone: 'Europe/Berlin',
  zoneConfirmed: false,
  currency: 'EUR',
  venueName: 'Kettle Lake Hall',
  venueAddress: '1 Lake Road',
  capacity: 60,
  price: '460.00',
  refundTerms: 'Until 60 days before: all but 50 EUR.',
  arrivalFrom: '14:00',
  summary: '',
  description: '',
};
const row = () => held.db.select().from(camp).where(eq(camp.id, 'cmp_1')).get();
const fieldsOf = (input: Partial<EditCampInput>) => {
  const result = editCamp({ ...INPUT, ...input }, context);
  return result.ok ? null : (result.error.fields ?? { '': [result.error.sentence ?? result.error.code] });
};

beforeEach(() => {
  buildCamp(held.db);
  buildUser(held.db, { id: 'usr_organiser', roles: ['organiser'] });
  const workshopId = buildWorkshop(held.db, { id: 'wsh_1a', trackIds: ['trk_1a'] });
  held.db
    .insert(meeting)
    .values({
      id: 'mtg_1',
      campId: 'cmp_1',
      workshopId,
      roomId: 'rom_1b',
      day: '2026-06-12',
      starts: '09:30',
      lengthMinutes: 75,
      updatedAt: NOW,
    })
    .run();
});

test('an edit raises the version and leaves a line that says who changed what', () => {
  expect(editCamp({ ...INPUT, name: 'Kettle Lake Days', price: '1,250.50' }, context).ok).toBe(true);
  expect(row()).toMatchObject({
    name: 'Kettle Lake Days',
    price: 125_050,
    version: 2,
    updatedAt: NOW + 1000,
  });
  const line = held.db.select().from(audit).get();
  expect(line).toMatchObject({ actorUserId: 'usr_organiser', campId: 'cmp_1', action: 'camp.edit' });
  expect(line?.sentence).toContain('name Kettle Lake Harp Week → Kettle Lake Days');
});

test('a form opened before another edit is refused as stale and changes nothing', () => {
  editCamp({ ...INPUT, name: 'First' }, context);
  const late = editCamp({ ...INPUT, name: 'Second' }, context);
  expect(late).toMatchObject({ ok: false, error: { code: 'stale' } });
  expect(row()?.name).toBe('First');
});

describe('what cannot be is told at its field', () => {
  test('fewer places than are taken', () => {
    for (const code of ['1', '2', '3'])
      buildRegistration(held.db, { campId: 'cmp_1', organisationId: 'org_1', trackId: 'trk_1a', code });
    expect(fieldsOf({ capacity: 2 })?.capacity?.[0]).toMatch(/2 is less than the 3/);
    expect(fieldsOf({ capacity: 3 })).toBeNull();
  });
  test('another currency once somebody ordered', () => {
    expect(fieldsOf({ currency: 'USD' })).toBeNull();
    held.db.update(camp).set({ version: 1, currency: 'EUR' }).run();
    buildRegistration(held.db, {
      campId: 'cmp_1',
      organisationId: 'org_1',
      trackId: 'trk_1a',
      state: 'cancelled',
    });
    expect(fieldsOf({ currency: 'USD' })?.currency?.[0]).toMatch(/stays EUR/);
  });
  test('a web name that another camp has, and any other once on sale', () => {
    buildCamp(held.db, { id: 'cmp_2', slug: 'taken', organisationId: 'org_2' });
    expect(fieldsOf({ slug: 'taken' })?.slug?.[0]).toMatch(/belongs to another camp/);
    expect(fieldsOf({ slug: 'new-name' })?.slug?.[0]).toMatch(/fixed once/);
    held.db.update(camp).set({ state: 'draft' }).where(eq(camp.id, 'cmp_1')).run();
    expect(fieldsOf({ slug: 'new-name' })).toBeNull();
  });
  test('dates that leave a meeting outside, unless the meetings go along', () => {
    expect(fieldsOf({ endsOn: '2026-06-11' })?.endsOn?.[0]).toMatch(/“Single notes” on 2026-06-12/);
    expect(fieldsOf({ startsOn: '2026-07-06', endsOn: '2026-07-10' })?.startsOn).toBeDefined();
    expect(fieldsOf({ startsOn: '2026-07-06', endsOn: '2026-07-10', moveMeetings: true })).toBeNull();
    // 28 days on, and one more in the calendar's sequence, so that subscribed calendars move it.
    expect(held.db.select().from(meeting).get()).toMatchObject({
      day: '2026-07-10',
      starts: '09:30',
      sequence: 1,
    });
  });
  test('another zone while meetings are placed, unless it is confirmed', () => {
    expect(fieldsOf({ timeZone: 'America/New_York' })?.zoneConfirmed?.[0]).toMatch(/keep their clock times/);
    expect(fieldsOf({ timeZone: 'America/New_York', zoneConfirmed: true })).toBeNull();
  });
  test.each([
    ['12 coins', /“12 coins”/],
    ['4.605', /“4.605”/],
    ['-5', /“-5”/],
    ['99999999999', /the most we take/],
  ])('a price of %s', (price, said) => {
    expect(fieldsOf({ price })?.price?.[0]).toMatch(said);
  });
  test('all at once, not one a time', () => {
    expect(Object.keys(fieldsOf({ price: 'x', endsOn: '2026-06-10', slug: 'other' }) ?? {}).sort()).toEqual([
      'endsOn',
      'price',
      'slug',
    ]);
  });
});

test('a camp on sale keeps what selling needs: the edit is undone whole', () => {
  expect(fieldsOf({ price: '', name: 'No price' })?.['']?.[0]).toMatch(/on sale.*No price is set/);
  expect(row()).toMatchObject({ name: 'Kettle Lake Harp Week', price: 46_000, version: 1 });
  expect(held.db.select().from(audit).all()).toEqual([]);
});
