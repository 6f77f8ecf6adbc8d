import 'server-only';
import { eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import type { CampId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

/** What a page's head needs of a camp; null when there is none. Permission is the caller's to check. */
export function getCampHead(campId: CampId) {
  const row = getDb()
    .select({
      id: camp.id,
      organisationId: camp.organisationId,
      slug: camp.slug,
      name: camp.name,
      startsOn: camp.startsOn,
      endsOn: camp.endsOn,
      timeZone: camp.timeZone,
      currency: camp.currency,
      state: camp.state,
    })
    .from(camp)
    .where(eq(camp.id, campId))
    .get();
  return row ?? null;
}
