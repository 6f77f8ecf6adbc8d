import 'server-only';
import { type MailKind, mail } from '@/db/schema/mail';
import type { Tx } from '../db';
import { newId } from '../new-id';

/** Puts a mail in the outbox, in the transaction that causes it. `payload` holds ids, and a raw token where a link needs one. */
export function enqueueMail(
  tx: Tx,
  letter: { kind: MailKind; toName: string; toEmail: string; payload: Record<string, string>; now: number },
): void {
  tx.insert(mail)
    .values({
      id: newId('mail', letter.now),
      kind: letter.kind,
      toName: letter.toName,
      toEmail: letter.toEmail,
      payload: letter.payload,
      nextAttemptAt: letter.now,
      createdAt: letter.now,
    })
    .run();
}
