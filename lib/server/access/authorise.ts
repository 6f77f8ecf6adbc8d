import 'server-only';
import type { Actor } from '@/lib/domain/access/actor';
import { can } from '@/lib/domain/access/can';
import { PERMISSIONS, type Permission, type PermissionRule } from '@/lib/domain/access/permissions';
import type { Refusal } from '../errors';
import { findTarget, type TargetKind } from './find-target';

/**
 * The permission rung of the ladder, for pages, actions and routes alike. Null when it holds. A row of a foreign
 * organisation answers like a row that is not there; a role that falls short in one's own organisation says so.
 */
export function refusalFor(
  actor: Actor,
  permission: Permission,
  on?: { kind: TargetKind; id: string },
): Refusal | null {
  const rule: PermissionRule = PERMISSIONS[permission];
  const target = on ? findTarget(on.kind, on.id) : null;
  if (can(actor, permission, target)) return null;
  if (rule.who === 'own') return { code: 'not_found' };
  if (!actor.user) return { code: 'sign_in_first' };
  if (!target || !('organisationId' in target)) return { code: 'not_found' };
  const member = actor.roles.some((held) => held.organisationId === target.organisationId);
  return { code: member ? 'not_allowed' : 'not_found' };
}
