import { askSentence } from '../harp/ask-sentence';
import type { Harp } from '../harp/harp';
import { type HarpNeed, isAnyKey } from '../harp/harp-ask';
import { harpFromAsk } from '../harp/harp-from-ask';
import { type HarpId, harpId } from '../harp/harp-id';
import { needHarps } from '../harp/need-harps';
import { compareText } from '../shared/compare-text';
import { compareMeetings, type PackingMeeting } from './packing-meeting';

/** A need at one meeting, its alternatives as harps. */
export type MeetingNeed = {
  meeting: PackingMeeting;
  need: HarpNeed;
  /** Each harp once, in pitch order. */
  options: Harp[];
  optionIds: ReadonlySet<HarpId>;
};

/** All needs that name a harp, in order of time, then of what they say, so that the order of input never shows. */
export function listMeetingNeeds(meetings: readonly PackingMeeting[]): MeetingNeed[] {
  const text = ({ need, options }: MeetingNeed): string =>
    JSON.stringify([
      need.level === 'required' ? 0 : 1,
      options.map(harpId),
      need.anyOf.map(askSentence).sort(),
      need.note ?? '',
    ]);
  return meetings
    .flatMap((meeting) =>
      meeting.needs
        .filter((need) => !isAnyKey(need))
        .map((need): MeetingNeed => {
          const options = needHarps(need);
          return { meeting, need, options, optionIds: new Set(options.map(harpId)) };
        }),
    )
    .sort((a, b) => compareMeetings(a.meeting, b.meeting) || compareText(text(a), text(b)));
}

/** How a need came to this harp. The song is told where there is one; two ways to the same harp are both told. */
export function harpSentence({ need }: MeetingNeed, harp: Harp): string {
  const asks = need.anyOf.filter((ask) => harpId(harpFromAsk(ask)) === harpId(harp));
  const songs = asks.filter((ask) => ask.by === 'song');
  return [...new Set((songs.length > 0 ? songs : asks).map(askSentence))].sort().join('; ');
}
