import 'server-only';
import { camp } from '@/db/schema/camp';
import type { CampId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { CreateCampInput } from '@/lib/schemas/camp';
import { writeAudit } from '../audit/write-audit';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';
import { ownOrganisation } from '../organisations/own-organisation';
import { freeSlug } from './free-slug';

/** A draft with name, dates, zone and currency; the checklist leads on from there. */
export function createCamp(
  { organisationId, ...input }: CreateCampInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<{ campId: CampId }, Refusal> {
  return inTransaction((tx) => {
    if (!ownOrganisation(actor, organisationId, 'camp.create', tx)) return refuse('not_found');
    const id = newId('cmp', now);
    tx.insert(camp)
      .values({
        id,
        organisationId,
        slug: freeSlug(tx, input.name, input.startsOn, id),
        ...input,
        capacity: 0,
        createdAt: now,
        updatedAt: now,
      })
      .run();
    writeAudit(tx, {
      organisationId,
      campId: id,
      actorUserId: actor.user?.id ?? null,
      action: 'camp.create',
      subjectId: id,
      sentence: `Began ${input.name} as a draft.`,
      now,
    });
    return ok({ campId: id });
  });
}
