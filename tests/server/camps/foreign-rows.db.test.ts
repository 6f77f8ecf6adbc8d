import { beforeEach, describe, expect, test } from 'vitest';
import type { Actor } from '@/lib/domain/access/actor';
import { deleteBlock } from '@/lib/server/blocks/delete-block';
import { saveBlock } from '@/lib/server/blocks/save-block';
import { closeCamp } from '@/lib/server/camps/close-camp';
import { copyCamp } from '@/lib/server/camps/copy-camp';
import { createCamp } from '@/lib/server/camps/create-camp';
import { editCamp } from '@/lib/server/camps/edit-camp';
import { moveRow } from '@/lib/server/camps/move-row';
import { publishCamp } from '@/lib/server/camps/publish-camp';
import { deleteInstructor } from '@/lib/server/instructors/delete-instructor';
import { saveInstructor } from '@/lib/server/instructors/save-instructor';
import { editOrganisation } from '@/lib/server/organisations/edit-organisation';
import { addPicture } from '@/lib/server/pictures/add-picture';
import { deletePicture } from '@/lib/server/pictures/delete-picture';
import { editPicture } from '@/lib/server/pictures/edit-picture';
import { deleteRoom } from '@/lib/server/rooms/delete-room';
import { saveRoom } from '@/lib/server/rooms/save-room';
import { deleteTrack } from '@/lib/server/tracks/delete-track';
import { saveTrack } from '@/lib/server/tracks/save-track';
import { deleteWorkshop } from '@/lib/server/workshops/delete-workshop';
import { saveWorkshop } from '@/lib/server/workshops/save-workshop';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildUser } from '../../builders/build-user';
import { buildWorkshop } from '../../builders/build-workshop';
import { staff } from '../../builders/staff';
import { useTestDatabase } from '../../setup/test-database';

// ASVS 8.2.2, 8.4.1: organisations are apart, and a row of one camp cannot be reached through another.
const held = useTestDatabase();
type Done = { ok: boolean; error?: { code: string } };
type Command = (campId: 'cmp_1' | 'cmp_2', actor: Actor) => Done | Promise<Done>;

const TRACK = { name: 'X', level: 'start' as const, gate: '', capacity: 5, price: '' };
const ROOM = { name: 'X', seats: 5, loudness: 'quiet' as const, kit: '' };
const WORKSHOP = {
  title: 'X',
  description: '',
  kind: 'jam' as const,
  audience: 'everyone' as const,
  lengthMinutes: 60,
  capacity: null,
  trackIds: [],
  instructorIds: [],
  needs: [],
};
const DETAILS = {
  version: 1,
  name: 'X',
  slug: 'kettle-lake-1',
  startsOn: '2026-06-08',
  endsOn: '2026-06-12',
  moveMeetings: false,
  timeZone: 'Europe/Berlin',
  zoneConfirmed: false,
  currency: 'EUR',
  venueName: 'X',
  venueAddress: 'X',
  capacity: 60,
  price: '1',
  refundTerms: 'X',
  arrivalFrom: '14:00',
  summary: '',
  description: '',
};
const at = (actor: Actor) => ({ actor, now: NOW });

/** All name rows of the first camp. */
const COMMANDS: Record<string, Command> = {
  editCamp: (campId, a) => editCamp({ campId, ...DETAILS }, at(a)),
  publishCamp: (campId, a) => publishCamp(campId, at(a)),
  closeCamp: (campId, a) => closeCamp(campId, at(a)),
  copyCamp: (campId, a) =>
    copyCamp({ campId, name: 'X', startsOn: '2027-06-08', withPictures: false }, at(a)),
  addTrack: (campId, a) => saveTrack({ campId, ...TRACK }, at(a)),
  saveTrack: (campId, a) => saveTrack({ campId, trackId: 'trk_1a', ...TRACK }, at(a)),
  deleteTrack: (campId, a) => deleteTrack({ campId, trackId: 'trk_1a' }, at(a)),
  addRoom: (campId, a) => saveRoom({ campId, ...ROOM }, at(a)),
  saveRoom: (campId, a) => saveRoom({ campId, roomId: 'rom_1a', ...ROOM }, at(a)),
  deleteRoom: (campId, a) => deleteRoom({ campId, roomId: 'rom_1a' }, at(a)),
  saveInstructor: (campId, a) =>
    saveInstructor({ campId, instructorId: 'ins_1a', name: 'X', bio: '' }, at(a)),
  deleteInstructor: (campId, a) => deleteInstructor({ campId, instructorId: 'ins_1a' }, at(a)),
  saveBlock: (campId, a) =>
    saveBlock({ campId, blockId: 'blk_1a', starts: '08:00', ends: '09:00', label: '' }, at(a)),
  deleteBlock: (campId, a) => deleteBlock({ campId, blockId: 'blk_1a' }, at(a)),
  saveWorkshop: (campId, a) => saveWorkshop({ campId, workshopId: 'wsh_1a', ...WORKSHOP }, at(a)),
  deleteWorkshop: (campId, a) => deleteWorkshop({ campId, workshopId: 'wsh_1a' }, at(a)),
  moveTrack: (campId, a) => moveRow({ campId, list: 'tracks', id: 'trk_1a', towards: 'down' }, at(a)),
  editPicture: (campId, a) => editPicture({ campId, pictureId: 'pic_1a', alt: 'X' }, at(a)),
  deletePicture: (campId, a) => deletePicture({ campId, pictureId: 'pic_1a' }, at(a)),
  addPicture: (campId, a) => addPicture({ campId, alt: 'X', file: new File(['x'], 'x.png') }, at(a)),
};
/** These name the camp alone, so another camp of one's own is fair. */
const CAMP_ALONE = ['publishCamp', 'closeCamp', 'copyCamp', 'addTrack', 'addRoom', 'addPicture', 'editCamp'];

