import 'server-only';
import { and, eq } from 'drizzle-orm';
import { paymentEvent } from '@/db/schema/money';
import { isId } from '@/lib/domain/shared/ids';
import { inTransaction, type Tx } from '../db';
import { log } from '../log';
import type { ProviderEvent } from '../payments/read-event';
import { applyRefund } from './apply-refund';
import { applySession } from './apply-session';
import type { EventOutcome } from './event-outcome';

/**
 * Records a provider's event and its effect in one transaction: both or neither, and once. Events come unordered,
 * repeated and for days; a session's event is also known by what it says of which session.
 */
export function applyEvent(event: ProviderEvent, now: number): EventOutcome | { outcome: 'repeated' } {
  const told = inTransaction((tx) => {
    const known = tx.select().from(paymentEvent).where(eq(paymentEvent.id, event.id)).get();
    if (known) return { outcome: 'repeated' as const };
    const effect = saidBefore(tx, event) ?? effectOf(tx, event, now);
    const { outcome, reason, orderId = '' } = effect;
    tx.insert(paymentEvent)
      .values({
        id: event.id,
        type: event.type,
        objectId: event.objectId,
        orderId: isId('ord', orderId) ? orderId : null,
        outcome,
        reason,
        receivedAt: now,
      })
      .run();
    return effect;
  });
  if (told.outcome === 'set-aside')
    log.error({ event: event.id, type: event.type, reason: told.reason }, 'payment event set aside');
  return told;
}

function saidBefore(tx: Tx, event: ProviderEvent): EventOutcome | null {
  if (event.about !== 'session') return null;
  const same = tx
    .select({ id: paymentEvent.id })
    .from(paymentEvent)
    .where(
      and(
        eq(paymentEvent.type, event.type),
        eq(paymentEvent.objectId, event.objectId),
        eq(paymentEvent.outcome, 'applied'),
      ),
    )
    .get();
  return same ? { outcome: 'ignored', reason: `Said before by ${same.id}.` } : null;
}

function effectOf(tx: Tx, event: ProviderEvent, now: number): EventOutcome {
  if (event.about === 'session') return applySession(tx, event.session, now);
  // A slow method that failed ends its session for good: the same as one that ran out.
  if (event.about === 'failure') return applySession(tx, { ...event.session, state: 'expired' }, now);
  if (event.about === 'refund') return applyRefund(tx, event.refund, now);
  return { outcome: 'ignored', reason: 'Nothing here follows from it.' };
}
