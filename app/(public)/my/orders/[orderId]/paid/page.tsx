import type { Metadata, Route } from 'next';
import { notFound, redirect } from 'next/navigation';
import { PageHead } from '@/components/ui/page-head';
import { payPath } from '@/lib/domain/registration/step-path';
import { isId } from '@/lib/domain/shared/ids';
import { requirePermission } from '@/lib/server/access/require-permission';
import { getCheckout } from '@/lib/server/registration/get-checkout';
import { reconcileOrder } from '@/lib/server/registration/reconcile-payments';
import { PaidNews } from './_components/paid-news';

export const metadata: Metadata = { title: 'Payment', robots: { index: false } };

/**
 * Where the provider sends a payer back to. Often they are here before its webhook: then this asks the provider itself
 * and takes the answer in by the same way.
 */
export default async function PaidPage({ params }: PageProps<'/my/orders/[orderId]/paid'>) {
  const { orderId } = await params;
  await requirePermission('order.read', { kind: 'order', id: orderId });
  if (!isId('ord', orderId)) notFound();
  if (getCheckout(orderId)?.state === 'held') await reconcileOrder(orderId, Date.now());
  const checkout = getCheckout(orderId);
  if (!checkout) notFound();
  const unpaid = checkout.state === 'expired' && checkout.refunds.length === 0;
  if (unpaid) redirect(payPath(checkout.camp.slug, orderId) as Route);
  return (
    <div className="mx-auto max-w-2xl pb-16">
      <PageHead
        over={checkout.camp.name}
        title={checkout.state === 'confirmed' ? 'You have a place' : 'Your payment'}
      />
      <PaidNews checkout={checkout} />
    </div>
  );
}
