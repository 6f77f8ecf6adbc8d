import type { Route } from 'next';
import Link from 'next/link';
import { HarpName } from '@/components/harp/harp-name';
import { StateMark } from '@/components/ui/state-mark';
import { clockAfter } from '@/lib/domain/shared/local-time';
import { type Clash, isRefused, touches } from '@/lib/domain/timetable/clash';
import { KIND_LOUDNESS, SOUND_WORDS } from '@/lib/domain/timetable/kind-loudness';
import type { Programme, ProgrammeMeeting } from '@/lib/domain/timetable/programme';
import { AUDIENCE_WORDS, KIND_WORDS } from '@/lib/domain/timetable/workshop-words';
import { CardHarps } from './card-harps';

type MeetingCardProps = {
  meeting: ProgrammeMeeting;
  programme: Programme;
  clashes: readonly Clash[];
  /** Where it is moved; null for those who may only look. */
  href: string | null;
  moving: boolean;
};

export function MeetingCard({ meeting, programme, clashes, href, moving }: MeetingCardProps) {
  const workshop = programme.workshops.find(({ id }) => id === meeting.workshopId);
  if (!workshop) return null;
  const own = clashes.filter((clash) => touches(clash, meeting.id));
  const tracks = programme.tracks.filter(({ id }) => workshop.trackIds.includes(id)).map(({ name }) => name);
  const instructors = programme.instructors
    .filter(({ id }) => workshop.instructorIds.includes(id))
    .map(({ name }) => name);
  const whose = workshop.audience === 'core' ? tracks.join(', ') : AUDIENCE_WORDS[workshop.audience];
  const edge = own.some(isRefused)
    ? 'border-reed'
    : workshop.audience === 'core'
      ? 'border-pine'
      : 'border-edge';
  return (
    <article
      draggable={href !== null}
      data-meeting={meeting.id}
      data-updated={meeting.updatedAt}
      className={`mb-1 grid gap-0.5 rounded border border-l-4 bg-panel px-2 py-1.5 leading-snug last:mb-0 ${edge} ${moving ? 'outline-3 outline-brass' : ''}`}
    >
      <p className="print:hidden">
        <time>
          {meeting.starts}–{clockAfter(meeting.starts, meeting.lengthMinutes)}
        </time>
      </p>
      <h3 className="break-words font-body text-base font-bold leading-tight tracking-normal">
        {href ? (
          <Link href={href as Route} draggable={false} className="inline-block min-h-6 text-ink">
            <HarpName>{workshop.title}</HarpName>
            <span className="sr-only">: move or remove</span>
          </Link>
        ) : (
          <HarpName>{workshop.title}</HarpName>
        )}
      </h3>
      <CardHarps needs={workshop.needs} title={workshop.title} />
      <p>
        {whose && <span className="font-semibold">{whose}</span>}
        {whose && instructors.length > 0 && ', '}
        {instructors.join(', ')}
      </p>
      <p className="text-soft print:hidden">
        {KIND_WORDS[workshop.kind]}, {SOUND_WORDS[KIND_LOUDNESS[workshop.kind]].toLowerCase()}
      </p>
      {own.length > 0 && (
        <p className="print:hidden">
          <StateMark tone={own.some(isRefused) ? 'stop' : 'wait'}>
            {own.some(isRefused) ? 'Clash' : 'Worth a look'}
          </StateMark>
        </p>
      )}
    </article>
  );
}
