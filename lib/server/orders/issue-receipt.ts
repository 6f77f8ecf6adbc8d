import 'server-only';
import { eq, max } from 'drizzle-orm';
import { receipt } from '@/db/schema/money';
import type { Id, OrderId, OrganisationId } from '@/lib/domain/shared/ids';
import type { Minor } from '@/lib/domain/shared/money';
import type { Tx } from '../db';
import { newId } from '../new-id';

/** The organisation's next receipt number. Taken in the payment's own transaction, so that a rollback leaves no gap. */
export function issueReceipt(
  tx: Tx,
  of: {
    organisationId: OrganisationId;
    orderId: OrderId;
    paymentId: Id<'pay'>;
    amount: Minor;
    currency: string;
    now: number;
  },
): number {
  const { now, ...row } = of;
  const last = tx
    .select({ number: max(receipt.number) })
    .from(receipt)
    .where(eq(receipt.organisationId, of.organisationId))
    .get();
  const number = (last?.number ?? 0) + 1;
  tx.insert(receipt)
    .values({ ...row, id: newId('rcp', now), number, issuedAt: now })
    .run();
  return number;
}
