import 'server-only';
import { and, eq } from 'drizzle-orm';
import { instructor } from '@/db/schema/camp';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import type { InstructorId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { InstructorInput } from '@/lib/schemas/instructor';
import { editOwnCamp } from '../camps/edit-own-camp';
import { endOf } from '../camps/own-rows';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';
import { listLinkable } from './list-linkable';

/** Adds an instructor, or changes one. Only an account that is an instructor of this organisation may be linked. */
export function saveInstructor(
  { campId, instructorId, userId, ...input }: InstructorInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ instructorId: InstructorId }, Refusal> {
  return editOwnCamp(campId, context, (tx, camp) => {
    const own = and(eq(instructor.id, instructorId ?? 'ins_'), eq(instructor.campId, campId));
    const before = instructorId ? tx.select().from(instructor).where(own).get() : undefined;
    if (instructorId && !before) return refuse('not_found');
    // A link that was made stays possible to keep after the role ended, but not to make.
    const known =
      !userId ||
      userId === before?.userId ||
      listLinkable(camp.organisationId, tx).some(({ id }) => id === userId);
    if (!known)
      return refuse('bad_input', {
        fields: {
          userId: [
            'That account is no instructor of this organisation. Invite them under Staff, then link them here.',
          ],
        },
      });
    const row = { ...input, userId: userId ?? null };
    if (instructorId) {
      tx.update(instructor).set(row).where(own).run();
      return ok({
        value: { instructorId },
        action: 'instructor.edit',
        subjectId: instructorId,
        sentence: `Changed the instructor ${row.name}.`,
      });
    }
    const end = endOf(tx, 'instructors', campId);
    if (end.rows >= CAMP_LIMITS.instructors)
      return refuse('bad_input', { sentence: `A camp has at most ${CAMP_LIMITS.instructors} instructors.` });
    const id = newId('ins', context.now);
    tx.insert(instructor)
      .values({ id, campId, position: end.position, ...row })
      .run();
    return ok({
      value: { instructorId: id },
      action: 'instructor.add',
      subjectId: id,
      sentence: `Added the instructor ${row.name}.`,
    });
  });
}
