import 'server-only';
import { and, eq, ne } from 'drizzle-orm';
import { cache } from 'react';
import { camp } from '@/db/schema/camp';
import { type CampStanding, campStanding } from '@/lib/domain/camp/camp-standing';
import type { CampPlaces } from '@/lib/domain/camp/places';
import type { TrackHarps } from '@/lib/domain/packing/track-harps';
import type { Programme } from '@/lib/domain/timetable/programme';
import { getDb } from '../db';
import { countPlaces } from '../registration/count-places';
import { keepProgramme } from './keep-programme';

export type PublicCamp = {
  programme: Programme;
  harps: TrackHarps;
  places: CampPlaces;
  standing: CampStanding;
};

/** The id of a camp that anyone may see: published or closed. A draft is as absent as a slug that never was. */
export function findPublicCampId(slug: string) {
  const row = getDb()
    .select({ id: camp.id })
    .from(camp)
    .where(and(eq(camp.slug, slug), ne(camp.state, 'draft')))
    .get();
  return row?.id ?? null;
}

/** All that the public page shows, or null. Once a request: the page and its metadata both ask. */
export const getPublicCamp = cache((slug: string): PublicCamp | null => {
  const id = findPublicCampId(slug);
  const kept = id && keepProgramme(id);
  const places = id && countPlaces(id);
  if (!kept || !places) return null;
  return { ...kept, places, standing: campStanding(kept.programme.camp, places, Date.now()) };
});
