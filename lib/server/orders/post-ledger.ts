import 'server-only';
import { type LedgerAccount, ledger } from '@/db/schema/money';
import type { OrderId, OrganisationId } from '@/lib/domain/shared/ids';
import { addMinor, type Minor } from '@/lib/domain/shared/money';
import type { Tx } from '../db';
import { newId } from '../new-id';

/** The reasons a posting can have; with its cause each is written once (a unique index refuses a second). */
export type LedgerMemo = 'Place sold' | 'Place given up' | 'Paid by card' | 'Refund' | 'Refund came back';

/** Writes one posting; its amounts (debit positive) must sum to zero. A posting of nothing is not written. */
export function postLedger(
  tx: Tx,
  posting: {
    organisationId: OrganisationId;
    orderId: OrderId;
    currency: string;
    memo: LedgerMemo;
    cause: string;
    entries: readonly { account: LedgerAccount; amount: Minor }[];
    now: number;
  },
): void {
  const { entries, now, ...shared } = posting;
  if (addMinor(...entries.map(({ amount }) => amount)) !== 0)
    throw new Error(`Posting "${posting.memo}" of ${posting.cause} does not balance`);
  if (entries.every(({ amount }) => amount === 0)) return;
  const id = newId('led', now);
  tx.insert(ledger)
    .values(
      entries.map((entry, at) => ({
        ...shared,
        ...entry,
        id: at === 0 ? id : newId('led', now),
        posting: id,
        at: now,
      })),
    )
    .run();
}
