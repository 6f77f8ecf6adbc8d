import type { Db } from '@/db/client';
import { order, registration } from '@/db/schema/order';
import type { Actor } from '@/lib/domain/access/actor';
import { ALL_PEOPLE } from '@/lib/domain/people/people-query';
import { getPublicCamp } from '@/lib/server/camps/get-public-camp';
import { listCamps } from '@/lib/server/camps/list-camps';
import { listPublicCamps } from '@/lib/server/camps/list-public-camps';
import { countArrivals } from '@/lib/server/door/count-arrivals';
import { recordScan } from '@/lib/server/door/record-scan';
import { searchPeople } from '@/lib/server/door/search-people';
import { listOwnBookings } from '@/lib/server/orders/list-own-bookings';
import { loadOrder } from '@/lib/server/orders/load-order';
import { loadAttendee } from '@/lib/server/packing/load-attendee';
import { exportPeople } from '@/lib/server/people/export-people';
import { getPerson } from '@/lib/server/people/get-person';
import { listPeople } from '@/lib/server/people/list-people';
import { buildCamp, NOW } from '../builders/build-camp';
import { buildCrowd } from '../builders/build-crowd';
import { buildLargeProgramme } from '../builders/build-large-programme';
import { buildUser } from '../builders/build-user';
import { staff } from '../builders/staff';
import { recordStatements } from './record-statements';

const PERSON = 'reg_00001';
const DOOR = 'usr_door';
const payer: Actor = {
  user: { id: 'usr_payer', name: 'Noor Haddad', email: 'usr_payer@example.test', emailVerified: true },
  roles: [],
  orders: [],
  registrations: [],
};

/** What pages and routes read (and the scan writes), and the most statements each may take. */
export const READERS = {
  'public list of camps': [3, () => listPublicCamps(NOW)],
  // One of them asks whether anything was written since the programme was kept.
  'public camp page': [18, () => getPublicCamp('kettle-lake-1')],
  'organiser’s list of camps': [2, () => listCamps(staff('organiser'))],
  'people route': [4, () => listPeople('cmp_1', ALL_PEOPLE)],
  'people route, searched and sorted by what is due': [
    4,
    () => listPeople('cmp_1', { ...ALL_PEOPLE, q: 'mei', sort: 'due', dir: 'desc' }),
  ],
  'one person': [6, () => getPerson('cmp_1', PERSON)],
  'roster as CSV': [
    4,
    () =>
      exportPeople({ id: 'cmp_1', organisationId: 'org_1', timeZone: 'Europe/Berlin' }, ALL_PEOPLE, {
        actor: staff('organiser'),
        now: NOW,
      }),
  ],
  'door search': [1, () => searchPeople('cmp_1', 'mei')],
  'door head count': [1, () => countArrivals('cmp_1')],
  'one arrival': [
    7,
    () =>
      recordScan(
        'cmp_1',
        { kind: 'name', id: crypto.randomUUID(), deviceAt: NOW, registrationId: PERSON },
        { userId: DOOR, now: NOW },
      ),
  ],
  'packing list, timetable and ticket of one player': [14, () => loadAttendee(PERSON)],
  'one booking': [7, () => loadOrder('ord_00001')],
  'my bookings': [2, () => listOwnBookings(payer)],
} satisfies Record<string, [number, () => unknown]>;

/** Statements each reader executes in a camp of so many people and workshops, all of them one payer's bookings. */
export function countStatements(db: Db, people: number, workshops: number): Record<string, number> {
  const { campId, beginners, benders, hall } = buildCamp(db, { capacity: 20_000 });
  const [, , , elective] = buildLargeProgramme(db, workshops, {
    campId,
    trackIds: [beginners, benders],
    roomId: hall,
  });
  buildCrowd(db, people, { campId, trackIds: [beginners, benders], workshopId: elective });
  buildUser(db, { id: DOOR });
  buildUser(db, { id: 'usr_payer' });
  db.update(order).set({ payerUserId: 'usr_payer' }).run();
  db.update(registration).set({ arrival: 'expected', arrivedAt: null }).run();
  return Object.fromEntries(
    Object.entries(READERS).map(([name, [, read]]) => {
      const seen = recordStatements(db);
      const found = read();
      seen.stop();
      if (!found) throw new Error(`${name} found nothing`);
      return [name, seen.executed.length];
    }),
  );
}
