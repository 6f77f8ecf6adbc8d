import { eq } from 'drizzle-orm';
import { beforeEach, expect, test } from 'vitest';
import { instructor } from '@/db/schema/camp';
import { registration, registrationHarp, registrationNeeds, registrationWorkshop } from '@/db/schema/order';
import { meeting } from '@/db/schema/workshop';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { listOwnInstructors } from '@/lib/server/roster/list-own-instructors';
import { listTaught } from '@/lib/server/roster/list-taught';
import { buildCamp, NOW } from '../../builders/build-camp';
import { buildCrowd } from '../../builders/build-crowd';
import { buildOrder } from '../../builders/build-order';
import { buildUser } from '../../builders/build-user';
import { buildWorkshop } from '../../builders/build-workshop';
import { staff } from '../../builders/staff';
import { recordStatements } from '../../setup/record-statements';
import { useTestDatabase } from '../../setup/test-database';

const at = useTestDatabase();
const plain = { tuning: 'richter', register: 'standard' } as const;
let ids: ReturnType<typeof buildCamp>;

beforeEach(() => {
  ids = buildCamp(at.db);
  buildWorkshop(at.db, {
    id: 'wsh_core',
    title: 'Crossharp',
    trackIds: [ids.benders],
    instructorIds: [ids.instructorId],
    needs: [
      {
        level: 'required',
        anyOf: [{ by: 'song', songKey: { tonic: 'E', minor: false }, position: 2, ...plain }],
      },
      {
        level: 'helpful',
        anyOf: [
          { by: 'harp', labelKey: 'G', ...plain },
          { by: 'harp', labelKey: 'D', ...plain },
        ],
      },
      { level: 'helpful', anyOf: [] },
    ],
  });
  buildWorkshop(at.db, {
    id: 'wsh_elec',
    title: 'Train rhythms',
    audience: 'elective',
    instructorIds: [ids.instructorId],
  });
  buildWorkshop(at.db, { id: 'wsh_other', title: 'Not mine', trackIds: [ids.benders] });
  const slot = { campId: ids.campId, roomId: ids.hall, lengthMinutes: 75, updatedAt: NOW };
  at.db
    .insert(meeting)
    .values([
      { id: 'mtg_2', workshopId: 'wsh_elec', day: '2026-06-10', starts: '09:30', ...slot },
      { id: 'mtg_1', workshopId: 'wsh_core', day: '2026-06-09', starts: '11:00', ...slot },
      { id: 'mtg_3', workshopId: 'wsh_other', day: '2026-06-09', starts: '09:30', ...slot },
    ])
    .run();
});

function taught() {
  const programme = loadProgramme(ids.campId);
  if (!programme) throw new Error('There is a camp');
  return listTaught(programme, ids.instructorId);
}

// Song in E in 2nd position is an A harp: trade table of positions, players' mailing list 2007-11.
test('own meetings in order of time; who comes and which of the asked harps each owns', () => {
  buildOrder(at.db, { attendees: ['Noor Haddad', 'Ágnes Li'] });
  buildOrder(at.db, { id: 'ord_2', attendees: ['Held Only'], state: 'held' });
  buildOrder(at.db, { id: 'ord_3', attendees: ['Beginner'], trackId: ids.beginners });
  at.db
    .insert(registrationHarp)
    .values([
      { registrationId: 'reg_1a', harpId: 'A-richter-standard' },
      { registrationId: 'reg_1b', harpId: 'D-richter-standard' },
      { registrationId: 'reg_1b', harpId: 'A-richter-low' },
    ])
    .run();
  at.db.insert(registrationWorkshop).values({ registrationId: 'reg_3a', workshopId: 'wsh_elec' }).run();
  const [core, elective, ...none] = taught();
  expect(none).toEqual([]);
  expect(core).toMatchObject({ title: 'Crossharp', day: '2026-06-09', room: 'Hall', whose: 'Bending' });
  expect(core?.players.map(({ name, has }) => [name, ...has])).toEqual([
    ['Noor Haddad', true, false],
    ['Ágnes Li', false, true],
  ]);
  expect(elective?.players.map(({ name, track, has }) => [name, track, has])).toEqual([
    ['Beginner', 'First breath', []],
  ]);
});

test('holds no contact and no health', () => {
  buildOrder(at.db, { attendees: ['Noor Haddad'], payer: { payerEmail: 'secret@example.test' } });
  at.db
    .insert(registrationNeeds)
    .values({ registrationId: 'reg_1a', diet: 'SECRET', emergencyPhone: '+49SECRET' })
    .run();
  expect(JSON.stringify(taught())).not.toMatch(/secret|@/i);
});

test('an instructor sees their own only, an organiser everyone’s, nobody else any', () => {
  const me = buildUser(at.db, { id: 'usr_instructor', in: 'org_1', roles: ['instructor'] });
  at.db.update(instructor).set({ userId: me }).where(eq(instructor.id, ids.instructorId)).run();
  at.db
    .insert(instructor)
    .values({ id: 'ins_other', campId: ids.campId, name: 'Bo Lind', position: 2 })
    .run();
  const of = { id: ids.campId, organisationId: ids.organisationId };
  const seen = (actor: ReturnType<typeof staff>) =>
    listOwnInstructors(actor, of).map(({ name, own }) => [name, own]);
  expect(seen(staff('instructor'))).toEqual([['Ana Teixeira', true]]);
  expect(seen(staff('organiser'))).toEqual([
    ['Ana Teixeira', false],
    ['Bo Lind', false],
  ]);
  for (const actor of [
    staff('treasurer', 'org_1', me),
    staff('door', 'org_1', me),
    staff('instructor', 'org_2', me),
    staff('organiser', 'org_2'),
  ])
    expect(seen(actor)).toEqual([]);
});

test('as many statements for a crowd as for one', () => {
  buildOrder(at.db);
  const statements = (): number => {
    const seen = recordStatements(at.db);
    taught();
    seen.stop();
    return seen.executed.length;
  };
  const few = statements();
  buildCrowd(at.db, 1000, { trackIds: [ids.benders], workshopId: 'wsh_elec' });
  const [core] = taught();
  expect(core?.players).toHaveLength(
    at.db.select().from(registration).where(eq(registration.state, 'confirmed')).all().length,
  );
  expect(few).toBeGreaterThan(0);
  expect(statements()).toBe(few);
});
