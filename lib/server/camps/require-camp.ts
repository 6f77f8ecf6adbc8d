import 'server-only';
import { notFound } from 'next/navigation';
import type { Actor } from '@/lib/domain/access/actor';
import type { Permission } from '@/lib/domain/access/permissions';
import { isId } from '@/lib/domain/shared/ids';
import { requirePermission } from '../access/require-permission';
import { type CampRow, ownCamp } from './own-camp';

/** For pages of one camp: who asks and the camp's row, or sign-in, 403 or 404. `id` is the path's, unchecked. */
export async function requireCamp(
  id: string,
  permission: Permission,
): Promise<{ actor: Actor; camp: CampRow }> {
  const actor = await requirePermission(permission, { kind: 'camp', id });
  const camp = isId('cmp', id) ? ownCamp(actor, id, permission) : null;
  return camp ? { actor, camp } : notFound();
}
