import 'server-only';
import { and, count, eq } from 'drizzle-orm';
import { registrationWorkshop } from '@/db/schema/order';
import { meeting, workshop } from '@/db/schema/workshop';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { WorkshopRowInput } from '@/lib/schemas/workshop';
import { editOwnCamp } from '../camps/edit-own-camp';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';

/** Takes a workshop out; refused in words while it has meetings, or was ever chosen. Its harps go with it. */
export function deleteWorkshop(
  { campId, workshopId }: WorkshopRowInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ deleted: string }, Refusal> {
  return editOwnCamp(campId, context, (tx) => {
    const own = and(eq(workshop.id, workshopId), eq(workshop.campId, campId));
    const row = tx.select().from(workshop).where(own).get();
    if (!row) return refuse('not_found');
    const meetings =
      tx.select({ n: count() }).from(meeting).where(eq(meeting.workshopId, workshopId)).get()?.n ?? 0;
    if (meetings > 0)
      return refuse('in_use', {
        sentence: `${row.title} stays: it has ${meetings} ${meetings === 1 ? 'meeting' : 'meetings'} in the timetable. Take ${meetings === 1 ? 'it' : 'them'} out there first.`,
      });
    const chosen =
      tx
        .select({ n: count() })
        .from(registrationWorkshop)
        .where(eq(registrationWorkshop.workshopId, workshopId))
        .get()?.n ?? 0;
    if (chosen > 0)
      return refuse('in_use', {
        sentence: `${row.title} stays: ${chosen} ${chosen === 1 ? 'registration names' : 'registrations name'} it, cancelled ones included.`,
      });
    tx.delete(workshop).where(own).run();
    return ok({
      value: { deleted: workshopId },
      action: 'workshop.delete',
      subjectId: workshopId,
      sentence: `Deleted the workshop ${row.title}.`,
    });
  });
}
