import 'server-only';
import { meeting } from '@/db/schema/workshop';
import type { MeetingId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { PlaceMeetingInput } from '@/lib/schemas/meeting';
import { writeAudit } from '../audit/write-audit';
import { loadProgramme } from '../camps/load-programme';
import { ownCamp } from '../camps/own-camp';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';
import { checkPlacing } from './check-placing';
import { saySlot, titleOf } from './say-slot';

/** Puts a workshop into the timetable. Checked inside the transaction that writes it, so two organisers cannot both win. */
export function placeMeeting(
  { campId, workshopId, roomId, day, starts, lengthMinutes }: PlaceMeetingInput,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<{ meetingId: MeetingId }, Refusal> {
  return inTransaction((tx) => {
    const programme = ownCamp(actor, campId, 'timetable.edit', tx) && loadProgramme(campId);
    if (!programme) return refuse('not_found');
    const usual = programme.workshops.find(({ id }) => id === workshopId)?.lengthMinutes ?? 60;
    const row = {
      id: newId('mtg', now),
      workshopId,
      roomId,
      day,
      starts,
      lengthMinutes: lengthMinutes ?? usual,
      sequence: 0,
      updatedAt: now,
    };
    const checked = checkPlacing(programme, row);
    if (!checked.ok) return checked;
    tx.insert(meeting)
      .values({ ...row, campId })
      .run();
    writeAudit(tx, {
      organisationId: programme.camp.organisationId,
      campId,
      actorUserId: actor.user?.id ?? null,
      action: 'meeting.place',
      subjectId: row.id,
      sentence: `Placed ${titleOf(programme, row)}: ${saySlot(programme, row)}.`,
      now,
    });
    return ok({ meetingId: row.id });
  });
}
