import 'server-only';
import { and, count, eq, isNotNull, ne, sql } from 'drizzle-orm';
import { camp, track } from '@/db/schema/camp';
import { order } from '@/db/schema/order';
import { meeting, workshop } from '@/db/schema/workshop';
import { checkDetails, type DetailsFacts, meetingShift } from '@/lib/domain/camp/check-details';
import { dayAfter } from '@/lib/domain/camp/day-offset';
import type { CampId } from '@/lib/domain/shared/ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { EditCampInput } from '@/lib/schemas/camp';
import type { Tx } from '../db';
import { type Refusal, refuse } from '../errors';
import type { Context } from '../ladder';
import { countPlaces } from '../registration/count-places';
import { editOwnCamp } from './edit-own-camp';
import type { CampRow } from './own-camp';
import { readPrice } from './read-price';

/** The camp's own details. A form that was opened before somebody else's edit is refused as stale, not merged. */
export function editCamp(
  input: EditCampInput,
  context: Pick<Context, 'actor' | 'now'>,
): Result<{ campId: CampId }, Refusal> {
  return editOwnCamp(input.campId, context, (tx, own) => {
    if (own.version !== input.version) return refuse('stale');
    const facts = factsOf(tx, own, input);
    const fields = checkDetails(facts);
    const price = readPrice(input.price, input.currency);
    if (!price.ok) fields.price = [price.error];
    if (!price.ok || Object.keys(fields).length > 0) return refuse('bad_input', { fields });

    const shift = meetingShift(facts);
    if (shift !== 0) moveMeetings(tx, own.id, shift, context.now);
    const { campId, version, moveMeetings: _, zoneConfirmed: __, ...details } = input;
    tx.update(camp)
      .set({ ...details, price: price.value, version: version + 1 })
      .where(eq(camp.id, campId))
      .run();
    return ok({
      value: { campId },
      action: 'camp.edit',
      subjectId: campId,
      sentence: changes(own, { ...details, price: price.value }),
    });
  });
}

function factsOf(tx: Tx, own: CampRow, after: EditCampInput): DetailsFacts {
  const inCamp = eq(track.campId, own.id);
  return {
    state: own.state,
    before: own,
    after,
    taken: countPlaces(own.id)?.camp.taken ?? 0,
    orders: tx.select({ n: count() }).from(order).where(eq(order.campId, own.id)).get()?.n ?? 0,
    meetings: tx
      .select({ title: workshop.title, day: meeting.day })
      .from(meeting)
      .innerJoin(workshop, eq(workshop.id, meeting.workshopId))
      .where(eq(meeting.campId, own.id))
      .orderBy(meeting.day, meeting.starts)
      .all(),
    pricedTracks: tx
      .select({ name: track.name })
      .from(track)
      .where(and(inCamp, isNotNull(track.price)))
      .all()
      .map(({ name }) => name),
    slugTaken:
      tx
        .select({ id: camp.id })
        .from(camp)
        .where(and(eq(camp.slug, after.slug), ne(camp.id, own.id)))
        .get() !== undefined,
  };
}

function moveMeetings(tx: Tx, campId: CampId, shift: number, now: number): void {
  for (const { id, day } of tx.select().from(meeting).where(eq(meeting.campId, campId)).all())
    tx.update(meeting)
      .set({ day: dayAfter(day, shift), sequence: sql`${meeting.sequence} + 1`, updatedAt: now })
      .where(eq(meeting.id, id))
      .run();
}

const WORDS = {
  name: 'name',
  slug: 'web name',
  startsOn: 'first day',
  endsOn: 'last day',
  timeZone: 'time zone',
  currency: 'currency',
  venueName: 'venue',
  venueAddress: 'address',
  capacity: 'places',
  price: 'price',
  refundTerms: 'refund terms',
  arrivalFrom: 'arrival',
  summary: 'summary',
  description: 'description',
} satisfies Partial<Record<keyof CampRow, string>>;

/** "Changed first day 2027-06-04 → 2027-06-11, description." Short values are told, texts only named. */
function changes(before: CampRow, after: Partial<CampRow>): string {
  const told = (Object.keys(WORDS) as (keyof typeof WORDS)[])
    .filter((key) => before[key] !== after[key])
    .map((key) => {
      const text = key === 'refundTerms' || key === 'description' || key === 'summary' || key === 'price';
      return text ? WORDS[key] : `${WORDS[key]} ${before[key] || 'empty'} → ${after[key] || 'empty'}`;
    });
  return told.length > 0 ? `Changed ${told.join(', ')}.` : 'Saved the details unchanged.';
}
