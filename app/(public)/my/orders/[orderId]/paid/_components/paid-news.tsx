import type { Route } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { payPath } from '@/lib/domain/registration/step-path';
import { formatMoney } from '@/lib/domain/shared/money';
import type { Checkout } from '@/lib/server/registration/get-checkout';
import { LookAgain } from './look-again';

const GONE = {
  owed: 'is on its way back',
  pending: 'is on its way back',
  succeeded: 'has been sent back',
  failed: 'could not be sent back yet; it is tried again',
};

/** What became of the payment: a place, still on its way, or money that goes back. */
export function PaidNews({ checkout }: { checkout: Checkout }) {
  const { id, state, reference, payerEmail, currency, total, refunds, camp } = checkout;
  const back = refunds.filter((refund) => refund.state !== 'failed').at(-1);
  return (
    <div className="grid justify-items-start gap-6">
      {state === 'confirmed' && (
        <Notice tone="done" title={total > 0 ? `Paid: ${formatMoney(total, currency)}` : 'Nothing to pay'}>
          Booking <span className="figures">{reference}</span>. Your ticket is on its way to{' '}
          <span className="break-words font-semibold">{payerEmail}</span>.
        </Notice>
      )}
      {state === 'held' && (
        <>
          <Notice title="The payment is being confirmed" live>
            Your place stays held meanwhile. This mostly takes seconds; you need not stay here, as the ticket
            comes by e-mail.
          </Notice>
          <LookAgain />
          <ButtonLink href={payPath(camp.slug, id) as Route}>I have not paid yet</ButtonLink>
        </>
      )}
      {back && (
        <Notice tone="note" title={`${formatMoney(back.amount, currency)} ${GONE[back.state]}`}>
          {back.reason === 'Paid twice'
            ? 'This booking was paid already, so the second payment goes back in full.'
            : 'Your payment arrived after the place had gone to somebody else, so all of it goes back.'}{' '}
          Banks take a few days to show it.
        </Notice>
      )}
      {state === 'confirmed' && (
        <ButtonLink tone="primary" href={`/my/orders/${id}` as Route}>
          See ticket and packing list
        </ButtonLink>
      )}
    </div>
  );
}
