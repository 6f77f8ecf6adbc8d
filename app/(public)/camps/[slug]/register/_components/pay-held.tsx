import { ActionForm } from '@/components/forms/action-form';
import { HoldClock } from '@/components/orders/hold-clock';
import { PriceLines } from '@/components/orders/price-lines';
import { formatMoney } from '@/lib/domain/shared/money';
import { sayInstant } from '@/lib/domain/shared/say-date';
import type { Checkout } from '@/lib/server/registration/get-checkout';
import { changeOrderAction, payAction } from '../actions';

/** A held order: until when, how much, Pay, and the way back to the answers. */
export function PayHeld({ checkout, now }: { checkout: Checkout; now: number }) {
  const { id, heldUntil, camp, currency, total, lines, reference, payerEmail } = checkout;
  return (
    <div className="grid gap-8">
      {heldUntil !== null && (
        <HoldClock until={heldUntil} untilWords={sayInstant(heldUntil, camp.timeZone)} now={now} />
      )}
      <div>
        <p>
          Booking <span className="figures font-bold">{reference}</span>. The receipt and the ticket go to{' '}
          <span className="break-words font-semibold">{payerEmail}</span>.
        </p>
        <div className="mt-4">
          <PriceLines currency={currency} lines={lines} total={total} />
        </div>
      </div>
      <ActionForm
        action={payAction}
        submit={`Pay ${formatMoney(total, currency)}`}
        hidden={{ orderId: id }}
      />
      <div className="border-t border-line pt-4">
        <p className="max-w-prose text-soft">
          Something not right? Changing an answer gives the place back first and takes it again when you are
          done, if it is still there.
        </p>
        <div className="mt-2">
          <ActionForm
            action={changeOrderAction}
            submit="Change my answers"
            tone="plain"
            hidden={{ orderId: id }}
          />
        </div>
      </div>
    </div>
  );
}
