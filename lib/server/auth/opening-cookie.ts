import 'server-only';
import { createHmac, timingSafeEqual } from 'node:crypto';
import { cookies } from 'next/headers';
import { safeNext } from '@/lib/domain/account/safe-next';
import type { UserId } from '@/lib/domain/shared/ids';
import { env } from '../env';
import { cookieFlags, cookieName } from './session-cookie';

/**
 * Says that this browser opened a certain account, for a day. Proving an address must not prove it for somebody else's
 * account: who opens an account with a stranger's address and waits for them to press the link would share it with
 * them. So the link asks for the password, unless this cookie or a session shows that it is the same person.
 * An address that is known already gets a cookie of the same form, for an account that was never made.
 */
const DAY_SECONDS = 24 * 60 * 60;
const openingName = (): string => cookieName('combwood_opening');

const proofOf = (userId: UserId): string =>
  createHmac('sha256', env().AUTH_SECRET).update(`opening:${userId}`).digest('base64url');

export type Opening = { email: string; next: string | null; opened: (userId: UserId) => boolean };

export async function setOpening(userId: UserId, email: string, next: string | null): Promise<void> {
  const text = [email, next ?? ''].map((part) => Buffer.from(part).toString('base64url'));
  const value = [proofOf(userId), ...text].join('.');
  (await cookies()).set(openingName(), value, { ...cookieFlags(), maxAge: DAY_SECONDS });
}

export async function getOpening(): Promise<Opening | null> {
  const value = (await cookies()).get(openingName())?.value;
  const [proof, email = '', next = ''] = (value ?? '').split('.');
  if (!proof) return null;
  const read = (part: string): string => Buffer.from(part, 'base64url').toString('utf8');
  return {
    email: read(email).slice(0, 254),
    next: safeNext(read(next)),
    opened: (userId) => {
      const right = Buffer.from(proofOf(userId));
      const given = Buffer.from(proof);
      return right.length === given.length && timingSafeEqual(right, given);
    },
  };
}

export async function clearOpening(): Promise<void> {
  (await cookies()).set(openingName(), '', { ...cookieFlags(), maxAge: 0 });
}
