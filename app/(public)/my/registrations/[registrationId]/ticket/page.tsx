import type { Metadata, Route } from 'next';
import { notFound } from 'next/navigation';
import { TicketCode } from '@/components/orders/ticket-code';
import { ButtonLink, buttonClass } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { STATE_WORDS } from '@/lib/domain/registration/states';
import { isId } from '@/lib/domain/shared/ids';
import { sayDay, sayDays } from '@/lib/domain/shared/say-date';
import { requirePermission } from '@/lib/server/access/require-permission';
import { loadAttendee } from '@/lib/server/packing/load-attendee';
import { ticketQr } from '@/lib/server/tickets/ticket-qr';
import { ticketText } from '@/lib/server/tickets/ticket-text';

export const metadata: Metadata = { title: 'Ticket', robots: { index: false } };

export default async function TicketPage({ params }: PageProps<'/my/registrations/[registrationId]/ticket'>) {
  const { registrationId } = await params;
  await requirePermission('registration.read', { kind: 'registration', id: registrationId });
  const attendee = isId('reg', registrationId) ? loadAttendee(registrationId) : null;
  if (!attendee) notFound();
  const { person, programme } = attendee;
  const { camp } = programme;
  return (
    <div className="mx-auto max-w-md pb-16">
      <h1 className="break-words text-h2 sm:text-h1">{person.attendeeName}</h1>
      <p className="mt-1 break-words text-lead">
        {camp.name}, {sayDays(camp.startsOn, camp.endsOn)}
      </p>
      {person.ticket ? (
        <>
          {/* As wide as a phone's screen allows: the reader at the door stands half a metre away. */}
          <TicketCode
            name={person.attendeeName}
            code={ticketQr(ticketText(person.ticket))}
            className="-mx-3 mt-4 sm:mx-0 print:max-w-[80mm]"
          />
          <p className="mt-4">
            Track {person.trackName} · reference <span className="figures font-bold">{person.reference}</span>
          </p>
          <p>
            Door opens {sayDay(camp.startsOn)}, {camp.arrivalFrom} ({camp.timeZone}).
          </p>
          {camp.venueName && (
            <p className="break-words">{[camp.venueName, camp.venueAddress].filter(Boolean).join(', ')}</p>
          )}
          <p className="no-print mt-2 text-soft">
            Turn the screen bright and hold it flat. No signal at the door? Take a picture of this page now;
            your name works too.
          </p>
          {person.minor && (
            <p className="mt-2 font-semibold">Under 18: come with the guardian who was named.</p>
          )}
        </>
      ) : (
        <Notice tone="stop" title={`No ticket: ${STATE_WORDS[person.state].toLowerCase()}`}>
          A ticket is made when a booking is paid. The one who booked can see where it stands.
        </Notice>
      )}
      <p className="no-print mt-6 flex flex-wrap gap-3">
        {person.ticket && (
          <a className={buttonClass('plain')} href={`/api/my/registrations/${person.id}/ticket`}>
            Ticket as PDF
          </a>
        )}
        <ButtonLink href={`/my/registrations/${person.id}/packing-list` as Route}>
          Timetable and packing list
        </ButtonLink>
        <ButtonLink tone="quiet" href={'/my' as Route}>
          My bookings
        </ButtonLink>
      </p>
    </div>
  );
}
