import 'server-only';
import { cookies } from 'next/headers';
import { env } from '../env';

/** Answers not sent within this many days are deleted, and so is the cookie that finds them. */
export const DRAFT_DAYS = 14;

const secure = () => env().BASE_URL.startsWith('https:');
/** `__Host-` binds it to this host over https; over plain http on localhost browsers refuse that prefix. */
const cookieName = () => (secure() ? '__Host-combwood_draft' : 'combwood_draft');

export const readDraftToken = async (): Promise<string | null> =>
  (await cookies()).get(cookieName())?.value.slice(0, 64) || null;

/** Only in an action or a handler. */
export async function writeDraftToken(token: string): Promise<void> {
  (await cookies()).set(cookieName(), token, {
    httpOnly: true,
    sameSite: 'lax',
    secure: secure(),
    path: '/',
    maxAge: DRAFT_DAYS * 24 * 60 * 60,
  });
}
