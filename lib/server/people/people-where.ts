import 'server-only';
import { and, eq, or, type SQL, sql } from 'drizzle-orm';
import { order, registration } from '@/db/schema/order';
import type { DueFilter, PeopleQuery } from '@/lib/domain/people/people-query';
import { foldSearch } from '@/lib/domain/shared/fold-search';
import { type CampId, isId } from '@/lib/domain/shared/ids';
import { dueSql } from '../orders/due-sql';

const MOST_WORDS = 8;
const DUE = {
  owes: sql`${dueSql} > 0`,
  even: sql`${dueSql} = 0`,
  back: sql`${dueSql} < 0`,
} satisfies Record<DueFilter, SQL>;

/** Every word must be found somewhere: in the name (accents and case aside), an address, the payer, or the reference. */
export function peopleWhere(
  campId: CampId,
  query: Omit<PeopleQuery, 'sort' | 'dir' | 'page'>,
): SQL | undefined {
  const words = foldSearch(query.q).split(' ').filter(Boolean).slice(0, MOST_WORDS);
  return and(
    eq(registration.campId, campId),
    query.state === '' ? undefined : eq(registration.state, query.state),
    query.arrival === '' ? undefined : eq(registration.arrival, query.arrival),
    isId('trk', query.track) ? eq(registration.trackId, query.track) : undefined,
    query.due === '' ? undefined : DUE[query.due],
    ...words.map((word) =>
      or(
        holds(registration.attendeeSearch, word),
        holds(registration.attendeeEmail, word),
        holds(order.payerEmail, word),
        holds(order.payerName, word),
        holds(order.reference, word),
      ),
    ),
  );
}

/** LIKE with the person's own % and _ taken as letters; SQLite compares Latin letters without case. */
const holds = (column: unknown, word: string): SQL =>
  sql`${column} like ${`%${word.replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`} escape '\\'`;
