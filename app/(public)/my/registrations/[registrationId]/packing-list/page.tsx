import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PackingList } from '@/components/harp/packing-list';
import { OwnDays } from '@/components/timetable/own-days';
import { PageHead } from '@/components/ui/page-head';
import { isId } from '@/lib/domain/shared/ids';
import { sayDays } from '@/lib/domain/shared/say-date';
import { requirePermission } from '@/lib/server/access/require-permission';
import { loadAttendee } from '@/lib/server/packing/load-attendee';
import { OwnHarps } from './_components/own-harps';
import { PackingActions } from './_components/packing-actions';

export const metadata: Metadata = { title: 'Packing list and timetable', robots: { index: false } };

export default async function PackingListPage({
  params,
}: PageProps<'/my/registrations/[registrationId]/packing-list'>) {
  const { registrationId } = await params;
  await requirePermission('registration.read', { kind: 'registration', id: registrationId });
  const attendee = isId('reg', registrationId) ? loadAttendee(registrationId) : null;
  if (!attendee) notFound();
  const { person, programme, meetings, owned, packing } = attendee;
  const { camp } = programme;
  return (
    <div className="pb-16 print:pb-0">
      <PageHead
        over={`${camp.name}, ${sayDays(camp.startsOn, camp.endsOn)}`}
        title={
          <>
            Packing list of <bdi>{person.attendeeName}</bdi>
          </>
        }
        lead={
          <>
            <span className="print:hidden">
              From your own workshops in track {person.trackName}. It changes with the timetable and with the
              harps you own.{' '}
            </span>
            <span className="print:text-[11px]">Times are local to the camp ({camp.timeZone}).</span>
          </>
        }
        actions={<PackingActions person={person} hasMeetings={meetings.length > 0} />}
      />
      <PackingList
        list={packing}
        help={
          <>
            No way to get one in time? Write to {camp.organisationName},{' '}
            <a href={`mailto:${camp.organisationEmail}`}>{camp.organisationEmail}</a>, before you travel.
          </>
        }
      />
      <section className="no-print mt-12" aria-labelledby="own-harps">
        <h2 id="own-harps" className="border-b-2 border-ink pb-1">
          Harps you own
        </h2>
        <OwnHarps registrationId={person.id} owned={owned} />
      </section>
      <section className="no-print mt-12" aria-labelledby="own-days">
        <h2 id="own-days" className="mb-4 border-b-2 border-ink pb-1">
          Your timetable
        </h2>
        <OwnDays programme={programme} meetings={meetings} />
      </section>
      <section className="mt-10 max-w-prose print:mt-2" aria-labelledby="care">
        <h2 id="care" className="border-b-2 border-ink pb-1 print:hidden">
          Take care
        </h2>
        <p className="mt-3 text-small print:mt-0 print:text-[10px]">
          Light-headed from playing? Stop, sit down and breathe normally. With a breathing condition, ask your
          doctor before camp. Bring hearing protection for amplified workshops. The rules of the venue and
          local law come first.
        </p>
      </section>
    </div>
  );
}
