import 'server-only';
import { eq } from 'drizzle-orm';
import { registration } from '@/db/schema/order';
import type { RegistrationId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import { enqueueMail } from '../mail/enqueue-mail';

/** Mails an attendee their packing list as it stands, to their own address whoever asked. */
export function mailPackingList(registrationId: RegistrationId, now: number): Result<null, Refusal> {
  return inTransaction((tx) => {
    const person = tx
      .select({
        name: registration.attendeeName,
        email: registration.attendeeEmail,
        state: registration.state,
      })
      .from(registration)
      .where(eq(registration.id, registrationId))
      .get();
    if (person?.state !== 'confirmed')
      return refuse('not_found', { sentence: 'There is a packing list to mail once the place is paid.' });
    enqueueMail(tx, {
      kind: 'packing-list',
      toName: person.name,
      toEmail: person.email,
      payload: { registrationId },
      now,
    });
    return ok(null);
  });
}
