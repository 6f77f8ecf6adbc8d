import type { Route } from 'next';
import { TicketCode } from '@/components/orders/ticket-code';
import { ButtonLink, buttonClass } from '@/components/ui/button';
import { Section } from '@/components/ui/section';
import { StateMark } from '@/components/ui/state-mark';
import { orderTone } from '@/lib/domain/orders/order-tone';
import { STATE_WORDS } from '@/lib/domain/registration/states';
import type { OrderPerson, OrderView } from '@/lib/server/orders/load-order';
import { ticketQr } from '@/lib/server/tickets/ticket-qr';
import { ticketText } from '@/lib/server/tickets/ticket-text';

export function OrderPeople({ view }: { view: OrderView }) {
  const tickets = view.registrations.filter(({ ticket }) => ticket !== null).length;
  return (
    <Section
      id="people"
      title={view.registrations.length === 1 ? 'Who comes' : `Who comes: ${view.registrations.length}`}
      note={tickets > 0 && 'A code lets in one person, once. On paper it works as well; a name does too.'}
    >
      <ul className="grid gap-8">
        {view.registrations.map((person) => (
          <li key={person.id}>
            <Person person={person} />
          </li>
        ))}
      </ul>
      {tickets > 1 && (
        <p className="mt-8">
          <a className={buttonClass('plain')} href={`/api/my/orders/${view.order.id}/tickets`}>
            All tickets as PDF
          </a>
        </p>
      )}
    </Section>
  );
}

function Person({ person }: { person: OrderPerson }) {
  const { id, attendeeName, attendeeEmail, trackName, state, arrival, ticket } = person;
  const of = <span className="sr-only"> of {attendeeName}</span>;
  return (
    <div className="grid gap-x-8 gap-y-4 sm:grid-cols-[minmax(0,1fr)_minmax(0,16rem)]">
      <div className="min-w-0">
        <h3 className="break-words">{attendeeName}</h3>
        <p className="break-words">
          Track {trackName} · <span className="text-soft">{attendeeEmail}</span>
        </p>
        <p className="mt-1">
          <StateMark tone={orderTone(state)}>{STATE_WORDS[state]}</StateMark>
          {arrival === 'arrived' && <span className="text-soft"> · arrived at camp</span>}
        </p>
        {ticket && (
          <p className="mt-4 flex flex-wrap gap-3">
            <ButtonLink href={`/my/registrations/${id}/packing-list` as Route}>
              <span>Timetable and packing list{of}</span>
            </ButtonLink>
            <ButtonLink href={`/my/registrations/${id}/ticket` as Route}>
              <span>Show the ticket{of}</span>
            </ButtonLink>
            <a className={buttonClass('quiet')} href={`/api/my/registrations/${id}/ticket`}>
              <span>Ticket as PDF{of}</span>
            </a>
          </p>
        )}
      </div>
      {ticket && <TicketCode name={attendeeName} code={ticketQr(ticketText(ticket))} className="max-w-64" />}
    </div>
  );
}
