import type { Route } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { Checkout } from '@/lib/server/registration/get-checkout';
import { changeOrderAction } from '../actions';

/** An order whose hold is over, or that is not to be paid any more. */
export function HoldOver({ checkout }: { checkout: Checkout }) {
  const { id, state, camp } = checkout;
  const over = state === 'expired' || state === 'held';
  return (
    <div className="grid gap-8">
      <Notice tone="stop" title={over ? 'The time for paying ran out' : 'There is nothing to pay here'}>
        {over
          ? 'The place went back for others. Nothing was charged. If money of yours arrives all the same, you get a place again or all of it back, and an e-mail that says which.'
          : 'This booking was cancelled or given to somebody else.'}
      </Notice>
      {over && (
        <ActionForm action={changeOrderAction} submit="Try again with my answers" hidden={{ orderId: id }} />
      )}
      <p>
        <ButtonLink href={`/camps/${camp.slug}` as Route}>Back to the camp</ButtonLink>
      </p>
    </div>
  );
}
