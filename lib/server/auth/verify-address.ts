import 'server-only';
import { and, eq, ne } from 'drizzle-orm';
import { session, user } from '@/db/schema/account';
import { homeFor } from '@/lib/domain/account/home-for';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { VerifyInput } from '@/lib/schemas/account';
import { getDb, inTransaction, type Tx } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { log } from '../log';
import { enqueueMail } from '../mail/enqueue-mail';
import { confirmPerson } from './confirm-person';
import { type EmailToken, getEmailToken, spendEmailToken, voidEmailTokens } from './email-tokens';
import { rememberDevice } from './known-device';
import { listRoles } from './list-roles';
import { clearOpening, getOpening } from './opening-cookie';
import { startSession } from './start-session';

const GONE = 'This link was used already or is too old. Sign in and ask for another on your account page.';

/** Proves an address by its link: the account's own, or the new one it moves to. Signs the person in. */
export async function verifyAddress(
  { token, password }: VerifyInput,
  context: Context,
): Promise<Result<{ to: string }, Refusal>> {
  const { now, actor, requestId } = context;
  const link = getEmailToken(token, now);
  if (!link || link.kind === 'reset') return refuse('not_found', { sentence: GONE });
  const opening = await getOpening();
  if (actor.user?.id !== link.userId && !opening?.opened(link.userId)) {
    const person = await confirmPerson(link.userId, password ?? '', 'password', context);
    if (!person.ok) return person;
  }
  const done = inTransaction((tx): Result<null, Refusal> => {
    const row = tx.select().from(user).where(eq(user.id, link.userId)).get();
    if (!row || row.disabledAt !== null || !getEmailToken(token, now, tx))
      return refuse('not_found', { sentence: GONE });
    if (link.kind === 'verify' && row.email !== link.email) return refuse('not_found', { sentence: GONE });
    const other = tx
      .select({ id: user.id })
      .from(user)
      .where(and(eq(user.email, link.email), ne(user.id, link.userId)))
      .get();
    if (other) return refuse('not_found', { sentence: GONE });
    spendEmailToken(tx, token, now);
    tx.update(user)
      .set({ email: link.email, emailVerifiedAt: row.emailVerifiedAt ?? now })
      .where(eq(user.id, row.id))
      .run();
    if (link.kind === 'change') moveAway(tx, row, link, now);
    return ok(null);
  });
  if (!done.ok) return done;
  log.info({ requestId, userId: link.userId, kind: link.kind }, 'address proven');
  await clearOpening();
  if (link.kind === 'change' || actor.user?.id !== link.userId) await signInAs(link, now);
  return ok({ to: opening?.next ?? (link.kind === 'change' ? '/account' : homeFor(listRoles(link.userId))) });
}

/** Older links and all sessions end with the old address, which is told (ASVS 7.4.3). */
function moveAway(tx: Tx, old: { email: string; name: string }, link: EmailToken, now: number): void {
  voidEmailTokens(tx, link.userId, now);
  tx.delete(session).where(eq(session.userId, link.userId)).run();
  enqueueMail(tx, {
    kind: 'account-changed',
    toName: old.name,
    toEmail: old.email,
    payload: { change: 'address' },
    now,
  });
}

async function signInAs({ userId, email }: EmailToken, now: number): Promise<void> {
  const row = getDb().select({ hash: user.passwordHash }).from(user).where(eq(user.id, userId)).get();
  if (row && (await startSession(userId, row.hash, now))) await rememberDevice(email);
}
