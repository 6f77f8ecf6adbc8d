import 'server-only';
import { DrizzleSQLiteAdapter } from '@lucia-auth/adapter-drizzle';
import { Lucia, TimeSpan } from 'lucia';
import { session, user } from '@/db/schema/account';
import type { UserId as PersonId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';
import { IDLE_DAYS } from './session-limits';

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof lucia>;
    UserId: PersonId;
    DatabaseSessionAttributes: { endsAt: number; createdAt: number; device: string };
    DatabaseUserAttributes: {
      email: string;
      name: string;
      emailVerifiedAt: number | null;
      disabledAt: number | null;
    };
  }
}

/**
 * The library that keeps sessions, used in this folder only, so that one room can replace it. Cookies are ours
 * (session-cookie.ts): lucia would rewrite its cookie to slide, which a page cannot; only the row slides here.
 */
export const lucia = () =>
  new Lucia(new DrizzleSQLiteAdapter(getDb(), session, user), {
    sessionExpiresIn: new TimeSpan(IDLE_DAYS, 'd'),
    getSessionAttributes: ({ endsAt, createdAt, device }) => ({ endsAt, createdAt, device }),
    getUserAttributes: ({ email, name, emailVerifiedAt, disabledAt }) => ({
      email,
      name,
      emailVerifiedAt,
      disabledAt,
    }),
  });
