import 'server-only';
import { sql } from 'drizzle-orm';

// Names are written out: in a query of one table Drizzle drops a column's table, and inside the subquery a bare `id`
// would then be the ledger's own.

/**
 * What the payer of an `order` row still owes, in minor units, by the ledger; negative is what we owe back. An order
 * that is not confirmed has no sale in the books yet: all of it is due while held, nothing once it has ended.
 */
export const dueSql = sql<number>`case when "order"."state" in ('held', 'offered') then "order"."total" else coalesce(
  (select sum("ledger"."amount") from "ledger"
   where "ledger"."order_id" = "order"."id" and "ledger"."account" = 'payers'), 0) end`;

/** What has come in for an `order` row and has not gone back, in minor units. */
export const paidSql = sql<number>`coalesce(
  (select sum("ledger"."amount") from "ledger"
   where "ledger"."order_id" = "order"."id" and "ledger"."account" = 'provider'), 0)`;
