import 'server-only';
import { and, eq } from 'drizzle-orm';
import { draft, order } from '@/db/schema/order';
import type { Answers } from '@/lib/domain/registration/answers';
import type { RegistrationState } from '@/lib/domain/registration/states';
import type { CampId, Id, OrderId } from '@/lib/domain/shared/ids';
import { readAnswers } from '@/lib/schemas/answers';
import { type Db, getDb, type Tx } from '../db';
import { hashToken } from '../hash-token';

export type Draft = {
  id: Id<'dft'>;
  answers: Answers;
  /** An address that was warned about once and is taken as meant the next time. */
  warned: string;
  order: { id: OrderId; state: RegistrationState } | null;
};

/** What this browser has answered for this camp so far. */
export function findDraft(token: string | null, campId: CampId, db: Db | Tx = getDb()): Draft | null {
  if (!token) return null;
  const row = db
    .select({ id: draft.id, answers: draft.answers, orderId: order.id, orderState: order.state })
    .from(draft)
    .leftJoin(order, eq(order.id, draft.orderId))
    .where(and(eq(draft.tokenHash, hashToken(token)), eq(draft.campId, campId)))
    .get();
  if (!row) return null;
  return {
    id: row.id,
    answers: readAnswers(row.answers),
    warned: typeof row.answers.warned === 'string' ? row.answers.warned : '',
    order: row.orderId && row.orderState ? { id: row.orderId, state: row.orderState } : null,
  };
}
