import 'server-only';
import { eq } from 'drizzle-orm';
import { organisation } from '@/db/schema/organisation';
import type { OrganisationId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { EditOrganisationInput } from '@/lib/schemas/organisation';
import { writeAudit } from '../audit/write-audit';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { ownOrganisation } from './own-organisation';

/** Name and the address that players write to. */
export function editOrganisation(
  { organisationId, name, email }: EditOrganisationInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<{ organisationId: OrganisationId }, Refusal> {
  return inTransaction((tx) => {
    if (!ownOrganisation(actor, organisationId, 'organisation.edit', tx)) return refuse('not_found');
    tx.update(organisation).set({ name, email }).where(eq(organisation.id, organisationId)).run();
    writeAudit(tx, {
      organisationId,
      actorUserId: actor.user?.id ?? null,
      action: 'organisation.edit',
      subjectId: organisationId,
      sentence: `Changed the details of ${name}.`,
      now,
    });
    return ok({ organisationId });
  });
}
