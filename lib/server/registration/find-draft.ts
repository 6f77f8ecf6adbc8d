import 'server-only';
import { and, eq, sql } from 'drizzle-orm';
import { draft, order } from '@/db/schema/order';
import type { Answers } from '@/lib/domain/registration/answers';
import type { RegistrationState } from '@/lib/domain/registration/states';
import type { CampId, Id, OrderId } from '@/lib/domain/shared/ids';
import { readAnswers } from '@/lib/schemas/answers';
import { preparedOnce } from '../db';
import { hashToken } from '../hash-token';

export type Draft = {
  id: Id<'dft'>;
  answers: Answers;
  /** An address that was warned about once and is taken as meant the next time. */
  warned: string;
  order: { id: OrderId; state: RegistrationState } | null;
};

const queries = preparedOnce((db) => ({
  draft: db
    .select({ id: draft.id, answers: draft.answers, orderId: order.id, orderState: order.state })
    .from(draft)
    .leftJoin(order, eq(order.id, draft.orderId))
    .where(
      and(eq(draft.tokenHash, sql.placeholder('tokenHash')), eq(draft.campId, sql.placeholder('campId'))),
    )
    .prepare(),
}));

/** What this browser has answered for this camp so far. */
export function findDraft(token: string | null, campId: CampId): Draft | null {
  if (!token) return null;
  const row = queries().draft.get({ tokenHash: hashToken(token), campId });
  if (!row) return null;
  return {
    id: row.id,
    answers: readAnswers(row.answers),
    warned: typeof row.answers.warned === 'string' ? row.answers.warned : '',
    order: row.orderId && row.orderState ? { id: row.orderId, state: row.orderState } : null,
  };
}
