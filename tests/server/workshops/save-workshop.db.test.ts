import { beforeEach, expect, test } from 'vitest';
import { registrationWorkshop } from '@/db/schema/order';
import { meeting } from '@/db/schema/workshop';
import type { WorkshopInput } from '@/lib/schemas/workshop';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { rowMark } from '@/lib/server/camps/row-mark';
import { deleteInstructor } from '@/lib/server/instructors/delete-instructor';
import { deleteRoom } from '@/lib/server/rooms/delete-room';
import { deleteTrack } from '@/lib/server/tracks/delete-track';
import { saveTrack } from '@/lib/server/tracks/save-track';
import { deleteWorkshop } from '@/lib/server/workshops/delete-workshop';
import { saveWorkshop } from '@/lib/server/workshops/save-workshop';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildRegistration } from '../../builders/build-registration';
import { buildUser } from '../../builders/build-user';
import { buildWorkshop } from '../../builders/build-workshop';
import { staff } from '../../builders/staff';
import { useTestDatabase } from '../../setup/test-database';

const held = useTestDatabase();
const context = { actor: staff('organiser'), now: NOW };
const INPUT: WorkshopInput = {
  campId: 'cmp_1',
  title: 'Train songs',
  description: '',
  kind: 'technique',
  audience: 'core',
  lengthMinutes: 75,
  capacity: null,
  trackIds: ['trk_1a'],
  instructorIds: ['ins_1a', 'ins_1a'],
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
      ],
    },
    {
      level: 'helpful',
      anyOf: [{ by: 'harp', labelKey: 'F', tuning: 'richter', register: 'low' }],
      note: 'for the end',
    },
  ],
};
const own = (id: string) => loadProgramme('cmp_1')?.workshops.find((row) => row.id === id);
const place = (
  workshopId: `wsh_${string}`,
  id: `mtg_${string}`,
  starts: string,
  roomId: `rom_${string}` = 'rom_1b',
) =>
  held.db
    .insert(meeting)
    .values({
      id,
      campId: 'cmp_1',
      workshopId,
      roomId,
      day: '2026-06-09',
      starts,
      lengthMinutes: 75,
      updatedAt: NOW,
    })
    .run();

beforeEach(() => {
  buildCamp(held.db);
  buildUser(held.db, { id: 'usr_organiser', roles: ['organiser'] });
});

test('a workshop keeps its tracks, instructors once each, and its harps in order; saving again replaces them', () => {
  const made = saveWorkshop(INPUT, context);
  if (!made.ok) throw new Error('refused');
  const id = made.value.workshopId;
  expect(own(id)).toMatchObject({ trackIds: ['trk_1a'], instructorIds: ['ins_1a'], needs: INPUT.needs });
  saveWorkshop(
    { ...INPUT, workshopId: id, audience: 'elective', capacity: 8, needs: [], instructorIds: [] },
    context,
  );
  // The ticked track of a former core workshop means nothing for an elective.
  expect(own(id)).toMatchObject({
    audience: 'elective',
    capacity: 8,
    trackIds: [],
    instructorIds: [],
    needs: [],
  });
});

test('an instructor who teaches elsewhere at that time is refused in words, and nothing is changed', () => {
  buildWorkshop(held.db, {
    id: 'wsh_1a',
    title: 'Single notes',
    trackIds: ['trk_1a'],
    instructorIds: ['ins_1a'],
  });
  buildWorkshop(held.db, { id: 'wsh_1b', title: 'Bends', trackIds: ['trk_1b'] });
  place('wsh_1a', 'mtg_1', '09:30');
  place('wsh_1b', 'mtg_2', '09:30', 'rom_1a');
  const before = JSON.stringify(loadProgramme('cmp_1'));
  const refused = saveWorkshop({ ...INPUT, workshopId: 'wsh_1b', trackIds: ['trk_1b'] }, context);
  expect(!refused.ok && refused.error.sentence).toMatch(/Ana Teixeira teaches/);
  expect(JSON.stringify(loadProgramme('cmp_1'))).toBe(before);
  // A clash that was there before does not lock the form.
  place('wsh_1b', 'mtg_3', '09:45', 'rom_1a');
  expect(
    saveWorkshop({ ...INPUT, workshopId: 'wsh_1b', trackIds: ['trk_1b'], instructorIds: [] }, context).ok,
  ).toBe(true);
});

