import type { Metadata, Route } from 'next';
import { notFound, redirect } from 'next/navigation';
import { Notice } from '@/components/ui/notice';
import { paidPath, payPath } from '@/lib/domain/registration/step-path';
import { isId } from '@/lib/domain/shared/ids';
import { requirePermission } from '@/lib/server/access/require-permission';
import { findPublicCampId } from '@/lib/server/camps/get-public-camp';
import { readDraftToken } from '@/lib/server/registration/draft-cookie';
import { findDraft } from '@/lib/server/registration/find-draft';
import { getCheckout } from '@/lib/server/registration/get-checkout';
import { HoldOver } from '../_components/hold-over';
import { PayHeld } from '../_components/pay-held';
import { StepFrame } from '../_components/step-frame';

export const metadata: Metadata = { title: 'Register: pay', robots: { index: false } };

export default async function PayPage({ params, searchParams }: PageProps<'/camps/[slug]/register/pay'>) {
  const { slug } = await params;
  const { order: asked, back } = await searchParams;
  if (typeof asked !== 'string' || !isId('ord', asked)) return toOwnOrder(slug);
  await requirePermission('order.read', { kind: 'order', id: asked });
  const checkout = getCheckout(asked);
  if (!checkout || checkout.camp.slug !== slug) notFound();
  if (checkout.state === 'confirmed') redirect(paidPath(asked) as Route);
  const now = Date.now();
  const running = checkout.state === 'held' && checkout.heldUntil !== null && checkout.heldUntil > now;
  return (
    <StepFrame
      camp={{ ...checkout.camp, slug }}
      step="pay"
      title={running ? 'Pay for your place' : 'Your place was not paid'}
    >
      {running && back === '1' && (
        <Notice title="Not paid yet">
          You came back from the payment page and nothing was charged. Your place is still held.
        </Notice>
      )}
      {running ? <PayHeld checkout={checkout} now={now} /> : <HoldOver checkout={checkout} />}
    </StepFrame>
  );
}

/** Without an order in the address: the one this browser has made for the camp, else to the beginning. */
async function toOwnOrder(slug: string): Promise<never> {
  const campId = findPublicCampId(slug);
  if (!campId) notFound();
  const order = findDraft(await readDraftToken(), campId)?.order;
  return redirect((order ? payPath(slug, order.id) : `/camps/${slug}/register`) as Route);
}
