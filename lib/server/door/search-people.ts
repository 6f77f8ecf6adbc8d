import 'server-only';
import { and, asc, eq, like } from 'drizzle-orm';
import { track } from '@/db/schema/camp';
import { registration } from '@/db/schema/order';
import type { ArrivalState } from '@/lib/domain/door/arrival-states';
import type { RegistrationState } from '@/lib/domain/registration/states';
import { foldSearch } from '@/lib/domain/shared/fold-search';
import type { CampId, RegistrationId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

const MOST = 20;

export type DoorHit = {
  registrationId: RegistrationId;
  name: string;
  track: string;
  state: RegistrationState;
  arrival: ArrivalState;
};

/** At most twenty people of the camp whose name holds the letters, accents and case aside; confirmed ones first by name. */
export function searchPeople(campId: CampId, letters: string): DoorHit[] {
  const folded = foldSearch(letters).replace(/[\\%_]/g, '');
  if (folded === '') return [];
  const hits = getDb()
    .select({
      registrationId: registration.id,
      name: registration.attendeeName,
      track: track.name,
      state: registration.state,
      arrival: registration.arrival,
    })
    .from(registration)
    .innerJoin(track, eq(track.id, registration.trackId))
    .where(and(eq(registration.campId, campId), like(registration.attendeeSearch, `%${folded}%`)))
    .orderBy(asc(registration.attendeeSearch), asc(registration.id))
    .all();
  const rank = (hit: DoorHit) => (hit.state === 'confirmed' ? 0 : 1);
  return hits.sort((a, b) => rank(a) - rank(b)).slice(0, MOST);
}
