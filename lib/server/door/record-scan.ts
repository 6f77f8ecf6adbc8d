import 'server-only';
import { eq } from 'drizzle-orm';
import { scan } from '@/db/schema/door';
import { registration } from '@/db/schema/order';
import { type DoorVerdict, decideArrival, decideUndo } from '@/lib/domain/door/decide-arrival';
import type { ScanAnswer } from '@/lib/domain/door/scan-answer';
import type { CampId, UserId } from '@/lib/domain/shared/ids';
import { localClock } from '@/lib/domain/shared/local-time';
import { formatMoney } from '@/lib/domain/shared/money';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { ScanInput } from '@/lib/schemas/scan';
import { inTransaction, type Tx } from '../db';
import { type Refusal, refuse } from '../errors';
import { orderDue } from '../orders/order-due';
import { verifyTicket } from '../tickets/verify-ticket';
import { arrivedBy, type FoundPerson, findByRegistration, findByTicket } from './find-door-person';

/**
 * Records one scan and answers its verdict, in one transaction. The id was made on the device, so a scan that is sent
 * again finds its row and changes nothing. The server's clock decides; the phone's is kept for the record.
 */
export function recordScan(
  campId: CampId,
  input: ScanInput,
  by: { userId: UserId; now: number },
): Result<ScanAnswer, Refusal> {
  // Verified before the transaction, so that a forged code holds no lock.
  const claims = input.kind === 'ticket' ? verifyTicket(input.code) : null;
  return inTransaction((tx) => {
    const known = tx
      .select({ campId: scan.campId, verdict: scan.verdict, registrationId: scan.registrationId })
      .from(scan)
      .where(eq(scan.id, input.id))
      .get();
    if (known && known.campId !== campId)
      return refuse('bad_input', { fields: { id: ['This id belongs to another scan.'] } });
    if (known) {
      // About whom it was then, whatever is sent now: a verdict is never said of somebody else.
      const then = known.registrationId && findByRegistration(tx, known.registrationId);
      return ok(answer(tx, campId, known.verdict as DoorVerdict, then || null));
    }
    const person =
      input.kind === 'ticket'
        ? claims && findByTicket(tx, claims.ticketId)
        : findByRegistration(tx, input.registrationId);
    // A name pick or an undo names a registration outright: one of another camp is not for this door to learn of.
    if (input.kind !== 'ticket' && person?.campId !== campId) return refuse('not_found');
    const verdict = input.kind === 'undo' ? decideUndo(campId, person) : decideArrival(campId, person);
    tx.insert(scan)
      .values({
        id: input.id,
        campId,
        registrationId: person?.registrationId ?? null,
        kind: input.kind === 'undo' ? 'undo' : 'arrive',
        source: input.kind === 'ticket' ? 'camera' : 'name',
        verdict,
        reason: input.kind === 'undo' ? input.reason : '',
        byUserId: by.userId,
        deviceAt: input.deviceAt,
        receivedAt: by.now,
      })
      .run();
    if (person && (verdict === 'arrived' || verdict === 'undone')) {
      const arrived = verdict === 'arrived';
      tx.update(registration)
        .set({
          arrival: arrived ? 'arrived' : 'expected',
          arrivedAt: arrived ? by.now : null,
          updatedAt: by.now,
        })
        .where(eq(registration.id, person.registrationId))
        .run();
    }
    return ok(answer(tx, campId, verdict, person && findByRegistration(tx, person.registrationId)));
  });
}

function answer(tx: Tx, campId: CampId, verdict: DoorVerdict, person: FoundPerson | null): ScanAnswer {
  if (!person || person.campId !== campId)
    return { verdict, person: null, otherCamp: person?.campName ?? null };
  const due = orderDue(person.orderId, tx);
  return {
    verdict,
    person: {
      registrationId: person.registrationId,
      name: person.name,
      track: person.trackName,
      minor: person.minor,
      hasNeeds: person.hasNeeds,
      due: due.amount > 0 ? formatMoney(due.amount, due.currency) : null,
      arrivedAt: person.arrivedAt === null ? null : localClock(person.arrivedAt, person.timeZone),
      arrivedBy: person.arrivedAt === null ? null : arrivedBy(tx, person.registrationId),
    },
    otherCamp: null,
  };
}
