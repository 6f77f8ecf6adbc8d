import type { Db } from '@/db/client';
import { foldSearch } from '@/lib/domain/shared/fold-search';
import type { CampId, OrganisationId, TrackId, WorkshopId } from '@/lib/domain/shared/ids';
import { NOW } from './build-camp';

const FIRST = ['Ágnes', 'Łukasz', 'Mei', 'Ngozi', 'Søren', 'Zoë', 'Олена', '美咲', 'Tomás', 'Aino'];
const LAST = [
  "O'Rourke",
  'Nguyễn',
  'Wójcik',
  'García Márquez',
  'Ødegård',
  'Κωστής',
  'Singh',
  'Brâncuși',
  '佐藤',
  'Li',
];
const STATES = ['confirmed', 'confirmed', 'confirmed', 'held', 'cancelled'] as const;
const PRICE = 46_000;

/**
 * `count` people of one camp, an order each: every fifth held, every fifth cancelled, of the confirmed every seventh
 * unpaid. By prepared statements, so that ten thousand take a second.
 */
export function buildCrowd(
  db: Db,
  count: number,
  of: { campId?: CampId; organisationId?: OrganisationId; trackIds: TrackId[]; workshopId?: WorkshopId },
): void {
  const { campId = 'cmp_1', organisationId = 'org_1', workshopId = null } = of;
  const sqlite = db.$client;
  const addOrder = sqlite.prepare(
    `insert into "order" (id, organisation_id, camp_id, reference, state, payer_name, payer_email, currency, total,
       refund_terms, created_at, updated_at) values (?, ?, ?, ?, ?, ?, ?, 'EUR', ${PRICE}, '', ?, ?)`,
  );
  const addPerson = sqlite.prepare(
    `insert into registration (id, order_id, camp_id, track_id, attendee_name, attendee_search, attendee_email, minor,
       state, arrival, created_at, updated_at) values (?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?, ?)`,
  );
  const addEntry = sqlite.prepare(
    `insert into ledger (id, posting, organisation_id, order_id, account, amount, currency, memo, cause, at)
     values (?, ?, ?, ?, ?, ?, 'EUR', ?, ?, ${NOW})`,
  );
  const addHarp = sqlite.prepare('insert into registration_harp (registration_id, harp_id) values (?, ?)');
  const addElective = sqlite.prepare(
    'insert into registration_workshop (registration_id, workshop_id) values (?, ?)',
  );
  const post = (n: string, memo: string, payers: number, other: 'income' | 'provider') => {
    const id = `led_${memo[0]}${n}`;
    addEntry.run(`${id}a`, id, organisationId, `ord_${n}`, 'payers', payers, memo, `ord_${n}`);
    addEntry.run(`${id}b`, id, organisationId, `ord_${n}`, other, -payers, memo, `ord_${n}`);
  };
  sqlite.transaction(() => {
    for (let at = 0; at < count; at++) {
      const n = String(at).padStart(5, '0');
      const name = `${FIRST[at % 10]} ${LAST[Math.floor(at / 10) % 10]} ${n}`;
      const state = STATES[at % STATES.length];
      const made = NOW + at;
      addOrder.run(
        `ord_${n}`,
        organisationId,
        campId,
        `X${n}XX`,
        state,
        name,
        `payer${n}@example.test`,
        made,
        made,
      );
      addPerson.run(
        `reg_${n}`,
        `ord_${n}`,
        campId,
        of.trackIds[at % of.trackIds.length],
        name,
        foldSearch(name),
        `p${n}@example.test`,
        at % 20 === 0 ? 1 : 0,
        state,
        at % 3 === 0 ? 'arrived' : 'expected',
        made,
        made,
      );
      if (state === 'confirmed') {
        post(n, 'Sold', PRICE, 'income');
        if (at % 7 !== 0) post(n, 'Paid', -PRICE, 'provider');
      }
      addHarp.run(`reg_${n}`, 'C-richter-standard');
      addHarp.run(`reg_${n}`, 'A-richter-standard');
      if (workshopId) addElective.run(`reg_${n}`, workshopId);
    }
  })();
}
