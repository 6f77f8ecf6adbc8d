import 'server-only';
import { eq } from 'drizzle-orm';
import { membership, organisation } from '@/db/schema/organisation';
import { suggestSlug } from '@/lib/domain/camp/suggest-slug';
import type { OrganisationId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { CreateOrganisationInput } from '@/lib/schemas/organisation';
import { writeAudit } from '../audit/write-audit';
import { inTransaction, type Tx } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';

/** Makes an organisation with its maker as organiser. The maker's address must be proven: invitations go out in their name. */
export function createOrganisation(
  input: CreateOrganisationInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<{ organisationId: OrganisationId }, Refusal> {
  const { user } = actor;
  if (!user) return refuse('sign_in_first');
  if (!user.emailVerified)
    return refuse('not_allowed', {
      sentence: 'Your e-mail address is not proven yet. Open the link in our mail, then come back.',
    });
  return inTransaction((tx) => {
    const id = newId('org', now);
    tx.insert(organisation)
      .values({
        id,
        slug: freeSlug(tx, input.name, id),
        name: input.name,
        email: input.email,
        createdAt: now,
      })
      .run();
    tx.insert(membership)
      .values({
        id: newId('mbr', now),
        organisationId: id,
        userId: user.id,
        role: 'organiser',
        createdAt: now,
      })
      .run();
    writeAudit(tx, {
      organisationId: id,
      actorUserId: user.id,
      action: 'organisation.create',
      subjectId: id,
      sentence: `Started ${input.name}.`,
      now,
    });
    return ok({ organisationId: id });
  });
}

function freeSlug(tx: Tx, name: string, id: string): string {
  const wish = suggestSlug(name, 'organisation');
  const taken = tx
    .select({ id: organisation.id })
    .from(organisation)
    .where(eq(organisation.slug, wish))
    .get();
  return taken ? `${wish}-${id.slice(-6)}` : wish;
}
