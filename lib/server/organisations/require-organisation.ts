import 'server-only';
import { notFound } from 'next/navigation';
import type { Actor } from '@/lib/domain/access/actor';
import type { Permission } from '@/lib/domain/access/permissions';
import { isId } from '@/lib/domain/shared/ids';
import { requirePermission } from '../access/require-permission';
import { type OrganisationRow, ownOrganisation } from './own-organisation';

/** For pages of one organisation: who asks and its row, or sign-in, 403 or 404. `id` is the path's, unchecked. */
export async function requireOrganisation(
  id: string,
  permission: Permission,
): Promise<{ actor: Actor; organisation: OrganisationRow }> {
  const actor = await requirePermission(permission, { kind: 'organisation', id });
  const organisation = isId('org', id) ? ownOrganisation(actor, id, permission) : null;
  return organisation ? { actor, organisation } : notFound();
}
