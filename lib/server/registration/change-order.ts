import 'server-only';
import { eq } from 'drizzle-orm';
import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { camp } from '@/db/schema/camp';
import { order } from '@/db/schema/order';
import { paidPath } from '@/lib/domain/registration/step-path';
import type { OrderId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import { getDb } from '../db';
import { type Refusal, refuse } from '../errors';
import { readDraftToken, writeDraftToken } from './draft-cookie';
import { reopenAnswers } from './reopen-answers';

/** Gives the place back and opens the answers again; the camp's address in return. */
export async function changeOrder(orderId: OrderId, now: number): Promise<Result<string, Refusal>> {
  const reopened = await reopenAnswers(orderId, await readDraftToken(), now);
  if (!reopened.ok) {
    if (reopened.error === 'paid') redirect(paidPath(orderId) as Route);
    return refuse(reopened.error);
  }
  await writeDraftToken(reopened.value);
  const row = getDb()
    .select({ slug: camp.slug })
    .from(order)
    .innerJoin(camp, eq(camp.id, order.campId))
    .where(eq(order.id, orderId))
    .get();
  return row ? ok(row.slug) : refuse('not_found');
}
