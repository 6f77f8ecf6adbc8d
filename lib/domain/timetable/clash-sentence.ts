import { Temporal } from 'temporal-polyfill';
import type { MeetingId } from '../shared/ids';
import { clockAfter } from '../shared/local-time';
import type { Clash } from './clash';
import { SOUND_WORDS } from './kind-loudness';
import type { Programme } from './programme';

type Names = Pick<Programme, 'camp' | 'rooms' | 'tracks' | 'instructors' | 'workshops' | 'meetings'>;

/**
 * A clash in words, told from the side of `about` (the meeting that a person is placing): "Hall is taken Tuesday
 * 10:00–11:15 by Jam basics." Without `about` the earlier meeting of a pair is the one told of.
 */
export function clashSentence(clash: Clash, names: Names, about?: MeetingId): string {
  const title = (id: MeetingId) => titleOf(names, id);
  const self = about ?? clash.meetingId;
  const otherId = 'otherId' in clash ? (clash.otherId === self ? clash.meetingId : clash.otherId) : self;
  const other = `${whenOf(names, otherId)} by ${title(otherId)}`;
  switch (clash.kind) {
    case 'room': {
      const room = nameOf(names.rooms, clash.roomId);
      return clash.gapMinutes === null
        ? `${room} is taken ${other}.`
        : `${room} is taken ${other}: ${gap(clash.gapMinutes)} to change over.`;
    }
    case 'instructor': {
      const who = nameOf(names.instructors, clash.instructorId);
      return clash.gapMinutes === null
        ? `${who} teaches ${title(otherId)} ${whenOf(names, otherId)}.`
        : `${who} teaches ${title(otherId)} ${whenOf(names, otherId)}: ${gap(clash.gapMinutes)} to change over.`;
    }
    case 'track':
      return `${nameOf(names.tracks, clash.trackId)} has ${title(otherId)} ${whenOf(names, otherId)}.`;
    case 'everyone':
      return `${title(otherId)} is ${whenOf(names, otherId)}, and one of the two is for everyone.`;
    case 'same-workshop':
      return `${title(otherId)} meets already ${whenOf(names, otherId)}.`;
    case 'outside-days':
      return `${title(self)} is ${whenOf(names, self)}, outside the camp’s days.`;
    case 'seats':
      return `${nameOf(names.rooms, clash.roomId)} seats ${clash.seats}; ${clash.people} may come to ${title(self)}.`;
    case 'loudness':
      return `${title(self)} is ${SOUND_WORDS[clash.needs].toLowerCase()}, louder than ${nameOf(names.rooms, clash.roomId)} can take.`;
  }
}

const gap = (minutes: number): string =>
  minutes === 0 ? 'no time' : `only ${minutes} ${minutes === 1 ? 'minute' : 'minutes'}`;

const nameOf = (rows: readonly { id: string; name: string }[], id: string): string =>
  rows.find((row) => row.id === id)?.name ?? id;

function titleOf(names: Names, id: MeetingId): string {
  const meeting = names.meetings.find((row) => row.id === id);
  return names.workshops.find((row) => row.id === meeting?.workshopId)?.title ?? id;
}

/** "Tuesday 10:00–11:15"; with the date where the camp has that weekday twice. */
function whenOf(names: Names, id: MeetingId): string {
  const meeting = names.meetings.find((row) => row.id === id);
  if (!meeting) return '';
  const { startsOn, endsOn } = names.camp;
  const day = Temporal.PlainDate.from(meeting.day);
  const once =
    meeting.day >= startsOn &&
    meeting.day <= endsOn &&
    day.since(startsOn).days < 7 &&
    Temporal.PlainDate.from(endsOn).since(startsOn).days < 7;
  const said = once
    ? day.toLocaleString('en-GB', { weekday: 'long' })
    : day.toLocaleString('en-GB', { weekday: 'long', day: 'numeric', month: 'long' }).replace(',', '');
  return `${said} ${meeting.starts}–${clockAfter(meeting.starts, meeting.lengthMinutes)}`;
}
