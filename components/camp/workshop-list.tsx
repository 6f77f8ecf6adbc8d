import { needSentence } from '@/lib/domain/harp/need-sentence';
import { listWords } from '@/lib/domain/shared/list-words';
import { sayShortDay } from '@/lib/domain/shared/say-date';
import type { Programme, ProgrammeWorkshop } from '@/lib/domain/timetable/programme';
import { KIND_WORDS, type WorkshopAudience } from '@/lib/domain/timetable/workshop-words';
import { HarpName } from '../harp/harp-name';
import { PlainText } from '../ui/plain-text';

const GROUPS: { audience: WorkshopAudience; title: string; says: string }[] = [
  { audience: 'core', title: 'With a track', says: 'These come with their track.' },
  { audience: 'elective', title: 'Electives', says: 'Choose among these when you register.' },
  { audience: 'everyone', title: 'For everyone', says: 'No choice to make: come along.' },
];

/** Everything that is taught or played, by whom it is for. */
export function WorkshopList({ programme }: { programme: Programme }) {
  const groups = GROUPS.map((group) => ({
    ...group,
    workshops: programme.workshops.filter(({ audience }) => audience === group.audience),
  })).filter(({ workshops }) => workshops.length > 0);
  if (groups.length === 0) return <p className="text-soft">The workshops are still being set.</p>;
  return (
    <div className="space-y-10">
      {groups.map(({ audience, title, says, workshops }) => (
        <div key={audience}>
          <h3>{title}</h3>
          <p className="text-soft">{says}</p>
          <ul className="mt-3 divide-y divide-edge border-y border-edge">
            {workshops.map((workshop) => (
              <WorkshopEntry key={workshop.id} workshop={workshop} programme={programme} />
            ))}
          </ul>
        </div>
      ))}
    </div>
  );
}

function WorkshopEntry({ workshop, programme }: { workshop: ProgrammeWorkshop; programme: Programme }) {
  const { tracks, instructors, meetings } = programme;
  const teachers = instructors
    .filter(({ id }) => workshop.instructorIds.includes(id))
    .map(({ name }) => name);
  const own = tracks.filter(({ id }) => workshop.trackIds.includes(id)).map(({ name }) => name);
  const times = meetingTimes(meetings.filter(({ workshopId }) => workshopId === workshop.id));
  return (
    <li id={workshop.id} className="grid scroll-mt-6 gap-x-8 gap-y-2 py-4 target:bg-panel sm:grid-cols-2">
      <div className="min-w-0">
        <h4 className="break-words font-head text-[1.12rem] font-bold leading-tight">{workshop.title}</h4>
        <p className="mt-1 text-small text-soft">
          {[KIND_WORDS[workshop.kind], `${workshop.lengthMinutes} minutes`, listWords(own)]
            .filter(Boolean)
            .join(' · ')}
          {workshop.capacity !== null && ` · at most ${workshop.capacity} people`}
        </p>
        {teachers.length > 0 && <p className="mt-1 text-small">With {listWords(teachers)}</p>}
        {times && <p className="mt-1 text-small text-soft">{times}</p>}
      </div>
      <div className="min-w-0">
        {workshop.description && <PlainText text={workshop.description} />}
        {workshop.needs.length > 0 && (
          <ul className="mt-2 text-small" aria-label="Harps">
            {workshop.needs.map((need) => (
              <li key={needSentence(need)} className="break-words">
                <span className="text-soft">{need.level === 'required' ? 'Bring: ' : 'Helps: '}</span>
                <HarpName>{needSentence({ ...need, level: 'required' })}</HarpName>
              </li>
            ))}
          </ul>
        )}
      </div>
    </li>
  );
}

/** "Mon 15 February and Tue 16 February at 09:30"; each with its own time where they differ. */
function meetingTimes(meetings: Programme['meetings']): string {
  const starts = [...new Set(meetings.map((meeting) => meeting.starts))];
  if (starts.length === 1)
    return `${listWords(
      meetings.map(({ day }) => sayShortDay(day)),
      'and',
      8,
    )} at ${starts[0]}`;
  return listWords(
    meetings.map((meeting) => `${sayShortDay(meeting.day)} ${meeting.starts}`),
    'and',
    6,
  );
}
