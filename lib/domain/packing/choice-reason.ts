import { type Harp, sameHarp } from '../harp/harp';
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
  const others = [
    ...new Map(open.flatMap(({ options }) => options).map((option) => [harpId(option), option])).values(),
  ].filter((option) => !sameHarp(option, harp));
  const instead = listWords(others.map(harpLabel), 'or', 4);
  const serves = `it serves ${times(open)}, where ${instead} would do too`;
  if (open.length < served.length) return `${label} is needed anyway, so ${serves}.`;
  if (source === 'owned') return `You own ${label}, so ${serves}.`;
  if (source === 'loaner') return `A loaner in ${label} is kept for you, so ${serves}.`;
  const equals = others.filter((option) => open.every(({ optionIds }) => optionIds.has(harpId(option))));
  if (equals.length === 0) return `Take ${label}: one harp serves ${times(open)}.`;
  return `${label} or ${listWords(equals.map(harpLabel), 'or', 4)} will do: bring one of them.`;
}
