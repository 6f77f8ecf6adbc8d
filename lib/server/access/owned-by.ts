import 'server-only';
import { inArray, type SQL } from 'drizzle-orm';
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core';
import type { Actor } from '@/lib/domain/access/actor';
import { PERMISSIONS, type Permission, type PermissionRule } from '@/lib/domain/access/permissions';

/** For a query's `where`: the row's organisation is one in which the actor has a role that the permission asks for. */
export function ownedBy(actor: Actor, permission: Permission, organisationId: SQLiteColumn): SQL {
  const rule: PermissionRule = PERMISSIONS[permission];
  const roles: readonly string[] = rule.who === 'staff' ? rule.roles : [];
  const mine = actor.roles.filter((held) => roles.includes(held.role)).map((held) => held.organisationId);
  return inArray(organisationId, mine);
}
