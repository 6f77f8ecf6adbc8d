import 'server-only';
import { eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { ChangeAddressInput } from '@/lib/schemas/account';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { later } from '../later';
import { enqueueMail } from '../mail/enqueue-mail';
import { spend } from '../rate-limit';
import { confirmPerson } from './confirm-person';
import { mailAccountLink } from './mail-account-link';

/**
 * Asks to move one's account to another address: the password first (ASVS 7.5.1), then a link to the new one, which
 * does it. An address of somebody else's account is told by mail, never here.
 */
export async function changeAddress(
  { email, current }: ChangeAddressInput,
  context: Context,
): Promise<Result<null, Refusal>> {
  const me = context.actor.user;
  if (!me) return refuse('sign_in_first');
  if (email === me.email)
    return refuse('bad_input', {
      fields: { email: ['E-mail is the one you have already. Give the new one.'] },
    });
  const person = await confirmPerson(me.id, current, 'current', context);
  if (!person.ok) return person;
  const { now, requestId } = context;
  later(requestId, async () => {
    if (!(await spend('mail-link', `change ${email}`))) return;
    inTransaction((tx) => {
      const known = tx.select({ name: user.name }).from(user).where(eq(user.email, email)).get();
      if (known)
        enqueueMail(tx, { kind: 'known-address', toName: known.name, toEmail: email, payload: {}, now });
      else mailAccountLink(tx, { userId: me.id, name: me.name, email, kind: 'change', now });
    });
  });
  return ok(null);
}
