import type { Db } from '@/db/client';
import { draft } from '@/db/schema/order';
import type { CompleteAnswers } from '@/lib/domain/registration/answers';
import type { CampId, TrackId, WorkshopId } from '@/lib/domain/shared/ids';
import { hashToken } from '@/lib/server/hash-token';
import { NOW } from './build-camp';

/** Every step answered by an adult who pays for themselves. */
export const answersFor = (
  trackId: TrackId,
  given: { name?: string; email?: string; electives?: WorkshopId[]; minor?: boolean } = {},
): CompleteAnswers => ({
  who: {
    attendeeName: given.name ?? 'Noor Haddad',
    attendeeEmail: given.email ?? 'noor@example.test',
    payer: 'attendee',
    payerName: '',
    payerEmail: '',
    minor: given.minor ?? false,
  },
  track: { trackId, electives: given.electives ?? [] },
  harps: { harpIds: ['C-richter-standard'] },
  needs: {
    diet: 'No peanuts',
    access: '',
    emergencyName: 'Sami Haddad',
    // From the range that the British regulator keeps free for drama: rings nowhere.
    emergencyPhone: '+442079460018',
    guardianName: given.minor ? 'Sami Haddad' : '',
    guardianEmail: given.minor ? 'sami@example.test' : '',
    guardianPhone: given.minor ? '+442079460018' : '',
    consent: given.minor ?? false,
  },
});

/** A browser's answers, found by `token`. */
export function buildDraft(
  db: Db,
  given: { token: string; campId: CampId; answers: object; now?: number },
): void {
  const now = given.now ?? NOW;
  db.insert(draft)
    .values({
      id: `dft_${hashToken(given.token)
        .toLowerCase()
        .replace(/[^0-9a-z]/g, '')
        .slice(0, 30)}`,
      tokenHash: hashToken(given.token),
      campId: given.campId,
      answers: { ...given.answers },
      createdAt: now,
      updatedAt: now,
    })
    .run();
}
