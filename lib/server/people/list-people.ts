import 'server-only';
import { count, eq } from 'drizzle-orm';
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
  const where = peopleWhere(campId, query);
  const found = db
    .select({ total: count() })
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .where(where)
    .get();
  const total = found?.total ?? 0;
  const pages = Math.max(1, Math.ceil(total / PEOPLE_PAGE_SIZE));
  const page = Math.min(query.page, pages);
  const rows = db
    .select(peopleColumns)
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .innerJoin(track, eq(track.id, registration.trackId))
    .where(where)
    .orderBy(...peopleOrder(query))
    .limit(PEOPLE_PAGE_SIZE)
    .offset((page - 1) * PEOPLE_PAGE_SIZE)
    .all();
  const ids = rows.map(({ id }) => id);
  const electives = electivesOf(ids);
  const harps = harpsOf(ids);
  return {
    rows: rows.map((row) => ({
      ...row,
      due: minor(row.due),
      electives: electives.get(row.id) ?? [],
      harps: harps.get(row.id) ?? [],
    })),
    total,
    page,
    pages,
  };
}
