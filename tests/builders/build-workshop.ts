import type { Db } from '@/db/client';
import { harpNeed, workshop, workshopInstructor, workshopTrack } from '@/db/schema/workshop';
import type { HarpNeed } from '@/lib/domain/harp/harp-ask';
import type { CampId, InstructorId, TrackId, WorkshopId } from '@/lib/domain/shared/ids';

type Given = Partial<Omit<typeof workshop.$inferInsert, 'id'>> & {
  id: WorkshopId;
  trackIds?: TrackId[];
  instructorIds?: InstructorId[];
  needs?: HarpNeed[];
};

/** A core technique class of 75 minutes in the builder's camp, unless said otherwise. */
export function buildWorkshop(db: Db, given: Given): WorkshopId {
  const { trackIds = [], instructorIds = [], needs = [], ...row } = given;
  const campId: CampId = row.campId ?? 'cmp_1';
  db.insert(workshop)
    .values({ title: 'Single notes', kind: 'technique', audience: 'core', lengthMinutes: 75, ...row, campId })
    .run();
  for (const trackId of trackIds) db.insert(workshopTrack).values({ workshopId: row.id, trackId }).run();
  for (const instructorId of instructorIds)
    db.insert(workshopInstructor).values({ workshopId: row.id, instructorId }).run();
  needs.forEach((need, position) => {
    db.insert(harpNeed)
      .values({
        id: `need_${row.id.slice(4)}${position}`,
        workshopId: row.id,
        ...need,
        note: need.note ?? '',
        position,
      })
      .run();
  });
  return row.id;
}
