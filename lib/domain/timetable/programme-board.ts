import { compareText } from '../shared/compare-text';
import type { MeetingId, WorkshopId } from '../shared/ids';
import { clockAfter, daysBetween } from '../shared/local-time';
import type { Programme, ProgrammeMeeting, ProgrammeWorkshop } from './programme';

export type BoardMeeting = {
  id: MeetingId;
  workshopId: WorkshopId;
  title: string;
  /** HH:MM; before the start when it runs past midnight. */
  ends: string;
  room: string;
  /** The tracks it comes with, or who else it is for. */
  who: string;
};
/** `ends` where all of them end together, else null. */
export type BoardSlot = { starts: string; ends: string | null; meetings: BoardMeeting[] };
export type BoardDay = { day: string; slots: BoardSlot[] };
/** Days side by side, with every time at which something starts on one of them. */
export type Board = { times: string[]; days: BoardDay[] };

type Timetable = Pick<Programme, 'camp' | 'tracks' | 'rooms' | 'workshops' | 'meetings'>;
const WIDEST = 6;

/** The programme as days × times, in boards of at most six days and of about the same width each. */
export function programmeBoards(programme: Timetable): Board[] {
  const { camp, meetings } = programme;
  const spanned = daysBetween(camp.startsOn, camp.endsOn);
  const days = [...new Set([...spanned, ...meetings.map(({ day }) => day)])].sort();
  const width = Math.ceil(days.length / Math.ceil(days.length / WIDEST));
  const boards: Board[] = [];
  for (let first = 0; first < days.length; first += width) {
    const shown = days.slice(first, first + width).map((day) => boardDay(programme, day));
    const times = new Set(shown.flatMap(({ slots }) => slots.map(({ starts }) => starts)));
    boards.push({ times: [...times].sort(), days: shown });
  }
  return boards;
}

function boardDay(programme: Timetable, day: string): BoardDay {
  const today = programme.meetings
    .filter((meeting) => meeting.day === day)
    .flatMap((meeting) => {
      const workshop = programme.workshops.find(({ id }) => id === meeting.workshopId);
      return workshop ? [{ meeting, workshop, place: trackPlace(programme, workshop) }] : [];
    })
    .sort((a, b) => a.place - b.place || compareText(a.workshop.title, b.workshop.title));
  const starts = [...new Set(today.map(({ meeting }) => meeting.starts))].sort(compareText);
  return {
    day,
    slots: starts.map((time) => {
      const meetings = today
        .filter(({ meeting }) => meeting.starts === time)
        .map(({ meeting, workshop }) => toBoardMeeting(programme, meeting, workshop));
      return { starts: time, ends: commonEnd(meetings), meetings };
    }),
  };
}

function toBoardMeeting(
  { tracks, rooms }: Timetable,
  { id, roomId, starts, lengthMinutes }: ProgrammeMeeting,
  workshop: ProgrammeWorkshop,
): BoardMeeting {
  const names = tracks.filter((track) => workshop.trackIds.includes(track.id)).map(({ name }) => name);
  return {
    id,
    workshopId: workshop.id,
    title: workshop.title,
    ends: clockAfter(starts, lengthMinutes),
    room: rooms.find((room) => room.id === roomId)?.name ?? '',
    who: { core: names.join(', '), elective: 'Elective', everyone: 'Everyone' }[workshop.audience],
  };
}

const commonEnd = ([first, ...others]: readonly BoardMeeting[]): string | null =>
  first && others.every(({ ends }) => ends === first.ends) ? first.ends : null;

/** Core workshops in the order of their tracks, then electives and what is for everyone. */
function trackPlace({ tracks }: Timetable, { audience, trackIds }: ProgrammeWorkshop): number {
  const first = tracks.findIndex(({ id }) => trackIds.includes(id));
  return audience === 'core' && first >= 0 ? first : tracks.length;
}
