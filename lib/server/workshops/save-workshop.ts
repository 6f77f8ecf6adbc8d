import 'server-only';
import { and, count, eq } from 'drizzle-orm';
import { harpNeed, workshop, workshopInstructor, workshopTrack } from '@/db/schema/workshop';
import { CAMP_LIMITS } from '@/lib/domain/camp/camp-limits';
import type { CampId, WorkshopId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { Programme } from '@/lib/domain/timetable/programme';
import type { WorkshopInput } from '@/lib/schemas/workshop';
import { editOwnCamp } from '../camps/edit-own-camp';
import { loadProgramme } from '../camps/load-programme';
import { newClashes } from '../camps/new-clashes';
import { countOwn } from '../camps/own-rows';
import { rowMark } from '../camps/row-mark';
import type { Tx } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { newId } from '../new-id';
import { countChosen } from './count-chosen';

/** `keptLength`: meetings in the timetable that go on with a length of their own. */
export type SavedWorkshop = { workshopId: WorkshopId; keptLength: number };

/** Adds a workshop with its tracks, instructors and harps, or changes one as a whole. */
export function saveWorkshop(
  input: WorkshopInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<SavedWorkshop, Refusal> {
  const { campId, workshopId, seen, title } = input;
  return editOwnCamp(campId, context, (tx) => {
    const before = loadProgramme(campId);
    const row = before?.workshops.find(({ id }) => id === workshopId);
    if (!before || (workshopId && !row)) return refuse('not_found');
    if (row && seen && seen !== rowMark(row)) return refuse('stale');
    const refusal = refusalOf(tx, input);
    if (refusal) return { ok: false, error: refusal };
    const id = write(tx, input, context.now);
    const after = loadProgramme(campId) ?? before;
    const clashes = newClashes(before, after);
    if (clashes.length > 0)
      return refuse('bad_input', {
        sentence: `Its meetings would clash. ${clashes.slice(0, 3).join(' ')} Move a meeting in the timetable first, or leave this as it was.`,
      });
    return ok({
      value: { workshopId: id, keptLength: keptLength(after, id, input.lengthMinutes) },
      action: workshopId ? 'workshop.edit' : 'workshop.add',
      subjectId: id,
      sentence: workshopId ? `Changed the workshop ${title}.` : `Added the workshop ${title}.`,
    });
  });
}

const keptLength = ({ meetings }: Pick<Programme, 'meetings'>, id: WorkshopId, minutes: number): number =>
  meetings.filter(({ workshopId, lengthMinutes }) => workshopId === id && lengthMinutes !== minutes).length;

function refusalOf(tx: Tx, input: WorkshopInput): Refusal | null {
  const { campId, workshopId, audience, capacity } = input;
  const foreign = { code: 'bad_input' as const };
  if (countOwn(tx, 'tracks', campId, input.trackIds) !== new Set(input.trackIds).size)
    return { ...foreign, fields: { trackIds: ['A track is not one of this camp any more. Tick again.'] } };
  if (countOwn(tx, 'instructors', campId, input.instructorIds) !== new Set(input.instructorIds).size)
    return {
      ...foreign,
      fields: { instructorIds: ['An instructor is not one of this camp any more. Tick again.'] },
    };
  const all = tx.select({ n: count() }).from(workshop).where(eq(workshop.campId, campId)).get()?.n ?? 0;
  if (!workshopId && all >= CAMP_LIMITS.workshops)
    return { ...foreign, sentence: `A camp has at most ${CAMP_LIMITS.workshops} workshops.` };
  const chosen = workshopId ? countChosen(tx, workshopId) : 0;
  if (chosen > 0 && audience !== 'elective')
    return {
      ...foreign,
      fields: {
        audience: [
          `It stays an elective: ${chosen} ${chosen === 1 ? 'player has' : 'players have'} chosen it.`,
        ],
      },
    };
  if (capacity !== null && capacity < chosen)
    return {
      ...foreign,
      fields: {
        capacity: [
          `People at most: ${capacity} is less than the ${chosen} who have chosen it. Give ${chosen} or more.`,
        ],
      },
    };
  return null;
}

function write(tx: Tx, input: WorkshopInput, now: number): WorkshopId {
  const { campId, workshopId, seen: _, trackIds, instructorIds, needs, ...row } = input;
  const id = workshopId ?? newId('wsh', now);
  if (workshopId)
    tx.update(workshop)
      .set(row)
      .where(and(eq(workshop.id, id), eq(workshop.campId, campId)))
      .run();
  else
    tx.insert(workshop)
      .values({ id, campId, ...row })
      .run();
  replaceParts(
    tx,
    id,
    { campId, trackIds: row.audience === 'core' ? trackIds : [], instructorIds, needs },
    now,
  );
  return id;
}

/** Tracks, instructors and needs have no life of their own: the form holds them all, so they are written anew. */
function replaceParts(
  tx: Tx,
  workshopId: WorkshopId,
  parts: Pick<WorkshopInput, 'trackIds' | 'instructorIds' | 'needs'> & { campId: CampId },
  now: number,
): void {
  tx.delete(workshopTrack).where(eq(workshopTrack.workshopId, workshopId)).run();
  tx.delete(workshopInstructor).where(eq(workshopInstructor.workshopId, workshopId)).run();
  tx.delete(harpNeed).where(eq(harpNeed.workshopId, workshopId)).run();
  for (const trackId of new Set(parts.trackIds))
    tx.insert(workshopTrack).values({ workshopId, trackId }).run();
  for (const instructorId of new Set(parts.instructorIds))
    tx.insert(workshopInstructor).values({ workshopId, instructorId }).run();
  for (const [position, { level, anyOf, note }] of parts.needs.entries())
    tx.insert(harpNeed)
      .values({ id: newId('need', now), workshopId, level, anyOf, note: note ?? '', position })
      .run();
}
