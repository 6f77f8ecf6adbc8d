import type { Harp } from '../harp/harp';
import { harpId } from '../harp/harp-id';
import { harpLabel } from '../harp/harp-label';
import { harpSentence, type MeetingNeed } from './meeting-need';
import type { PackingUse } from './packing-list';

/** The same thing said twice for one meeting is one use, and a required one if either was. */
export function packingUses(harp: Harp, served: readonly MeetingNeed[]): PackingUse[] {
  const found = new Map<string, PackingUse>();
  for (const each of served) {
    const { id: meetingId, workshop, day, starts, ends, room } = each.meeting;
    const sentence = harpSentence(each, harp);
    const note = each.need.note ?? '';
    const key = `${meetingId} ${sentence} ${note}`;
    const others = each.options.filter((option) => harpId(option) !== harpId(harp)).map(harpLabel);
    // Required needs come first within a meeting.
    if (!found.has(key))
      found.set(key, {
        meetingId,
        workshop,
        day,
        starts,
        ends,
        room,
        level: each.need.level,
        sentence,
        others,
        note,
      });
  }
  return [...found.values()];
}
