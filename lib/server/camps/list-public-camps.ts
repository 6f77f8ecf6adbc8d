import 'server-only';
import { and, asc, count, eq, inArray, ne } from 'drizzle-orm';
import { camp, track } from '@/db/schema/camp';
import { registration } from '@/db/schema/order';
import { type CampStanding, campStanding, placesLeft } from '@/lib/domain/camp/camp-standing';
import type { TrackLevel } from '@/lib/domain/camp/camp-words';
import { priceFrom } from '@/lib/domain/camp/price-from';
import { SEATED_STATES } from '@/lib/domain/registration/states';
import type { Minor } from '@/lib/domain/shared/money';
import { getDb } from '../db';

export type CampInList = {
  slug: string;
  name: string;
  summary: string;
  startsOn: string;
  endsOn: string;
  timeZone: string;
  venueName: string;
  currency: string;
  price: { price: Minor; varies: boolean } | null;
  tracks: { name: string; level: TrackLevel }[];
  places: { left: number; capacity: number };
  standing: CampStanding;
};

/** Camps that anyone may see, in three statements whatever their number: next ones first, past ones latest first. */
export function listPublicCamps(now: number): { coming: CampInList[]; past: CampInList[] } {
  const db = getDb();
  const shown = ne(camp.state, 'draft');
  const rows = db.select().from(camp).where(shown).orderBy(asc(camp.startsOn), asc(camp.name)).all();
  const tracks = db
    .select({ track })
    .from(track)
    .innerJoin(camp, eq(camp.id, track.campId))
    .where(shown)
    .orderBy(asc(track.position), asc(track.id))
    .all();
  const taken = new Map(
    db
      .select({ trackId: registration.trackId, seated: count() })
      .from(registration)
      .innerJoin(camp, eq(camp.id, registration.campId))
      .where(and(shown, inArray(registration.state, [...SEATED_STATES])))
      .groupBy(registration.trackId)
      .all()
      .map((row) => [row.trackId, row.seated]),
  );
  const listed = rows.map((row): CampInList => {
    const own = tracks.filter((each) => each.track.campId === row.id).map((each) => each.track);
    const seated = own.reduce((sum, { id }) => sum + (taken.get(id) ?? 0), 0);
    const places = {
      camp: { left: Math.max(0, row.capacity - seated) },
      tracks: own.map(({ id, capacity }) => ({
        places: { left: Math.max(0, capacity - (taken.get(id) ?? 0)) },
      })),
    };
    return {
      slug: row.slug,
      name: row.name,
      summary: row.summary,
      startsOn: row.startsOn,
      endsOn: row.endsOn,
      timeZone: row.timeZone,
      venueName: row.venueName,
      currency: row.currency,
      price: priceFrom(row, own),
      tracks: own.map(({ name, level }) => ({ name, level })),
      places: { left: placesLeft(places), capacity: row.capacity },
      standing: campStanding(row, places, now),
    };
  });
  return {
    coming: listed.filter(({ standing }) => standing !== 'past'),
    past: listed.filter(({ standing }) => standing === 'past').reverse(),
  };
}
