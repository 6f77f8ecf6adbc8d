import 'server-only';
import { eq } from 'drizzle-orm';
import type { z } from 'zod';
import { registrationHarp } from '@/db/schema/order';
import { ownedHarpIds } from '@/lib/domain/harp/owned-harp-ids';
import { ok, type Result } from '@/lib/domain/shared/result';
import type { ownHarpsSchema } from '@/lib/schemas/booking';
import { inTransaction } from '../db';
import { type Refusal, refuse } from '../errors';

/** Replaces the harps an attendee owns; their packing list follows at once. None is an answer too. */
export function saveOwnHarps(input: z.output<typeof ownHarpsSchema>): Result<null, Refusal> {
  if (input.intent === 'add' && input.addKey === undefined)
    return refuse('bad_input', { fields: { addKey: ['Choose the key of the harp to add.'] } });
  const { registrationId } = input;
  const harpIds = ownedHarpIds(input);
  return inTransaction((tx) => {
    tx.delete(registrationHarp).where(eq(registrationHarp.registrationId, registrationId)).run();
    if (harpIds.length > 0)
      tx.insert(registrationHarp)
        .values(harpIds.map((harpId) => ({ registrationId, harpId })))
        .run();
    return ok(null);
  });
}
