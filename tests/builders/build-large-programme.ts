import type { Db } from '@/db/client';
import { meeting } from '@/db/schema/workshop';
import type { CampId, RoomId, TrackId, WorkshopId } from '@/lib/domain/shared/ids';
import { clockAfter } from '@/lib/domain/shared/local-time';
import { NOW } from './build-camp';
import { buildWorkshop } from './build-workshop';

const KEYS = ['C', 'A', 'D', 'G', 'F', 'Bb', 'E'] as const;

/** `count` workshops with a harp each, every fourth an elective, and a meeting each, spread over five days, none at the time of another (up to 200). */
export function buildLargeProgramme(
  db: Db,
  count: number,
  of: { campId: CampId; trackIds: TrackId[]; roomId: RoomId },
): WorkshopId[] {
  const tail = of.campId.slice(4);
  return db.transaction(() =>
    Array.from({ length: count }, (_, at): WorkshopId => {
      const labelKey = KEYS[at % KEYS.length] ?? 'C';
      const elective = at % 4 === 3;
      const id = buildWorkshop(db, {
        id: `wsh_${tail}n${at}`,
        campId: of.campId,
        title: `Workshop ${String(at).padStart(3, '0')}`,
        audience: elective ? 'elective' : 'core',
        capacity: elective ? 20_000 : null,
        trackIds: elective ? [] : [of.trackIds[at % of.trackIds.length] ?? 'trk_none'],
        needs: [
          { level: 'required', anyOf: [{ by: 'harp', labelKey, tuning: 'richter', register: 'standard' }] },
        ],
      });
      db.insert(meeting)
        .values({
          id: `mtg_${tail}n${at}`,
          campId: of.campId,
          workshopId: id,
          roomId: of.roomId,
          day: `2026-06-${String(8 + (at % 5)).padStart(2, '0')}`,
          starts: clockAfter('08:00', Math.floor(at / 5) * 20),
          lengthMinutes: 20,
          updatedAt: NOW,
        })
        .run();
      return id;
    }),
  );
}
