/** away: the mail server cannot be reached or says "later" · refused: it says no for good · broken: we cannot write the letter. */
export type MailFailure = 'away' | 'refused' | 'broken';

const MINUTE = 60_000;
const FIRST = 30_000;
const LONGEST = 60 * MINUTE;
// RFC 5321, 4.5.4.1: keep trying for four to five days at least.
const GIVE_UP_AFTER = 5 * 24 * 60 * MINUTE;
const BROKEN_TRIES = 8;

/**
 * When to try again, in epoch ms, or null to give up and show it to a person. The wait doubles from half a minute to
 * an hour; `jitter` (0 to 1) spreads it over half to whole, so that many letters do not come back at once.
 */
export function afterFailure(
  failure: MailFailure,
  row: { attempts: number; createdAt: number },
  now: number,
  jitter: number,
): number | null {
  if (failure === 'refused') return null;
  if (failure === 'broken' && row.attempts >= BROKEN_TRIES) return null;
  if (now - row.createdAt >= GIVE_UP_AFTER) return null;
  const wait = Math.min(LONGEST, FIRST * 2 ** Math.min(row.attempts - 1, 20));
  return now + Math.round(wait * (0.5 + jitter / 2));
}
