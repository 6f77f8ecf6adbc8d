import { clockAfter } from '@/lib/domain/shared/local-time';
import { sayShortDay } from '@/lib/domain/shared/say-date';
import type { ProgrammeMeeting, ProgrammeWorkshop } from '@/lib/domain/timetable/programme';
import { KIND_WORDS } from '@/lib/domain/timetable/workshop-words';

type ElectiveHintProps = {
  workshop: Pick<ProgrammeWorkshop, 'kind' | 'description'>;
  meetings: readonly ProgrammeMeeting[];
  seats: string | null;
};

/** What it is, when it meets, how many seats are left. */
export function ElectiveHint({ workshop, meetings, seats }: ElectiveHintProps) {
  return (
    <>
      <span className="block">{[KIND_WORDS[workshop.kind], seats].filter(Boolean).join(' · ')}</span>
      {meetings.map((meeting) => (
        <span key={meeting.id} className="block">
          {sayShortDay(meeting.day)},{' '}
          <span className="figures">
            {meeting.starts}–{clockAfter(meeting.starts, meeting.lengthMinutes)}
          </span>
        </span>
      ))}
      {meetings.length === 0 && <span className="block">Time to be announced</span>}
      {workshop.description && <span className="block">{workshop.description}</span>}
    </>
  );
}
