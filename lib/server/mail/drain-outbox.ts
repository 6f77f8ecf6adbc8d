import 'server-only';
import { eq } from 'drizzle-orm';
import { mail } from '@/db/schema/mail';
import { afterFailure, type MailFailure } from '@/lib/domain/mail/after-failure';
import { getDb, inTransaction } from '../db';
import { log } from '../log';
import { composeMail } from './compose-mail';
import { judgeFailure } from './judge-failure';
import { leaseMail, type MailRow } from './lease-mail';
import { noteUndelivered } from './note-undelivered';
import { type SendMail, sendBySmtp } from './transport';

// A round ends after so many, so that other background work is not kept waiting.
const ROUND = 20;

/**
 * Sends what is due, row by row; says how many went out. A letter that cannot be written or is refused does not hold
 * up the others; when the server itself is away the round ends, and the rest waits for the next one.
 */
export async function drainOutbox(
  now: number,
  { send = sendBySmtp, jitter = Math.random }: { send?: SendMail; jitter?: () => number } = {},
): Promise<number> {
  let sent = 0;
  for (let turn = 0; turn < ROUND; turn += 1) {
    const row = leaseMail(now);
    if (!row) break;
    const outcome = await deliver(row, now, send);
    if (outcome.ok) {
      markSent(row, now);
      sent += 1;
      continue;
    }
    log.warn({ mailId: row.id, kind: row.kind, attempts: row.attempts, said: outcome.said }, 'mail not sent');
    markFailed(row, outcome, now, jitter());
    if (!outcome.oneLetter) break;
  }
  return sent;
}

type Outcome = { ok: true } | { ok: false; failure: MailFailure; oneLetter: boolean; said: string };

async function deliver(row: MailRow, now: number, send: SendMail): Promise<Outcome> {
  let message: Awaited<ReturnType<typeof composeMail>>;
  try {
    message = await composeMail(row, now);
  } catch (error) {
    const said = error instanceof Error ? error.message : 'cannot be written';
    return { ok: false, failure: 'broken', oneLetter: true, said };
  }
  try {
    await send(message);
    return { ok: true };
  } catch (error) {
    return { ok: false, ...judgeFailure(error) };
  }
}

/** The payload goes: a token that was mailed is kept nowhere. */
function markSent(row: MailRow, now: number): void {
  getDb()
    .update(mail)
    .set({ state: 'sent', sentAt: now, leasedUntil: null, lastError: null, payload: {} })
    .where(eq(mail.id, row.id))
    .run();
}

function markFailed(
  row: MailRow,
  { failure, said }: { failure: MailFailure; said: string },
  now: number,
  jitter: number,
): void {
  const again = afterFailure(failure, row, now, jitter);
  inTransaction((tx) => {
    tx.update(mail)
      .set({
        state: again === null ? 'failed' : 'queued',
        nextAttemptAt: again ?? row.nextAttemptAt,
        leasedUntil: null,
        lastError: said.slice(0, 200),
      })
      .where(eq(mail.id, row.id))
      .run();
    if (again === null) noteUndelivered(tx, row, failure, now);
  });
}
