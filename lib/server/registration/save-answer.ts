import 'server-only';
import { eq } from 'drizzle-orm';
import { draft } from '@/db/schema/order';
import type { Answers } from '@/lib/domain/registration/answers';
import type { CampId } from '@/lib/domain/shared/ids';
import { inTransaction } from '../db';
import { hashToken, newToken } from '../hash-token';
import { newId } from '../new-id';
import { findDraft } from './find-draft';

/**
 * Keeps what was answered on one or more steps. Returns the token of the draft: a new one where the browser had none.
 * Null while its order is held: what is held is changed by giving the place back first. A draft whose order is past
 * that begins anew, for the next person this browser registers.
 */
export function saveAnswer(
  token: string | null,
  campId: CampId,
  given: Partial<Answers> & { warned?: string },
  now: number,
): { token: string; answers: Answers } | null {
  return inTransaction((tx) => {
    const known = findDraft(token, campId);
    if (known?.order?.state === 'held') return null;
    if (known && token) {
      const before = known.order ? {} : { ...known.answers, warned: known.warned };
      const answers = { ...before, ...given };
      tx.update(draft).set({ answers, orderId: null, updatedAt: now }).where(eq(draft.id, known.id)).run();
      return { token, answers };
    }
    // A token from a cookie is used again for another camp, never one that we did not make ourselves.
    const own =
      token &&
      tx
        .select()
        .from(draft)
        .where(eq(draft.tokenHash, hashToken(token)))
        .get()
        ? token
        : newToken();
    tx.insert(draft)
      .values({
        id: newId('dft', now),
        tokenHash: hashToken(own),
        campId,
        answers: given,
        createdAt: now,
        updatedAt: now,
      })
      .run();
    return { token: own, answers: given };
  });
}
