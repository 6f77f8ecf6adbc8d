import 'server-only';
import { eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { missingForSale } from '@/lib/domain/camp/missing-for-sale';
import type { CampId } from '@/lib/domain/shared/ids';
import type { Result } from '@/lib/domain/shared/result';
import { writeAudit } from '../audit/write-audit';
import { inTransaction, type Tx } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { loadProgramme } from './load-programme';
import { type CampRow, ownCamp } from './own-camp';

/** What an edit came to, and the line about it in the camp's record. */
export type Edited<T> = { value: T; action: string; subjectId: string; sentence: string };

/** Thrown to undo the writes of an edit that turns out to be refused; never leaves this file. */
class Undo extends Error {
  constructor(readonly refusal: Refusal) {
    super('undo');
  }
}

/**
 * One edit of a camp or of anything in it: takes the lock, finds the camp where the actor may edit it, runs, notes who
 * did what. A camp on sale must keep what selling needs: an edit that takes it away is undone and refused.
 */
export function editOwnCamp<T>(
  campId: CampId,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
  run: (tx: Tx, camp: CampRow) => Result<Edited<T>, Refusal>,
): Result<T, Refusal> {
  try {
    return inTransaction((tx): Result<T, Refusal> => {
      const own = ownCamp(actor, campId, 'camp.edit', tx);
      if (!own) return refuse('not_found');
      const lackedBefore = own.state === 'published' ? lacking(campId) : null;
      const edited = run(tx, own);
      if (!edited.ok) throw new Undo(edited.error);
      const { value, ...note } = edited.value;
      tx.update(camp).set({ updatedAt: now }).where(eq(camp.id, campId)).run();
      if (lackedBefore) keepSelling(lacking(campId).filter((said) => !lackedBefore.includes(said)));
      writeAudit(tx, {
        organisationId: own.organisationId,
        campId,
        actorUserId: actor.user?.id ?? null,
        ...note,
        now,
      });
      return { ok: true, value };
    });
  } catch (error) {
    if (error instanceof Undo) return { ok: false, error: error.refusal };
    throw error;
  }
}

function lacking(campId: CampId): string[] {
  const programme = loadProgramme(campId);
  return programme ? missingForSale(programme) : [];
}

function keepSelling(missing: string[]): void {
  if (missing.length > 0)
    throw new Undo({
      code: 'not_ready',
      sentence: `The camp is on sale and cannot do without this. ${missing.join(' ')} Put it back, or close the sale first.`,
    });
}
