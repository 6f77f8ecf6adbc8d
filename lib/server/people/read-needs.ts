import 'server-only';
import { and, eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { registration, registrationNeeds } from '@/db/schema/order';
import type { Actor } from '@/lib/domain/access/actor';
import type { CampId, RegistrationId } from '@/lib/domain/shared/ids';
import { ownedBy } from '../access/owned-by';
import { writeAudit } from '../audit/write-audit';
import { inTransaction } from '../db';

/**
 * Health, emergency and guardian details of one attendee. Every look is written down, with who looked and not what was
 * seen; without the note there is no look. Null when the camp has no such registration; `needs` null when none are kept.
 */
export function readNeeds(actor: Actor, campId: CampId, id: RegistrationId, now: number) {
  return inTransaction((tx) => {
    const row = tx
      .select({
        name: registration.attendeeName,
        minor: registration.minor,
        organisationId: camp.organisationId,
        needs: registrationNeeds,
      })
      .from(registration)
      .innerJoin(camp, eq(camp.id, registration.campId))
      .leftJoin(registrationNeeds, eq(registrationNeeds.registrationId, registration.id))
      .where(
        and(
          eq(registration.id, id),
          eq(registration.campId, campId),
          ownedBy(actor, 'people.needs', camp.organisationId),
        ),
      )
      .get();
    if (!row) return null;
    writeAudit(tx, {
      organisationId: row.organisationId,
      campId,
      actorUserId: actor.user?.id ?? null,
      action: 'needs.read',
      subjectId: id,
      sentence: `Looked at the needs of ${row.name}.`,
      now,
    });
    return { name: row.name, minor: row.minor, needs: row.needs };
  });
}
