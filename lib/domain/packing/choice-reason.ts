import type { Harp } from '../harp/harp';
import { harpId } from '../harp/harp-id';
import { harpLabel } from '../harp/harp-label';
import { listWords } from '../shared/list-words';
import { sayShortDay } from '../shared/say-date';
import type { MeetingNeed } from './meeting-need';
import type { HarpSource } from './packing-list';

/** "Tue 14 July 10:00 and Thu 16 July 14:00"; each meeting once, the fourth and later ones counted. */
const times = (needs: readonly MeetingNeed[]): string =>
  listWords(
    [...new Set(needs.map(({ meeting }) => `${sayShortDay(meeting.day)} ${meeting.starts}`))],
    'and',
    3,
  );

/**
 * One sentence on why this harp, for needs that it serves on the list; null where none of them named another harp.
 * Says the strongest reason that holds: needed anyway, already there, one for several, or no reason but a fixed rule.
 */
export function choiceReason(harp: Harp, source: HarpSource, served: readonly MeetingNeed[]): string | null {
  const label = harpLabel(harp);
  const open = served.filter(({ options }) => options.length > 1);
  if (open.length === 0) return null;
  const fixed = served.filter(({ options }) => options.length === 1);
  const others = [
    ...new Set(open.flatMap(({ options }) => options.filter((option) => harpId(option) !== harpId(harp)))),
  ];
  const instead = listWords([...new Set(others.map(harpLabel))], 'or', 4);
  if (fixed.length > 0)
    return `${label} is needed anyway on ${times(fixed)}, so it also serves ${times(open)}, where ${instead} would do.`;
  if (source === 'owned')
    return `You own ${label}, so it serves ${times(open)}, where ${instead} would do too.`;
  if (source === 'loaner')
    return `A loaner in ${label} is kept for you, so it serves ${times(open)}, where ${instead} would do too.`;
  const meetings = new Set(open.map(({ meeting }) => meeting.id));
  if (meetings.size > 1) return `Take ${label}: one harp serves ${times(open)}.`;
  return `${label} or ${instead} will do on ${times(open)}: bring one of them.`;
}
