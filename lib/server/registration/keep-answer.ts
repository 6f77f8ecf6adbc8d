import 'server-only';
import type { Route } from 'next';
import { redirect } from 'next/navigation';
import type { Answers } from '@/lib/domain/registration/answers';
import { payPath } from '@/lib/domain/registration/step-path';
import type { CampId } from '@/lib/domain/shared/ids';
import { readDraftToken, writeDraftToken } from './draft-cookie';
import { findDraft } from './find-draft';
import { saveAnswer } from './save-answer';

/** Keeps an answer under the browser's cookie, which it sets where there is none. Only in an action. */
export async function keepAnswer(
  camp: { id: CampId; slug: string },
  given: Partial<Answers> & { warned?: string },
  now: number,
): Promise<void> {
  const token = await readDraftToken();
  const saved = saveAnswer(token, camp.id, given, now);
  if (saved) {
    // Written each time, so that the cookie lasts as long as the answers do.
    await writeDraftToken(saved.token);
    return;
  }
  const held = findDraft(token, camp.id)?.order;
  if (held) redirect(payPath(camp.slug, held.id) as Route);
}
