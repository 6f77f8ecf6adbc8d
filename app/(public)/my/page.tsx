import type { Metadata, Route } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { requirePermission } from '@/lib/server/access/require-permission';
import { listOwnBookings } from '@/lib/server/orders/list-own-bookings';
import { BookingList } from './_components/booking-list';
import { FindBooking } from './_components/find-booking';

export const metadata: Metadata = { title: 'My bookings', robots: { index: false } };

export default async function MyPage({ searchParams }: PageProps<'/my'>) {
  const actor = await requirePermission('public.read');
  const { link } = await searchParams;
  const bookings = listOwnBookings(actor);
  return (
    <div className="pb-16">
      <PageHead
        title="My bookings"
        lead={actor.user ? undefined : 'What this browser has booked, or has opened from a mail.'}
        actions={!actor.user && <ButtonLink href={'/sign-in?next=/my' as Route}>Sign in</ButtonLink>}
      />
      {link === 'broken' && (
        <Notice tone="stop" title="This link does not open a booking">
          It may have been cut off by a mail program. Copy the whole link, or ask for it again below.
        </Notice>
      )}
      {actor.user && !actor.user.emailVerified && (
        <Notice title="Your address is not confirmed yet">
          Bookings made with {actor.user.email} show here once you have confirmed it: press the link in our
          mail.
        </Notice>
      )}
      {bookings.length > 0 ? (
        <BookingList bookings={bookings} />
      ) : (
        <Empty title="No bookings here yet">
          <p>Choose a camp, or find a booking that you made on another device.</p>
          <p className="mt-4">
            <ButtonLink href="/">See the camps</ButtonLink>
          </p>
        </Empty>
      )}
      <FindBooking />
    </div>
  );
}
