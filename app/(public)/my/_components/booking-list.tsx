import type { Route } from 'next';
import Link from 'next/link';
import { StateMark } from '@/components/ui/state-mark';
import { orderTone } from '@/lib/domain/orders/order-tone';
import { STATE_WORDS } from '@/lib/domain/registration/states';
import { sayDays, sayInstant } from '@/lib/domain/shared/say-date';
import type { Booking } from '@/lib/server/orders/list-own-bookings';

export function BookingList({ bookings }: { bookings: readonly Booking[] }) {
  return (
    <ul className="border-t border-line">
      {bookings.map((booking) => (
        <li
          key={booking.orderId}
          className="grid gap-x-8 gap-y-2 border-b border-line py-5 md:grid-cols-[1fr_auto]"
        >
          <div className="min-w-0">
            <h2 className="break-words">
              {booking.mine ? (
                <Link href={`/my/orders/${booking.orderId}` as Route} className="text-ink">
                  {booking.camp.name}
                </Link>
              ) : (
                booking.camp.name
              )}
            </h2>
            <p className="break-words">
              {[sayDays(booking.camp.startsOn, booking.camp.endsOn), booking.camp.venueName]
                .filter(Boolean)
                .join(' · ')}
            </p>
            <ul className="mt-2">
              {booking.people.map((person) => (
                <li key={person.id} className="flex flex-wrap items-center gap-x-4">
                  <span className="w-full min-w-0 break-words sm:w-auto">
                    {person.attendeeName}, track {person.trackName}
                  </span>
                  {person.state === 'confirmed' && (
                    <>
                      <Link
                        className="inline-flex min-h-target items-center"
                        href={`/my/registrations/${person.id}/ticket` as Route}
                      >
                        Ticket<span className="sr-only"> of {person.attendeeName}</span>
                      </Link>
                      <Link
                        className="inline-flex min-h-target items-center"
                        href={`/my/registrations/${person.id}/packing-list` as Route}
                      >
                        Timetable and packing list<span className="sr-only"> of {person.attendeeName}</span>
                      </Link>
                    </>
                  )}
                </li>
              ))}
            </ul>
          </div>
          <p className="flex flex-wrap items-baseline gap-x-4 md:flex-col md:items-end">
            <StateMark tone={orderTone(booking.state)}>{STATE_WORDS[booking.state]}</StateMark>
            {booking.state === 'held' && booking.heldUntil !== null && (
              <span className="text-small text-soft">
                until {sayInstant(booking.heldUntil, booking.camp.timeZone)}
              </span>
            )}
            <span className="text-small text-soft">
              Reference <span className="figures">{booking.reference}</span>
            </span>
          </p>
        </li>
      ))}
    </ul>
  );
}
