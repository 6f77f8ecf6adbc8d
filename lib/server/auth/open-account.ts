import 'server-only';
import { eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { safeNext } from '@/lib/domain/account/safe-next';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { SignUpInput } from '@/lib/schemas/account';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { later } from '../later';
import { log } from '../log';
import { enqueueMail } from '../mail/enqueue-mail';
import { newId } from '../new-id';
import { spend } from '../rate-limit';
import { hashPassword } from './hash-password';
import { mailAccountLink } from './mail-account-link';
import { setOpening } from './opening-cookie';
import { passwordRefusal } from './password-refusal';

/**
 * Opens an account, or writes to the one there is. The answer, its cookie, its time and the number of letters are the
 * same for both (ASVS 6.3.8): whether the address is known is looked up when the answer has left.
 */
export async function openAccount(
  { email, name, password, next }: SignUpInput,
  { now, address, requestId }: Context,
): Promise<Result<null, Refusal>> {
  if (!(await spend('sign-up', address))) return refuse('too_many');
  const weak = passwordRefusal(password, { email, name });
  if (weak) return weak;
  const id = newId('usr', now);
  const passwordHash = await hashPassword(password);
  await setOpening(id, email, safeNext(next));
  later(requestId, async () => {
    if (!(await spend('mail-link', `open ${email}`))) return;
    const made = inTransaction((tx) => {
      const known = tx.select({ name: user.name }).from(user).where(eq(user.email, email)).get();
      if (known) {
        enqueueMail(tx, { kind: 'known-address', toName: known.name, toEmail: email, payload: {}, now });
        return false;
      }
      tx.insert(user).values({ id, email, name, passwordHash, createdAt: now }).run();
      mailAccountLink(tx, { userId: id, name, email, kind: 'verify', now });
      return true;
    });
    log.info({ requestId, ...(made && { userId: id }) }, 'account asked for');
  });
  return ok(null);
}
