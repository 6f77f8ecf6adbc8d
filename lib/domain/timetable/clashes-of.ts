import { Temporal } from 'temporal-polyfill';
import type { Clash } from './clash';
import { touches } from './clash';
import { type ClashInput, findClashes } from './find-clashes';

/** The clashes that one meeting, new or moved, would have with all the others. It replaces a meeting of the same id. */
export function clashesOf(
  candidate: ClashInput['meetings'][number],
  input: ClashInput,
  changeover: number,
): Clash[] {
  const day = Temporal.PlainDate.from(candidate.day);
  // No meeting is longer than a day, so only the days beside it can reach it.
  const before = day.subtract({ days: 2 }).toString();
  const after = day.add({ days: 2 }).toString();
  const near = input.meetings.filter(
    (meeting) => meeting.id !== candidate.id && meeting.day >= before && meeting.day <= after,
  );
  return findClashes({ ...input, meetings: [...near, candidate] }, changeover).filter((clash) =>
    touches(clash, candidate.id),
  );
}
