import 'server-only';
import { and, eq } from 'drizzle-orm';
import { meeting } from '@/db/schema/workshop';
import type { MeetingId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { MoveMeetingInput } from '@/lib/schemas/meeting';
import { writeAudit } from '../audit/write-audit';
import { loadProgramme } from '../camps/load-programme';
import { ownCamp } from '../camps/own-camp';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { checkPlacing } from './check-placing';
import { saySlot, titleOf } from './say-slot';

/** Another day, time, room or length. Refused when it clashes, or when someone moved it since the page was opened. */
export function moveMeeting(
  { campId, meetingId, updatedAt, day, starts, roomId, lengthMinutes }: MoveMeetingInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<{ meetingId: MeetingId }, Refusal> {
  return inTransaction((tx) => {
    const programme = ownCamp(actor, campId, 'timetable.edit', tx) && loadProgramme(campId);
    const row = programme?.meetings.find(({ id }) => id === meetingId);
    if (!programme || !row) return refuse('not_found');
    if (row.updatedAt !== updatedAt)
      return refuse('stale', {
        sentence: `Someone changed ${titleOf(programme, row)} since you opened this page: it is now ${saySlot(programme, row)}. Load the page again, then move it.`,
      });
    const moved = { ...row, day, starts, roomId, lengthMinutes: lengthMinutes ?? row.lengthMinutes };
    const checked = checkPlacing(programme, moved);
    if (!checked.ok) return checked;
    const same =
      row.day === day &&
      row.starts === starts &&
      row.roomId === roomId &&
      row.lengthMinutes === moved.lengthMinutes;
    if (same) return ok({ meetingId });
    tx.update(meeting)
      .set({
        day,
        starts,
        roomId,
        lengthMinutes: moved.lengthMinutes,
        sequence: row.sequence + 1,
        // Never the same twice, even within one millisecond: it is what tells a stale form.
        updatedAt: Math.max(now, row.updatedAt + 1),
      })
      .where(and(eq(meeting.id, meetingId), eq(meeting.campId, campId)))
      .run();
    writeAudit(tx, {
      organisationId: programme.camp.organisationId,
      campId,
      actorUserId: actor.user?.id ?? null,
      action: 'meeting.move',
      subjectId: meetingId,
      sentence: `Moved ${titleOf(programme, row)}: ${saySlot(programme, row)} → ${saySlot(programme, moved)}.`,
      now,
    });
    return ok({ meetingId });
  });
}
