import 'server-only';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { InvitationInput } from '@/lib/schemas/staff';
import { getDb, inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { ownOrganisation } from '../organisations/own-organisation';
import { spend } from '../rate-limit';
import { mailInvitation } from './mail-invitation';
import { openInvitation } from './open-invitation';

/** Sends an invitation again with a new link and a new week to answer. */
export async function resendInvitation(
  input: InvitationInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Promise<Result<null, Refusal>> {
  const by = actor.user;
  const own = ownOrganisation(actor, input.organisationId, 'staff.manage');
  const found = own && openInvitation(getDb(), input);
  if (!by || !found) return refuse('not_found');
  if (!(await spend('mail-link', `invite ${found.email}`)))
    return refuse('too_many', {
      sentence: 'This address was written to several times within an hour. Wait a while.',
    });
  return inTransaction((tx) => {
    const still = openInvitation(tx, input);
    if (!still) return refuse('stale');
    mailInvitation(tx, { ...still, organisationName: own.name, invitedBy: by.name, now });
    return ok(null);
  });
}
