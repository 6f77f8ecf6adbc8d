import { beforeEach, expect, test } from 'vitest';
import { audit } from '@/db/schema/audit';
import { meeting } from '@/db/schema/workshop';
import { VISITOR } from '@/lib/domain/access/actor';
import { moveMeetingSchema, placeMeetingSchema } from '@/lib/schemas/meeting';
import { moveMeeting } from '@/lib/server/timetable/move-meeting';
import { placeMeeting } from '@/lib/server/timetable/place-meeting';
import { removeMeeting } from '@/lib/server/timetable/remove-meeting';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildWorkshop } from '../../builders/build-workshop';
import { staff } from '../../builders/staff';
import { useTestDatabase } from '../../setup/test-database';

const test_ = useTestDatabase();
const context = { actor: staff('organiser'), now: NOW };
let ids: ReturnType<typeof buildCamp>;

beforeEach(() => {
  ids = buildCamp(test_.db);
  buildWorkshop(test_.db, { id: 'wsh_1', trackIds: [ids.beginners], instructorIds: [ids.instructorId] });
  buildWorkshop(test_.db, { id: 'wsh_2', title: 'Jam basics', kind: 'jam', trackIds: [ids.benders] });
});

const slot = () => ({ campId: ids.campId, roomId: ids.hall, day: '2026-06-09', starts: '09:30' }) as const;
const place = (more = {}) => placeMeeting({ ...slot(), workshopId: 'wsh_1', ...more }, context);
function placed(more = {}) {
  const result = place(more);
  if (!result.ok) throw new Error('Should have been placed');
  const row = test_.db
    .select()
    .from(meeting)
    .all()
    .find(({ id }) => id === result.value.meetingId);
  if (!row) throw new Error('Should be there');
  return row;
}

test('places a workshop for its usual length and notes who did it', () => {
  expect(placed()).toMatchObject({ day: '2026-06-09', starts: '09:30', lengthMinutes: 75, sequence: 0 });
  expect(test_.db.select().from(audit).all()).toMatchObject([
    { action: 'meeting.place', sentence: 'Placed Single notes: Tue 9 June 09:30–10:45 in Hall.' },
  ]);
});

test('refuses what clashes, at its field, in words, and writes nothing', () => {
  placed({ workshopId: 'wsh_2' });
  expect(place()).toEqual({
    ok: false,
    error: { code: 'clash', fields: { roomId: ['Hall is taken Tuesday 09:30–10:45 by Jam basics.'] } },
  });
  expect(place({ day: '2026-07-01' })).toMatchObject({
    error: { fields: { day: [expect.stringContaining('outside the camp’s days')] } },
  });
  expect(test_.db.select().from(meeting).all()).toHaveLength(1);
  expect(test_.db.select().from(audit).all()).toHaveLength(1);
});

test('a small or quiet room is the organiser’s own choice', () => {
  expect(place({ workshopId: 'wsh_2', roomId: ids.barn }).ok).toBe(true);
});

test('rooms and workshops of another camp are not to be had', () => {
  const other = buildCamp(test_.db, { id: 'cmp_2', organisationId: 'org_2' });
  buildWorkshop(test_.db, { id: 'wsh_9', campId: other.campId, trackIds: [other.beginners] });
  expect(place({ roomId: other.hall })).toMatchObject({
    error: { code: 'bad_input', fields: { roomId: [expect.any(String)] } },
  });
  expect(place({ workshopId: 'wsh_9' })).toMatchObject({
    error: { fields: { workshopId: [expect.any(String)] } },
  });
  const mine = placed();
  const stranger = {
    ...slot(),
    campId: other.campId,
    roomId: other.hall,
    meetingId: mine.id,
    updatedAt: mine.updatedAt,
  };
  expect(moveMeeting(stranger, context)).toMatchObject({ error: { code: 'not_found' } });
  expect(removeMeeting(stranger, context)).toMatchObject({ error: { code: 'not_found' } });
  expect(test_.db.select().from(meeting).all()).toEqual([mine]);
});

