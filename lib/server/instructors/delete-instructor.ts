import 'server-only';
import { and, eq } from 'drizzle-orm';
import { instructor } from '@/db/schema/camp';
import { workshop, workshopInstructor } from '@/db/schema/workshop';
import { listWords } from '@/lib/domain/shared/list-words';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { InstructorRowInput } from '@/lib/schemas/instructor';
import { editOwnCamp } from '../camps/edit-own-camp';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';

/** Takes an instructor out; refused in words while workshops name them. */
export function deleteInstructor(
  { campId, instructorId }: InstructorRowInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ deleted: string }, Refusal> {
  return editOwnCamp(campId, context, (tx) => {
    const own = and(eq(instructor.id, instructorId), eq(instructor.campId, campId));
    const row = tx.select().from(instructor).where(own).get();
    if (!row) return refuse('not_found');
    const taught = tx
      .select({ title: workshop.title })
      .from(workshopInstructor)
      .innerJoin(workshop, eq(workshop.id, workshopInstructor.workshopId))
      .where(eq(workshopInstructor.instructorId, instructorId))
      .orderBy(workshop.title)
      .all();
    if (taught.length > 0)
      return refuse('in_use', {
        sentence: `${row.name} stays: they teach ${listWords(
          taught.map(({ title }) => title),
          'and',
          3,
        )}. Give ${taught.length === 1 ? 'it' : 'those'} to somebody else first.`,
      });
    tx.delete(instructor).where(own).run();
    return ok({
      value: { deleted: instructorId },
      action: 'instructor.delete',
      subjectId: instructorId,
      sentence: `Deleted the instructor ${row.name}.`,
    });
  });
}
