import { Temporal } from 'temporal-polyfill';
import type { Db } from '@/db/client';
import { block, camp, instructor, room, track } from '@/db/schema/camp';
import { harpNeed, meeting, workshop, workshopInstructor, workshopTrack } from '@/db/schema/workshop';
import type { CampState } from '@/lib/domain/camp/camp-words';
import type { CampId, Id, OrganisationId, TrackId, UserId, WorkshopId } from '@/lib/domain/shared/ids';
import { type Minor, minor } from '@/lib/domain/shared/money';
import { BLOCKS, INSTRUCTORS, ROOMS, TRACKS, WORKSHOPS } from './programme-plan';

export type CampPlan = {
  /** Two letters, part of every id of the camp. */
  code: string;
  organisationId: OrganisationId;
  slug: string;
  name: string;
  summary: string;
  description: string;
  startsOn: string;
  days: number;
  capacity: number;
  price: Minor;
  refundTerms: string;
  state: CampState;
  instructorUserId: UserId;
  now: number;
};

export type SeededCamp = {
  id: CampId;
  tracks: TrackId[];
  electives: { id: WorkshopId; slots: string[] }[];
};

const DAY = 24 * 3_600_000;
const at = <P extends string>(prefix: P, code: string, index: number) =>
  `${prefix}_demo${code}${index}` as const;

/** Writes one camp of the demo: everything an organiser would have typed. */
export function seedCamp(db: Db, plan: CampPlan): SeededCamp {
  const id = `cmp_demo${plan.code}` as CampId;
  const { code } = plan;
  const start = Temporal.PlainDate.from(plan.startsOn);
  const created = plan.now - 120 * DAY;
  db.insert(camp)
    .values({
      id,
      organisationId: plan.organisationId,
      slug: plan.slug,
      name: plan.name,
      summary: plan.summary,
      description: plan.description,
      startsOn: plan.startsOn,
      endsOn: start.add({ days: plan.days - 1 }).toString(),
      timeZone: 'Europe/Berlin',
      currency: 'EUR',
      venueName: 'Kettle Lake Hall',
      venueAddress: 'At the end of Lake Road, Slate Ridge',
      capacity: plan.capacity,
      price: plan.price,
      refundTerms: plan.refundTerms,
      state: plan.state,
      publishedAt: created + DAY,
      closedAt: plan.state === 'closed' ? plan.now - 300 * DAY : null,
      createdAt: created,
      updatedAt: created,
    })
    .run();
  db.insert(track)
    .values(
      TRACKS.map(({ name, level, gate, share }, index) => ({
        id: at('trk', code, index),
        campId: id,
        name,
        level,
        gate,
        capacity: Math.floor((plan.capacity * share) / TRACKS.length),
        // The top track has fewer places and one instructor more.
        price: level === 'full-range' ? minor(plan.price + 4000) : null,
        position: index,
      })),
    )
    .run();
  db.insert(room)
    .values(ROOMS.map((row, index) => ({ id: at('rom', code, index), campId: id, position: index, ...row })))
    .run();
  db.insert(instructor)
    .values(
      INSTRUCTORS.map((row, index) => ({
        id: at('ins', code, index),
        campId: id,
        position: index,
        userId: index === 0 ? plan.instructorUserId : null,
        ...row,
      })),
    )
    .run();
  db.insert(block)
    .values(BLOCKS.map((row, index) => ({ id: at('blk', code, index), campId: id, ...row })))
    .run();
  const electives = WORKSHOPS.map((_, index) => seedWorkshop(db, id, plan, index)).filter(
    (slots) => slots !== null,
  );
  return { id, tracks: TRACKS.map((_, index) => at('trk', code, index)), electives };
}

function seedWorkshop(
  db: Db,
  campId: CampId,
  plan: CampPlan,
  index: number,
): SeededCamp['electives'][number] | null {
  const row = WORKSHOPS[index];
  if (!row) throw new Error(`No workshop ${index}`);
  const { code } = plan;
  const id = at('wsh', code, index);
  const meets = row.meets.filter(([day]) => day < plan.days);
  db.insert(workshop)
    .values({
      id,
      campId,
      title: row.title,
      description: row.description,
      kind: row.kind,
      audience: row.audience,
      lengthMinutes: row.audience === 'everyone' ? 90 : 75,
      capacity: row.capacity ?? null,
    })
    .run();
  for (const of of row.tracks ?? [])
    db.insert(workshopTrack)
      .values({ workshopId: id, trackId: at('trk', code, of) })
      .run();
  for (const of of row.instructors)
    db.insert(workshopInstructor)
      .values({ workshopId: id, instructorId: at('ins', code, of) })
      .run();
  row.needs.forEach((need, position) => {
    db.insert(harpNeed)
      .values({
        id: `need_demo${code}${index}x${position}` as Id<'need'>,
        workshopId: id,
        level: need.level,
        anyOf: need.anyOf,
        note: need.note ?? '',
        position,
      })
      .run();
  });
  meets.forEach(([day, blockIndex, roomIndex], number) => {
    const block = BLOCKS[blockIndex];
    if (!block) throw new Error(`No block ${blockIndex}`);
    db.insert(meeting)
      .values({
        id: `mtg_demo${code}${index}x${number}`,
        campId,
        workshopId: id,
        roomId: at('rom', code, roomIndex),
        day: Temporal.PlainDate.from(plan.startsOn).add({ days: day }).toString(),
        starts: block.starts,
        lengthMinutes: row.audience === 'everyone' ? 90 : 75,
        updatedAt: plan.now,
      })
      .run();
  });
  return row.audience === 'elective' ? { id, slots: meets.map(([day, of]) => `${day}-${of}`) } : null;
}
