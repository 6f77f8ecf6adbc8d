import type { Db } from '@/db/client';
import { user } from '@/db/schema/account';
import { membership } from '@/db/schema/organisation';
import type { StaffRole } from '@/lib/domain/access/roles';
import type { OrganisationId, UserId } from '@/lib/domain/shared/ids';
import { NOW } from './build-camp';

/** A verified account, with roles in an organisation where given. */
export function buildUser(
  db: Db,
  given: {
    id?: UserId;
    email?: string;
    name?: string;
    passwordHash?: string;
    in?: OrganisationId;
    roles?: StaffRole[];
  } = {},
): UserId {
  const id = given.id ?? 'usr_1';
  db.insert(user)
    .values({
      id,
      email: given.email ?? `${id}@example.test`,
      name: given.name ?? 'Noor Haddad',
      passwordHash: given.passwordHash ?? '!',
      emailVerifiedAt: NOW,
      createdAt: NOW,
    })
    .run();
  for (const role of given.roles ?? [])
    db.insert(membership)
      .values({
        id: `mbr_${id.slice(4)}${role}`,
        organisationId: given.in ?? 'org_1',
        userId: id,
        role,
        createdAt: NOW,
      })
      .run();
  return id;
}
