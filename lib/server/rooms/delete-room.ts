import 'server-only';
import { and, count, eq } from 'drizzle-orm';
import { room } from '@/db/schema/camp';
import { meeting } from '@/db/schema/workshop';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { RoomRowInput } from '@/lib/schemas/room';
import { editOwnCamp } from '../camps/edit-own-camp';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';

/** Takes a room out; refused in words while something meets there. */
export function deleteRoom(
  { campId, roomId }: RoomRowInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ deleted: string }, Refusal> {
  return editOwnCamp(campId, context, (tx) => {
    const own = and(eq(room.id, roomId), eq(room.campId, campId));
    const row = tx.select().from(room).where(own).get();
    if (!row) return refuse('not_found');
    const meetings = tx.select({ n: count() }).from(meeting).where(eq(meeting.roomId, roomId)).get()?.n ?? 0;
    if (meetings > 0)
      return refuse('in_use', {
        sentence: `${row.name} stays: ${meetings} ${meetings === 1 ? 'meeting is' : 'meetings are'} placed there. Move ${meetings === 1 ? 'it' : 'them'} to another room in the timetable first.`,
      });
    tx.delete(room).where(own).run();
    return ok({
      value: { deleted: roomId },
      action: 'room.delete',
      subjectId: roomId,
      sentence: `Deleted the room ${row.name}.`,
    });
  });
}