test('nobody else may place, move or remove', () => {
  const mine = placed();
  const theirs = { ...slot(), meetingId: mine.id, updatedAt: mine.updatedAt };
  for (const actor of [
    staff('treasurer'),
    staff('instructor'),
    staff('door'),
    staff('organiser', 'org_2'),
    VISITOR,
  ]) {
    const by = { actor, now: NOW };
    expect(placeMeeting({ ...slot(), workshopId: 'wsh_2', starts: '11:00' }, by)).toMatchObject({
      ok: false,
    });
    expect(moveMeeting({ ...theirs, starts: '11:00' }, by)).toMatchObject({ error: { code: 'not_found' } });
    expect(removeMeeting(theirs, by)).toMatchObject({ error: { code: 'not_found' } });
  }
  expect(test_.db.select().from(meeting).all()).toEqual([mine]);
});

test('moves up the calendar sequence; a second organiser’s stale move is refused and says where it is now', () => {
  const { id: meetingId, updatedAt } = placed();
  const move = (starts: string, seen: number) =>
    moveMeeting({ ...slot(), meetingId, updatedAt: seen, starts }, context);
  expect(move('11:00', updatedAt).ok).toBe(true);
  const after = test_.db.select().from(meeting).get();
  expect(after).toMatchObject({ starts: '11:00', sequence: 1, lengthMinutes: 75 });
  expect(after?.updatedAt).not.toBe(updatedAt);
  expect(move('20:00', updatedAt)).toMatchObject({
    error: { code: 'stale', sentence: expect.stringContaining('Tue 9 June 11:00–12:15 in Hall') },
  });
  expect(test_.db.select().from(meeting).get()).toEqual(after);
});

test('a move to where it is already changes nothing; its old place is no clash with itself', () => {
  const row = placed();
  const move = (starts: string) =>
    moveMeeting({ ...slot(), meetingId: row.id, updatedAt: row.updatedAt, starts }, context);
  expect(move('09:30').ok).toBe(true);
  expect(test_.db.select().from(meeting).get()).toEqual(row);
  expect(move('09:45').ok).toBe(true);
});

test('removal needs the same sight of it', () => {
  const row = placed();
  const remove = (updatedAt: number) =>
    removeMeeting({ campId: ids.campId, meetingId: row.id, updatedAt }, context);
  expect(remove(row.updatedAt - 1)).toMatchObject({ error: { code: 'stale' } });
  expect(remove(row.updatedAt).ok).toBe(true);
  expect(remove(row.updatedAt)).toMatchObject({ error: { code: 'not_found' } });
});

test('a posted form needs a start, a real day and a room; each fault at its field', () => {
  const form = { campId: 'cmp_1', workshopId: 'wsh_1', day: '2026-06-09', block: '09:30', roomId: 'rom_1a' };
  expect(placeMeetingSchema.parse(form)).toMatchObject({ starts: '09:30' });
  expect(placeMeetingSchema.parse({ ...form, time: '10:05' })).toMatchObject({ starts: '10:05' });
  const faults = (more: object) =>
    placeMeetingSchema.safeParse({ ...form, ...more }).error?.issues.map(({ path }) => path[0]);
  expect(faults({ block: undefined })).toEqual(['block']);
  expect(faults({ time: '25:00' })).toEqual(['time']);
  expect(faults({ day: '2026-02-30' })).toEqual(['day']);
  expect(faults({ day: 'x'.repeat(5000) })).toEqual(['day']);
  expect(faults({ roomId: '<b>' })).toEqual(['roomId']);
  expect(faults({ lengthMinutes: '-5' })).toEqual(['lengthMinutes']);
  expect(faults({ lengthMinutes: '1e9' })).toEqual(['lengthMinutes']);
  expect(moveMeetingSchema.safeParse(form).error?.issues.map(({ path }) => path[0])).toEqual([
    'meetingId',
    'updatedAt',
  ]);
});
