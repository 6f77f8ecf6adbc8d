import 'server-only';
import { audit } from '@/db/schema/audit';
import type { CampId, OrganisationId, UserId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';
import { newId } from '../new-id';

/** Notes who did what, in the same transaction. `sentence` is for organisers: no health data, no secrets. */
export function writeAudit(
  tx: Tx,
  entry: {
    organisationId: OrganisationId | null;
    campId?: CampId;
    actorUserId: UserId | null;
    /** noun.verb, such as camp.publish. */
    action: string;
    subjectId: string;
    sentence: string;
    now: number;
  },
): void {
  const { now, campId = null, ...rest } = entry;
  tx.insert(audit)
    .values({ id: newId('aud', now), campId, at: now, ...rest })
    .run();
}
