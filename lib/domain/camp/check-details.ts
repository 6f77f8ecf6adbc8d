import { listWords } from '../shared/list-words';
import type { CampState } from './camp-words';
import { dayAfter, dayOffset } from './day-offset';

type Details = {
  slug: string;
  startsOn: string;
  endsOn: string;
  timeZone: string;
  currency: string;
  capacity: number;
};

export type DetailsFacts = {
  state: CampState;
  before: Details;
  after: Details & { moveMeetings: boolean; zoneConfirmed: boolean };
  /** Places taken or held. */
  taken: number;
  orders: number;
  meetings: readonly { title: string; day: string }[];
  /** Tracks with a price of their own. */
  pricedTracks: readonly string[];
  slugTaken: boolean;
};

/** Days by which the meetings go along; 0 where they stay. */
export const meetingShift = ({ before, after }: Pick<DetailsFacts, 'before' | 'after'>): number =>
  after.moveMeetings ? dayOffset(before.startsOn, after.startsOn) : 0;

/** What about new details cannot be, by field; empty when all can. */
export function checkDetails(facts: DetailsFacts): Record<string, string[]> {
  const { before, after } = facts;
  const said: Record<string, string[]> = {};
  if (facts.slugTaken) said.slug = [`Web name: “${after.slug}” belongs to another camp. Choose another.`];
  else if (after.slug !== before.slug && facts.state !== 'draft')
    said.slug = [
      `Web name is fixed once a camp was on sale: people have the link. It stays “${before.slug}”.`,
    ];
  if (after.capacity < facts.taken)
    said.capacity = [
      `Places in all: ${after.capacity} is less than the ${facts.taken} that are taken or held. Give ${facts.taken} or more.`,
    ];
  if (after.currency !== before.currency) {
    if (facts.orders > 0)
      said.currency = [`Currency is fixed once somebody ordered. It stays ${before.currency}.`];
    else if (facts.pricedTracks.length > 0)
      said.currency = [
        `${listWords(facts.pricedTracks, 'and', 3)} have prices of their own in ${before.currency}. Empty those first.`,
      ];
  }
  if (after.timeZone !== before.timeZone && facts.meetings.length > 0 && !after.zoneConfirmed)
    said.zoneConfirmed = [
      `${facts.meetings.length} meetings are placed. They keep their clock times, now in ${after.timeZone}. Tick this to say that is right.`,
    ];
  const outside = outsideMeetings(facts);
  if (outside) said[outside.field] = [outside.sentence];
  return said;
}

function outsideMeetings(facts: DetailsFacts): { field: string; sentence: string } | null {
  const { startsOn, endsOn } = facts.after;
  const shift = meetingShift(facts);
  const placed = facts.meetings.map(({ title, day }) => ({ title, day: shift ? dayAfter(day, shift) : day }));
  const lost = placed.filter(({ day }) => day < startsOn || day > endsOn);
  const [first] = lost;
  if (!first) return null;
  const rest = lost.length > 1 ? ` and ${lost.length - 1} more` : '';
  return {
    field: first.day < startsOn ? 'startsOn' : 'endsOn',
    sentence: `“${first.title}” on ${first.day}${rest} would fall outside these days. Move those meetings first, or let all meetings go along.`,
  };
}
