import 'server-only';
import type { UserId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';
import { enqueueMail } from '../mail/enqueue-mail';
import { type EmailTokenKind, makeEmailToken } from './email-tokens';

const LETTERS = { verify: 'verify', change: 'verify', reset: 'reset' } as const;

/** A single-use link to `email`: the token and its letter in one transaction. */
export function mailAccountLink(
  tx: Tx,
  to: { userId: UserId; name: string; email: string; kind: EmailTokenKind; now: number },
): void {
  const token = makeEmailToken(tx, to);
  enqueueMail(tx, {
    kind: LETTERS[to.kind],
    toName: to.name,
    toEmail: to.email,
    payload: { token },
    now: to.now,
  });
}
