import 'server-only';
import { eq, inArray } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import { order, registration } from '@/db/schema/order';
import { PEOPLE_PAGE_SIZE, type PeopleQuery } from '@/lib/domain/people/people-query';
import type { PeoplePage } from '@/lib/domain/people/people-row';
import type { CampId } from '@/lib/domain/shared/ids';
import { minor } from '@/lib/domain/shared/money';
import { getDb } from '../db';
import { electivesOf, harpsOf } from './own-things';
import { peopleColumns } from './people-columns';
import { peopleOrder } from './people-order';
import { peopleWhere } from './people-where';

/** One page of a camp's people in four statements, whatever the camp's size. A page past the end is the last one. */
export function listPeople(campId: CampId, query: PeopleQuery): PeoplePage {
  const db = getDb();
  // One pass finds and sorts; reading every id is cheaper than a second pass that only counts.
  const found = db
    .select({ id: registration.id })
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .innerJoin(track, eq(track.id, registration.trackId))
    .where(peopleWhere(campId, query))
    .orderBy(...peopleOrder(query))
    .all();
  const pages = Math.max(1, Math.ceil(found.length / PEOPLE_PAGE_SIZE));
  const page = Math.min(query.page, pages);
  const ids = found.slice((page - 1) * PEOPLE_PAGE_SIZE, page * PEOPLE_PAGE_SIZE).map(({ id }) => id);
  const onPage = inArray(registration.id, ids);
  const rows = db
    .select(peopleColumns)
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .innerJoin(track, eq(track.id, registration.trackId))
    .where(onPage)
    .all();
  const at = new Map(ids.map((id, place) => [id, place]));
  rows.sort((a, b) => (at.get(a.id) ?? 0) - (at.get(b.id) ?? 0));
  const electives = electivesOf(onPage);
  const harps = harpsOf(onPage);
  return {
    rows: rows.map((row) => ({
      ...row,
      due: minor(row.due),
      electives: electives.get(row.id) ?? [],
      harps: harps.get(row.id) ?? [],
    })),
    total: found.length,
    page,
    pages,
  };
}
