import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { sayDay } from '@/lib/domain/shared/say-date';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { listOwnInstructors } from '@/lib/server/roster/list-own-instructors';
import { listTaught } from '@/lib/server/roster/list-taught';
import { PickInstructor } from './_components/pick-instructor';
import { TaughtCard } from './_components/taught-card';

export const metadata: Metadata = { title: 'My meetings' };

export default async function MyMeetingsPage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/my-meetings'>) {
  const { actor, camp } = await requireCamp((await params).campId, 'roster.own');
  const instructors = listOwnInstructors(actor, camp);
  const { instructor: asked } = await searchParams;
  const chosen = asked
    ? instructors.find(({ id }) => id === asked)
    : (instructors.find(({ own }) => own) ?? instructors[0]);
  if (asked && !chosen) notFound();
  const programme = chosen && loadProgramme(camp.id);
  const meetings = programme ? listTaught(programme, chosen.id) : [];
  const days = [...new Set(meetings.map(({ day }) => day))];
  return (
    <>
      <PageHead
        over={
          <>
            {camp.name} · times in {camp.timeZone}
          </>
        }
        title={!chosen || chosen.own ? 'My meetings' : `Meetings of ${chosen.name}`}
      />
      {instructors.length > 1 && (
        <PickInstructor campId={camp.id} instructors={instructors} chosen={chosen?.id} />
      )}
      {!chosen && (
        <Empty title="No instructor of this camp is linked to you">
          An organiser can link your account under Instructors; your meetings and their players then stand
          here.
        </Empty>
      )}
      {chosen && meetings.length === 0 && (
        <Empty title="Nothing is placed yet">
          Meetings appear here once the workshops of {chosen.name} are on the timetable.
        </Empty>
      )}
      {days.map((day) => (
        <section key={day} aria-labelledby={`day-${day}`} className="mb-10">
          <h2 id={`day-${day}`} className="border-b-2 border-ink pb-2">
            {sayDay(day)}
          </h2>
          {meetings
            .filter((meeting) => meeting.day === day)
            .map((meeting) => (
              <TaughtCard key={meeting.id} meeting={meeting} />
            ))}
        </section>
      ))}
    </>
  );
}
