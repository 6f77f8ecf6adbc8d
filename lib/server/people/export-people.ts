import 'server-only';
import { Readable } from 'node:stream';
import { stringify } from 'csv-stringify';
import { eq } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import { order, registration } from '@/db/schema/order';
import type { PeopleQuery } from '@/lib/domain/people/people-query';
import type { CampId, OrganisationId } from '@/lib/domain/shared/ids';
import { writeAudit } from '../audit/write-audit';
import { getDb, inTransaction } from '../db';
import type { Context } from '../ladder';
import { paidSql } from '../orders/due-sql';
import { electivesOf, harpsOf } from './own-things';
import { peopleColumns } from './people-columns';
import { CSV_HEAD, csvRecord } from './people-csv';
import { peopleOrder } from './people-order';
import { peopleWhere } from './people-where';

/**
 * The people that a query finds, all pages, as CSV (RFC 4180, UTF-8 with a byte order mark so that spreadsheets read
 * the accents). Three statements and a note of who took it. A cell that a spreadsheet would run as a formula gets a leading apostrophe. The rows
 * are read at once, since an open cursor would block the connection's writes, and written as they are taken.
 */
export function exportPeople(
  camp: { id: CampId; organisationId: OrganisationId; timeZone: string },
  query: PeopleQuery,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): ReadableStream {
  const rows = getDb()
    .select({ ...peopleColumns, total: order.total, paid: paidSql })
    .from(registration)
    .innerJoin(order, eq(order.id, registration.orderId))
    .innerJoin(track, eq(track.id, registration.trackId))
    .where(peopleWhere(camp.id, query))
    .orderBy(...peopleOrder(query))
    .all();
  inTransaction((tx) =>
    writeAudit(tx, {
      organisationId: camp.organisationId,
      campId: camp.id,
      actorUserId: actor.user?.id ?? null,
      action: 'people.export',
      subjectId: camp.id,
      sentence: `Exported a list of ${rows.length} ${rows.length === 1 ? 'person' : 'people'}.`,
      now,
    }),
  );
  const inCamp = eq(registration.campId, camp.id);
  const electives = electivesOf(inCamp);
  const harps = harpsOf(inCamp);
  function* records() {
    for (const row of rows)
      yield csvRecord(row, electives.get(row.id) ?? [], harps.get(row.id) ?? [], camp.timeZone);
  }
  const csv = stringify({
    header: true,
    columns: [...CSV_HEAD, `Registered (${camp.timeZone})`],
    bom: true,
    record_delimiter: 'windows',
    escape_formulas: true,
    // It quotes only what holds its own record delimiter; a lone CR or LF would break the line as well.
    quoted_match: /[\r\n]/,
  });
  return Readable.toWeb(Readable.from(records()).pipe(csv)) as ReadableStream;
}