test('an elective that players chose stays one, with room for them', () => {
  buildWorkshop(held.db, { id: 'wsh_1a', audience: 'elective', capacity: 8 });
  for (const code of ['1', '2']) {
    const { registrationId } = buildRegistration(held.db, {
      campId: 'cmp_1',
      organisationId: 'org_1',
      trackId: 'trk_1a',
      code,
    });
    held.db.insert(registrationWorkshop).values({ registrationId, workshopId: 'wsh_1a' }).run();
  }
  const save = (more: Partial<WorkshopInput>) => {
    const result = saveWorkshop({ ...INPUT, workshopId: 'wsh_1a', audience: 'elective', ...more }, context);
    return result.ok ? null : result.error.fields;
  };
  expect(save({ capacity: 1 })?.capacity?.[0]).toMatch(/1 is less than the 2/);
  expect(save({ audience: 'core' })?.audience?.[0]).toMatch(/2 players have chosen it/);
  expect(save({ capacity: 2 })).toBeNull();
  expect(deleteWorkshop({ campId: 'cmp_1', workshopId: 'wsh_1a' }, context)).toMatchObject({
    error: { code: 'in_use' },
  });
});

test('what is used is not deleted, and says by what', () => {
  buildWorkshop(held.db, {
    id: 'wsh_1a',
    title: 'Single notes',
    trackIds: ['trk_1b'],
    instructorIds: ['ins_1a'],
  });
  place('wsh_1a', 'mtg_1', '09:30');
  buildRegistration(held.db, {
    campId: 'cmp_1',
    organisationId: 'org_1',
    trackId: 'trk_1a',
    state: 'cancelled',
  });
  const said = (result: { ok: boolean; error?: { sentence?: string } }) => result.error?.sentence ?? '';
  expect(said(deleteTrack({ campId: 'cmp_1', trackId: 'trk_1a' }, context))).toMatch(
    /1 registration names it, cancelled/,
  );
  expect(said(deleteTrack({ campId: 'cmp_1', trackId: 'trk_1b' }, context))).toMatch(
    /Single notes comes with it/,
  );
  expect(said(deleteRoom({ campId: 'cmp_1', roomId: 'rom_1b' }, context))).toMatch(
    /1 meeting is placed there/,
  );
  expect(said(deleteInstructor({ campId: 'cmp_1', instructorId: 'ins_1a' }, context))).toMatch(
    /teach Single notes/,
  );
  expect(said(deleteWorkshop({ campId: 'cmp_1', workshopId: 'wsh_1a' }, context))).toMatch(
    /1 meeting in the timetable/,
  );
  expect(deleteRoom({ campId: 'cmp_1', roomId: 'rom_1a' }, context).ok).toBe(true);
});

test('a track never gets fewer places than are taken', () => {
  for (const code of ['1', '2'])
    buildRegistration(held.db, { campId: 'cmp_1', organisationId: 'org_1', trackId: 'trk_1a', code });
  const track = {
    campId: 'cmp_1',
    trackId: 'trk_1a',
    name: 'A',
    level: 'start',
    gate: '',
    price: '',
  } as const;
  expect(saveTrack({ ...track, capacity: 1 }, context)).toMatchObject({
    error: { fields: { capacity: [expect.stringMatching(/1 is less than the 2/)] } },
  });
  expect(saveTrack({ ...track, capacity: 2 }, context).ok).toBe(true);
});

test('a form opened before somebody else saved is refused as stale, for a workshop and for a track', () => {
  buildWorkshop(held.db, { id: 'wsh_1a', title: 'Single notes', trackIds: ['trk_1a'] });
  const input = { ...INPUT, workshopId: 'wsh_1a' as const, trackIds: ['trk_1a' as const], instructorIds: [] };
  const seen = rowMark(own('wsh_1a'));
  expect(saveWorkshop({ ...input, seen, title: 'First' }, context).ok).toBe(true);
  expect(saveWorkshop({ ...input, seen, title: 'Second' }, context)).toMatchObject({
    error: { code: 'stale' },
  });
  // Harps are part of what the form shows.
  const again = rowMark(own('wsh_1a'));
  expect(saveWorkshop({ ...input, title: 'First', needs: [] }, context).ok).toBe(true);
  expect(saveWorkshop({ ...input, seen: again, title: 'Third' }, context).ok).toBe(false);
  expect(own('wsh_1a')?.title).toBe('First');

  const row = {
    campId: 'cmp_1',
    trackId: 'trk_1a',
    level: 'start',
    gate: '',
    price: '',
    capacity: 9,
  } as const;
  const mark = rowMark(loadProgramme('cmp_1')?.tracks[0]);
  expect(saveTrack({ ...row, name: 'A', seen: mark }, context).ok).toBe(true);
  expect(saveTrack({ ...row, name: 'B', seen: mark }, context)).toMatchObject({ error: { code: 'stale' } });
});

test('a new length says how many meetings in the timetable keep their own', () => {
  buildWorkshop(held.db, { id: 'wsh_1a', title: 'Single notes', trackIds: ['trk_1a'] });
  place('wsh_1a', 'mtg_1', '09:30');
  const save = (lengthMinutes: number) =>
    saveWorkshop({ ...INPUT, workshopId: 'wsh_1a', instructorIds: [], lengthMinutes }, context);
  expect(save(75)).toMatchObject({ value: { keptLength: 0 } });
  expect(save(60)).toMatchObject({ value: { keptLength: 1 } });
});
