import 'server-only';
import { asc, eq } from 'drizzle-orm';
import { block, camp, campPicture, instructor, room, track } from '@/db/schema/camp';
import { harpNeed, meeting, workshop, workshopInstructor, workshopTrack } from '@/db/schema/workshop';
import { dayAfter, dayOffset } from '@/lib/domain/camp/day-offset';
import type { CampId, Id, IdPrefix } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { CopyCampInput } from '@/lib/schemas/camp';
import { writeAudit } from '../audit/write-audit';
import { inTransaction, type Tx } from '../db';
import { type Refusal, refuse } from '../errors';
import { listLinkable } from '../instructors/list-linkable';
import type { Context } from '../ladder';
import { newId } from '../new-id';
import { listPictures } from '../pictures/list-pictures';
import { copyPictureFile, removePictureFile } from '../pictures/picture-file';
import { freeSlug } from './free-slug';
import { type CampRow, ownCamp } from './own-camp';

type Pictures = { from: typeof campPicture.$inferSelect; id: Id<'pic'> }[];

/**
 * A new draft with everything of a camp but its people: tracks, rooms, instructors, workshops with their harps, times
 * of day, meetings shifted by as many days as the first day, and pictures if asked.
 */
export async function copyCamp(
  input: CopyCampInput,
  context: Pick<Context, 'actor' | 'now'>,
): Promise<Result<{ campId: CampId }, Refusal>> {
  const { actor, now } = context;
  if (!ownCamp(actor, input.campId, 'camp.edit')) return refuse('not_found');
  const pictures: Pictures = (input.withPictures ? listPictures(input.campId) : []).map((from) => ({
    from,
    id: newId('pic', now),
  }));
  let kept = false;
  try {
    // Files first, outside the transaction: a row must never point to a file that is not there.
    for (const { from, id } of pictures) await copyPictureFile(from.id, id);
    const copied = inTransaction((tx) => copyRows(tx, input, pictures, context));
    kept = copied.ok;
    return copied;
  } finally {
    if (!kept) for (const { id } of pictures) await removePictureFile(id);
  }
}

function copyRows(
  tx: Tx,
  input: CopyCampInput,
  pictures: Pictures,
  { actor, now }: Pick<Context, 'actor' | 'now'>,
): Result<{ campId: CampId }, Refusal> {
  const old = ownCamp(actor, input.campId, 'camp.edit', tx);
  if (!old) return refuse('not_found');
  const id = newId('cmp', now);
  tx.insert(camp)
    .values({
      ...old,
      id,
      slug: freeSlug(tx, input.name, input.startsOn, id),
      name: input.name,
      startsOn: input.startsOn,
      endsOn: dayAfter(input.startsOn, dayOffset(old.startsOn, old.endsOn)),
      state: 'draft',
      publishedAt: null,
      closedAt: null,
      copiedFrom: old.id,
      version: 1,
      createdAt: now,
      updatedAt: now,
    })
    .run();
  copyParts(tx, old, id, dayOffset(old.startsOn, input.startsOn), now);
  for (const { from, id: pictureId } of pictures)
    tx.insert(campPicture)
      .values({ ...from, id: pictureId, campId: id, createdAt: now })
      .run();
  writeAudit(tx, {
    organisationId: old.organisationId,
    campId: id,
    actorUserId: actor.user?.id ?? null,
    action: 'camp.copy',
    subjectId: id,
    sentence: `Copied from ${old.name} of ${old.startsOn}.`,
    now,
  });
  return ok({ campId: id });
}

/** New ids for old ones, and a way to ask for them. */
function renumber<P extends IdPrefix>(prefix: P, rows: readonly { id: Id<P> }[], now: number) {
  const ids = new Map(rows.map(({ id }) => [id, newId(prefix, now)]));
  return (old: Id<P>): Id<P> => {
    const id = ids.get(old);
    if (!id) throw new Error(`Not a row of the copied camp: ${old}`);
    return id;
  };
}

function copyParts(tx: Tx, old: CampRow, campId: CampId, shift: number, now: number): void {
  const tracks = tx.select().from(track).where(eq(track.campId, old.id)).all();
  const rooms = tx.select().from(room).where(eq(room.campId, old.id)).all();
  const instructors = tx.select().from(instructor).where(eq(instructor.campId, old.id)).all();
  const workshops = tx
    .select()
    .from(workshop)
    .where(eq(workshop.campId, old.id))
    .orderBy(asc(workshop.id))
    .all();
  const trackId = renumber('trk', tracks, now);
  const roomId = renumber('rom', rooms, now);
  const instructorId = renumber('ins', instructors, now);
  const workshopId = renumber('wsh', workshops, now);
  for (const row of tracks)
    tx.insert(track)
      .values({ ...row, id: trackId(row.id), campId })
      .run();
  for (const row of rooms)
    tx.insert(room)
      .values({ ...row, id: roomId(row.id), campId })
      .run();
  const linkable = listLinkable(old.organisationId, tx).map((user) => user.id);
  for (const row of instructors) {
    // The role may have ended since: then the link to the account does, too.
    const userId = row.userId && linkable.includes(row.userId) ? row.userId : null;
    tx.insert(instructor)
      .values({ ...row, id: instructorId(row.id), campId, userId })
      .run();
  }
  for (const row of tx.select().from(block).where(eq(block.campId, old.id)).all())
    tx.insert(block)
      .values({ ...row, id: newId('blk', now), campId })
      .run();
  for (const row of workshops) {
    const own = { workshopId: workshopId(row.id) };
    tx.insert(workshop)
      .values({ ...row, id: own.workshopId, campId })
      .run();
    for (const of of tx.select().from(workshopTrack).where(eq(workshopTrack.workshopId, row.id)).all())
      tx.insert(workshopTrack)
        .values({ ...own, trackId: trackId(of.trackId) })
        .run();
    for (const of of tx
      .select()
      .from(workshopInstructor)
      .where(eq(workshopInstructor.workshopId, row.id))
      .all())
      tx.insert(workshopInstructor)
        .values({ ...own, instructorId: instructorId(of.instructorId) })
        .run();
    for (const need of tx.select().from(harpNeed).where(eq(harpNeed.workshopId, row.id)).all())
      tx.insert(harpNeed)
        .values({ ...need, ...own, id: newId('need', now) })
        .run();
  }
  for (const row of tx.select().from(meeting).where(eq(meeting.campId, old.id)).all())
    tx.insert(meeting)
      .values({
        ...row,
        id: newId('mtg', now),
        campId,
        workshopId: workshopId(row.workshopId),
        roomId: roomId(row.roomId),
        day: dayAfter(row.day, shift),
        sequence: 0,
        updatedAt: now,
      })
      .run();
}
