import 'server-only';
import { and, eq } from 'drizzle-orm';
import { meeting } from '@/db/schema/workshop';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { RemoveMeetingInput } from '@/lib/schemas/meeting';
import { writeAudit } from '../audit/write-audit';
import { loadProgramme } from '../camps/load-programme';
import { ownCamp } from '../camps/own-camp';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { saySlot, titleOf } from './say-slot';

/** Takes a meeting off the timetable; its workshop stays and waits among the unplaced. */
export function removeMeeting(
  { campId, meetingId, updatedAt }: RemoveMeetingInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<null, Refusal> {
  return inTransaction((tx) => {
    const programme = ownCamp(actor, campId, 'timetable.edit', tx) && loadProgramme(campId);
    const row = programme?.meetings.find(({ id }) => id === meetingId);
    if (!programme || !row) return refuse('not_found');
    if (row.updatedAt !== updatedAt)
      return refuse('stale', {
        sentence: `Someone changed ${titleOf(programme, row)} since you opened this page: it is now ${saySlot(programme, row)}. Load the page again.`,
      });
    tx.delete(meeting)
      .where(and(eq(meeting.id, meetingId), eq(meeting.campId, campId)))
      .run();
    writeAudit(tx, {
      organisationId: programme.camp.organisationId,
      campId,
      actorUserId: actor.user?.id ?? null,
      action: 'meeting.remove',
      subjectId: meetingId,
      sentence: `Took ${titleOf(programme, row)} off the timetable: ${saySlot(programme, row)}.`,
      now,
    });
    return ok(null);
  });
}
