import 'server-only';
import { and, desc, eq, gt } from 'drizzle-orm';
import { cookies } from 'next/headers';
import { session } from '@/db/schema/account';
import type { UserId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';
import { hashToken } from '../hash-token';
import { sessionCookieName } from './session-cookie';

export type SignInRow = { id: string; device: string; createdAt: number; endsAt: number; here: boolean };

/** Where a person is signed in now, this browser first (ASVS 7.5.2). */
export async function listSessions(userId: UserId, now: number): Promise<SignInRow[]> {
  const token = (await cookies()).get(sessionCookieName())?.value;
  const own = token ? hashToken(token) : null;
  return getDb()
    .select({
      id: session.id,
      device: session.device,
      createdAt: session.createdAt,
      endsAt: session.endsAt,
    })
    .from(session)
    .where(
      and(eq(session.userId, userId), gt(session.endsAt, now), gt(session.expiresAt, Math.floor(now / 1000))),
    )
    .orderBy(desc(session.createdAt))
    .all()
    .map((row) => ({ ...row, here: row.id === own }))
    .sort((a, b) => Number(b.here) - Number(a.here));
}
