import { compareHarps } from '../harp/compare-harps';
import { isAnyKey } from '../harp/harp-ask';
import { compareText } from '../shared/compare-text';
import type { PackingDay, PackingLine, PackingStop } from './packing-list';
import { compareMeetings, type PackingMeeting } from './packing-meeting';

/** The list turned round: day by day, room by room, what to have in hand. */
export function packingDays(
  meetings: readonly PackingMeeting[],
  lines: readonly PackingLine[],
): PackingDay[] {
  const ordered = [...meetings].sort(compareMeetings).filter(({ needs }) => needs.length > 0);
  const inPitchOrder = [...lines].sort((a, b) => compareHarps(a.harp, b.harp));
  return [...new Set(ordered.map(({ day }) => day))].map((day): PackingDay => {
    const stops = ordered
      .filter((meeting) => meeting.day === day)
      .map((meeting) => toStop(meeting, inPitchOrder));
    const carried = new Set(stops.flatMap(({ carry }) => carry.map(({ id }) => id)));
    return {
      day,
      carry: inPitchOrder
        .filter(({ id }) => carried.has(id))
        .map(({ id, harp, label }) => ({ id, harp, label })),
      stops,
    };
  });
}

function toStop(meeting: PackingMeeting, lines: readonly PackingLine[]): PackingStop {
  const { id, workshop, starts, ends, room, needs } = meeting;
  return {
    meetingId: id,
    workshop,
    starts,
    ends,
    room,
    carry: lines.flatMap((line) =>
      line.uses
        .filter((use) => use.meetingId === id)
        .map(({ level, sentence, note }) => ({
          id: line.id,
          harp: line.harp,
          label: line.label,
          source: line.source,
          level,
          sentence,
          note,
        })),
    ),
    anyKey: needs
      .filter(isAnyKey)
      .map(({ level, note = '' }) => ({ level, note }))
      .sort((a, b) => compareText(b.level, a.level) || compareText(a.note, b.note)),
  };
}