const everything = () =>
  ['camp', 'track', 'room', 'instructor', 'block', 'workshop', 'camp_picture', 'audit', 'organisation'].map(
    (table) => held.db.$client.prepare(`select * from ${table} order by id`).all(),
  );

beforeEach(() => {
  buildCamp(held.db);
  buildCamp(held.db, { id: 'cmp_2', organisationId: 'org_2' });
  for (const [id, organisation] of [
    ['usr_organiser', 'org_1'],
    ['usr_other', 'org_2'],
  ] as const)
    buildUser(held.db, { id, in: organisation, roles: ['organiser'] });
  buildWorkshop(held.db, { id: 'wsh_1a', trackIds: ['trk_1b'] });
  held.db.$client
    .prepare("insert into camp_picture values ('pic_1a', 'cmp_1', 'A hall', 10, 10, 1, 1)")
    .run();
});

describe.each(Object.entries(COMMANDS))('%s', (name, command) => {
  test('does nothing for the organiser of another organisation', async () => {
    const before = everything();
    expect(await command('cmp_1', staff('organiser', 'org_2', 'usr_other'))).toMatchObject({
      ok: false,
      error: { code: 'not_found' },
    });
    expect(everything()).toEqual(before);
  });
  test.each(['treasurer', 'instructor', 'door'] as const)('does nothing for %s', async (role) => {
    const before = everything();
    expect((await command('cmp_1', staff(role, 'org_1', 'usr_organiser'))).ok).toBe(false);
    expect(everything()).toEqual(before);
  });
  test.skipIf(CAMP_ALONE.includes(name))(
    'does not reach a row of another camp through one’s own',
    async () => {
      const before = everything();
      expect(await command('cmp_2', staff('organiser', 'org_2', 'usr_other'))).toMatchObject({
        ok: false,
        error: { code: 'not_found' },
      });
      expect(everything()).toEqual(before);
    },
  );
});

test('an organisation is edited, and a camp begun in it, by its own organiser only', () => {
  const foreign = at(staff('organiser', 'org_2', 'usr_other'));
  expect(editOrganisation({ organisationId: 'org_1', name: 'X', email: 'x@example.org' }, foreign).ok).toBe(
    false,
  );
  const input = {
    organisationId: 'org_1',
    name: 'X',
    startsOn: '2027-01-01',
    endsOn: '2027-01-02',
    timeZone: 'UTC',
    currency: 'EUR',
  } as const;
  expect(createCamp(input, foreign).ok).toBe(false);
  expect(createCamp(input, at(staff('organiser'))).ok).toBe(true);
});

test('a track or instructor of another camp cannot be slipped into a workshop, nor a stranger’s account into an instructor', () => {
  const own = at(staff('organiser'));
  const slip = (more: object) =>
    saveWorkshop({ campId: 'cmp_1', ...WORKSHOP, audience: 'core', ...more }, own);
  expect(slip({ trackIds: ['trk_2a'] })).toMatchObject({
    error: { fields: { trackIds: [expect.any(String)] } },
  });
  expect(slip({ trackIds: ['trk_1a'], instructorIds: ['ins_2a'] })).toMatchObject({
    error: { fields: { instructorIds: [expect.any(String)] } },
  });
  expect(saveInstructor({ campId: 'cmp_1', name: 'X', bio: '', userId: 'usr_other' }, own)).toMatchObject({
    error: { fields: { userId: [expect.any(String)] } },
  });
});
