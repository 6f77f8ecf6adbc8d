import 'server-only';
import { and, eq, gt, isNull } from 'drizzle-orm';
import { emailToken } from '@/db/schema/account';
import { RESET_MINUTES, VERIFY_HOURS } from '@/lib/domain/account/link-limits';
import type { UserId } from '@/lib/domain/shared/ids';
import { type Db, getDb, type Tx } from '../db';
import { hashToken, newToken } from '../hash-token';
import { newId } from '../new-id';

export type EmailTokenKind = 'verify' | 'reset' | 'change';

const MINUTE = 60 * 1000;
/** Short lives (ASVS 6.5.5): a reset opens the account, the others only prove an address. */
const LIFE = {
  verify: VERIFY_HOURS * 60 * MINUTE,
  change: VERIFY_HOURS * 60 * MINUTE,
  reset: RESET_MINUTES * MINUTE,
} satisfies Record<EmailTokenKind, number>;

/** A link's token; the table gets its SHA-256 only (ASVS 6.5.2). */
export function makeEmailToken(
  tx: Tx,
  { userId, kind, email, now }: { userId: UserId; kind: EmailTokenKind; email: string; now: number },
): string {
  const token = newToken();
  tx.insert(emailToken)
    .values({
      id: newId('etk', now),
      userId,
      kind,
      email,
      tokenHash: hashToken(token),
      expiresAt: now + LIFE[kind],
      createdAt: now,
    })
    .run();
  return token;
}

const usable = (token: string, now: number) =>
  and(eq(emailToken.tokenHash, hashToken(token)), isNull(emailToken.usedAt), gt(emailToken.expiresAt, now));

export type EmailToken = { userId: UserId; kind: EmailTokenKind; email: string };
const columns = { userId: emailToken.userId, kind: emailToken.kind, email: emailToken.email };

/** What a link is for, while it still opens anything. Uses nothing up. */
export const getEmailToken = (token: string, now: number, db: Db | Tx = getDb()): EmailToken | null =>
  db.select(columns).from(emailToken).where(usable(token, now)).get() ?? null;

/** Uses a link up: of two that race, one statement finds the row unused and the other does not (ASVS 6.5.1). */
export const spendEmailToken = (tx: Tx, token: string, now: number): EmailToken | null =>
  tx.update(emailToken).set({ usedAt: now }).where(usable(token, now)).returning(columns).get() ?? null;

/** Voids every link of a person that is still open. */
export function voidEmailTokens(tx: Tx, userId: UserId, now: number): void {
  tx.update(emailToken)
    .set({ usedAt: now })
    .where(and(eq(emailToken.userId, userId), isNull(emailToken.usedAt)))
    .run();
}
