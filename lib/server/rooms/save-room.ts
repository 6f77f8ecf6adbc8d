import 'server-only';
import { and, eq } from 'drizzle-orm';
import { room } from '@/db/schema/camp';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import type { RoomId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { RoomInput } from '@/lib/schemas/room';
import { editOwnCamp } from '../camps/edit-own-camp';
import { endOf } from '../camps/own-rows';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';

/** Adds a room at the end of the list, or changes one. Too few seats for what meets there shows as a clash, not here. */
export function saveRoom(
  { campId, roomId, ...row }: RoomInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ roomId: RoomId }, Refusal> {
  return editOwnCamp(campId, context, (tx) => {
    if (!roomId) {
      const end = endOf(tx, 'rooms', campId);
      if (end.rows >= CAMP_LIMITS.rooms)
        return refuse('bad_input', { sentence: `A camp has at most ${CAMP_LIMITS.rooms} rooms.` });
      const id = newId('rom', context.now);
      tx.insert(room)
        .values({ id, campId, position: end.position, ...row })
        .run();
      return ok({
        value: { roomId: id },
        action: 'room.add',
        subjectId: id,
        sentence: `Added the room ${row.name}.`,
      });
    }
    const done = tx
      .update(room)
      .set(row)
      .where(and(eq(room.id, roomId), eq(room.campId, campId)))
      .run();
    if (done.changes === 0) return refuse('not_found');
    return ok({
      value: { roomId },
      action: 'room.edit',
      subjectId: roomId,
      sentence: `Changed the room ${row.name}.`,
    });
  });
}
