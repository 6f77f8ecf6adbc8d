import 'server-only';
import { cookies } from 'next/headers';
import { cookieFlags, cookieName } from '../auth/session-cookie';

/** Answers not sent within this many days are deleted, and so is the cookie that finds them. */
export const DRAFT_DAYS = 14;
const NAME = 'combwood_draft';

export const readDraftToken = async (): Promise<string | null> =>
  (await cookies()).get(cookieName(NAME))?.value.slice(0, 64) || null;

/** Only in an action or a handler. */
export async function writeDraftToken(token: string): Promise<void> {
  (await cookies()).set(cookieName(NAME), token, {
    ...cookieFlags(),
    maxAge: DRAFT_DAYS * 24 * 60 * 60,
  });
}

/** At sign-out: half-filled answers hold health details, and the next person at this browser is somebody else. */
export async function clearDraftToken(): Promise<void> {
  (await cookies()).set(cookieName(NAME), '', { ...cookieFlags(), maxAge: 0 });
}
