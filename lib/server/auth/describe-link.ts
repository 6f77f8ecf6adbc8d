import 'server-only';
import { eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { getDb } from '../db';
import { type EmailTokenKind, getEmailToken } from './email-tokens';
import { getActor } from './get-actor';
import { getOpening } from './opening-cookie';

export type LinkView = {
  kind: EmailTokenKind;
  /** The address that it proves. */
  email: string;
  /** The account's own, for password managers. */
  account: string;
  /** False where a session or the opening cookie shows already that it is the same person. */
  asksPassword: boolean;
};

/** What the page behind a mailed link shows; null once the link is used, voided or too old. Changes nothing. */
export async function describeLink(token: string, now: number): Promise<LinkView | null> {
  const link = getEmailToken(token, now);
  const person = link && getDb().select().from(user).where(eq(user.id, link.userId)).get();
  if (!link || !person || person.disabledAt !== null) return null;
  const same = (await getActor()).user?.id === person.id || (await getOpening())?.opened(person.id) === true;
  return { kind: link.kind, email: link.email, account: person.email, asksPassword: !same };
}
