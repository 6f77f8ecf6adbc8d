import { askSentence } from '../harp/ask-sentence';
import { type HarpNeed, isAnyKey } from '../harp/harp-ask';
import { harpFromAsk } from '../harp/harp-from-ask';
import { type HarpId, harpId } from '../harp/harp-id';
import type { MeetingId } from '../shared/ids';
import type { WorkshopKind } from '../timetable/workshop-words';

/** A meeting as its instructor needs it. No contact and no health of anyone. */
export type TaughtMeeting = {
  id: MeetingId;
  title: string;
  kind: WorkshopKind;
  day: string;
  starts: string;
  lengthMinutes: number;
  room: string;
  kit: string;
  /** Whom it is for, in words: track names, "Elective", "For everyone". */
  whose: string;
  with: string[];
  needs: HarpNeed[];
  /** How many come. */
  count: number;
  /** By name; left out where everyone comes, since the whole camp is no roster. */
  players: RosterPlayer[];
};

export type RosterPlayer = {
  id: string;
  name: string;
  track: string;
  /** For each need that names a harp, in order: does the player own one that will do? */
  has: boolean[];
};

/** The needs of a workshop that name harps, each with the harps that will do. */
export const namedNeeds = (
  needs: readonly HarpNeed[],
): { words: string; required: boolean; any: ReadonlySet<HarpId> }[] =>
  needs
    .filter((need) => !isAnyKey(need))
    .map((need) => ({
      words: need.anyOf.map(askSentence).join(' or '),
      required: need.level === 'required',
      any: new Set(need.anyOf.map((ask) => harpId(harpFromAsk(ask)))),
    }));

/** Which of the named needs the owned harps meet. An id that names no harp meets none. */
export const meets = (
  named: readonly { any: ReadonlySet<HarpId> }[],
  owned: ReadonlySet<string>,
): boolean[] => named.map(({ any }) => [...any].some((id) => owned.has(id)));
