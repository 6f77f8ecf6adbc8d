import type { Db } from '@/db/client';
import { user } from '@/db/schema/account';
import type { UserId } from '@/lib/domain/shared/ids';
import { hashPassword } from '@/lib/server/auth/hash-password';
import { NOW } from './build-camp';

export const PASSWORD = 'boat reed walnut';

/** An account that can sign in with PASSWORD; its address is `{tail}@example.test`. */
export async function buildAccount(
  db: Db,
  tail = 'noor',
  overrides: Partial<typeof user.$inferInsert> = {},
): Promise<UserId> {
  const id: UserId = `usr_${tail}`;
  db.insert(user)
    .values({
      id,
      email: `${tail}@example.test`,
      name: 'Noor Haddad',
      passwordHash: await hashPassword(PASSWORD),
      emailVerifiedAt: NOW,
      createdAt: NOW,
      ...overrides,
    })
    .run();
  return id;
}
