import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PageHead } from '@/components/ui/page-head';
import { PlainText } from '@/components/ui/plain-text';
import { Section } from '@/components/ui/section';
import { isId } from '@/lib/domain/shared/ids';
import { sayDay, sayDays } from '@/lib/domain/shared/say-date';
import { requirePermission } from '@/lib/server/access/require-permission';
import { loadOrder } from '@/lib/server/orders/load-order';
import { OrderMoney } from './_components/order-money';
import { OrderPeople } from './_components/order-people';
import { OrderStanding } from './_components/order-standing';

export const metadata: Metadata = { title: 'Booking', robots: { index: false } };

export default async function OrderPage({ params }: PageProps<'/my/orders/[orderId]'>) {
  const { orderId } = await params;
  await requirePermission('order.read', { kind: 'order', id: orderId });
  const view = isId('ord', orderId) ? loadOrder(orderId) : null;
  if (!view) notFound();
  const { camp, order, organisation } = view;
  return (
    <div className="pb-16">
      <PageHead
        over={
          <>
            Booking <span className="figures">{order.reference}</span>
          </>
        }
        title={camp.name}
        lead={[sayDays(camp.startsOn, camp.endsOn), camp.venueName].filter(Boolean).join(' · ')}
      />
      <OrderStanding view={view} now={Date.now()} />
      <OrderPeople view={view} />
      <OrderMoney view={view} />
      <Section id="terms" title="Refund terms" note="As they stood when you booked.">
        <PlainText text={order.refundTerms || 'None were given. Ask the organiser.'} />
      </Section>
      <Section id="arrival" title="Getting there">
        <p className="max-w-prose">
          The door opens on {sayDay(camp.startsOn)} at {camp.arrivalFrom} ({camp.timeZone}).
        </p>
        {camp.venueAddress && (
          <PlainText text={[camp.venueName, camp.venueAddress].filter(Boolean).join('\n')} className="mt-3" />
        )}
        <p className="mt-3 max-w-prose break-words">
          Questions, a change or a cancellation: write to {organisation.name},{' '}
          <a href={`mailto:${organisation.email}`}>{organisation.email}</a>, with the booking reference.
        </p>
      </Section>
    </div>
  );
}
