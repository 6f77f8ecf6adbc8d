import 'server-only';
import { and, eq, isNull } from 'drizzle-orm';
import { membership } from '@/db/schema/organisation';
import type { Actor } from '@/lib/domain/access/actor';
import type { UserId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

/** The roles a person holds now; read each time, so that a revoked one ends at once (ASVS 8.3.2). */
export const listRoles = (userId: UserId): Actor['roles'] =>
  getDb()
    .select({ organisationId: membership.organisationId, role: membership.role })
    .from(membership)
    .where(and(eq(membership.userId, userId), isNull(membership.revokedAt)))
    .all();
