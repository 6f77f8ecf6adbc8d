import 'server-only';
import type { Result } from '@/lib/domain/shared/result';
import { ok } from '@/lib/domain/shared/result';
import { changeoverMinutes } from '@/lib/domain/timetable/changeover';
import { type Clash, isRefused } from '@/lib/domain/timetable/clash';
import { clashSentence } from '@/lib/domain/timetable/clash-sentence';
import { clashesOf } from '@/lib/domain/timetable/clashes-of';
import type { Programme, ProgrammeMeeting } from '@/lib/domain/timetable/programme';
import { type Refusal, refuse } from '../errors';

/** Which input a clash is about, so that its sentence stands there. */
const FIELD = {
  room: 'roomId',
  seats: 'roomId',
  loudness: 'roomId',
  instructor: 'block',
  track: 'block',
  everyone: 'block',
  'same-workshop': 'block',
  'outside-days': 'day',
} satisfies Record<Clash['kind'], string>;

/** Room and workshop must be this camp's own, and nothing may clash; else the reasons, each at its field. */
export function checkPlacing(programme: Programme, meeting: ProgrammeMeeting): Result<null, Refusal> {
  const fields: Record<string, string[]> = {};
  const say = (field: string, sentence: string) => {
    fields[field] = [...(fields[field] ?? []), sentence];
  };
  if (!programme.workshops.some(({ id }) => id === meeting.workshopId))
    say('workshopId', 'Workshop: this one is not of this camp. Choose one of the list.');
  if (!programme.rooms.some(({ id }) => id === meeting.roomId))
    say('roomId', 'Room: this one is not of this camp. Choose one of the list.');
  if (Object.keys(fields).length > 0) return refuse('bad_input', { fields });
  const names = {
    ...programme,
    meetings: [...programme.meetings.filter(({ id }) => id !== meeting.id), meeting],
  };
  for (const clash of clashesOf(meeting, programme, changeoverMinutes(programme.blocks)))
    if (isRefused(clash)) say(FIELD[clash.kind], clashSentence(clash, names, meeting.id));
  return Object.keys(fields).length > 0 ? refuse('clash', { fields }) : ok(null);
}
