import 'server-only';
import { asc, desc, eq } from 'drizzle-orm';
import { ledger } from '@/db/schema/money';
import { order } from '@/db/schema/order';
import type { LedgerLine } from '@/lib/domain/money/camp-money';
import type { CampId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

export const LEDGER_SHOWN = 60;

/** The newest lines of a camp's ledger, the lines of one posting together; one statement. */
export const listLedger = (campId: CampId): LedgerLine[] =>
  getDb()
    .select({
      id: ledger.id,
      posting: ledger.posting,
      at: ledger.at,
      account: ledger.account,
      memo: ledger.memo,
      reference: order.reference,
      amount: ledger.amount,
      currency: ledger.currency,
    })
    .from(ledger)
    .innerJoin(order, eq(order.id, ledger.orderId))
    .where(eq(order.campId, campId))
    .orderBy(desc(ledger.at), desc(ledger.posting), asc(ledger.id))
    .limit(LEDGER_SHOWN)
    .all();
