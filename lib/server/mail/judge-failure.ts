import 'server-only';
import type { MailFailure } from '@/lib/domain/mail/after-failure';

/** What went wrong with a send. A wrong password or a full server is "away": the letters are good and wait. */
export function judgeFailure(error: unknown): { failure: MailFailure; oneLetter: boolean; said: string } {
  const { code, responseCode, command } = (error ?? {}) as Record<string, unknown>;
  const aboutLetter = code === 'EENVELOPE' || code === 'EMESSAGE';
  const permanent = typeof responseCode === 'number' && responseCode >= 500;
  const said = [code, responseCode, command].filter(Boolean).join(' ');
  // The server's own words may repeat the recipient's address, so they are not kept.
  return {
    failure: aboutLetter && permanent ? 'refused' : 'away',
    oneLetter: aboutLetter,
    said: said || (error instanceof Error ? error.name : 'unknown'),
  };
}
