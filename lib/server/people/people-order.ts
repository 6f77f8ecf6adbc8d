import 'server-only';
import { asc, desc, type SQL, sql } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import { order, registration } from '@/db/schema/order';
import { ARRIVAL_STATES } from '@/lib/domain/door/arrival-states';
import type { PeopleQuery, PeopleSort } from '@/lib/domain/people/people-query';
import { REGISTRATION_STATES } from '@/lib/domain/registration/states';
import { dueSql } from '../orders/due-sql';

/** Position in the list of words, so that states sort as they follow each other and not by letter. */
const rank = (column: unknown, words: readonly string[]): SQL =>
  sql`case ${column} ${sql.join(
    words.map((word, at) => sql`when ${word} then ${at}`),
    sql` `,
  )} end`;

const BY = {
  name: [registration.attendeeSearch],
  track: [track.position, track.id],
  state: [rank(registration.state, REGISTRATION_STATES)],
  arrival: [rank(registration.arrival, ARRIVAL_STATES)],
  due: [dueSql],
  order: [order.reference],
  registered: [registration.createdAt],
} satisfies Record<PeopleSort, unknown[]>;

/** Ties by name, then by id, so that a page never shows a row twice. */
export function peopleOrder({ sort, dir }: Pick<PeopleQuery, 'sort' | 'dir'>): SQL[] {
  const way = dir === 'asc' ? asc : desc;
  return [...BY[sort].map((by) => way(by)), asc(registration.attendeeSearch), asc(registration.id)];
}
