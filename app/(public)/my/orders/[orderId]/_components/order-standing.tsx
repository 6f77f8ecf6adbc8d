import type { Route } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { StateMark } from '@/components/ui/state-mark';
import { orderSentence } from '@/lib/domain/orders/order-sentence';
import { orderTone } from '@/lib/domain/orders/order-tone';
import { STATE_WORDS } from '@/lib/domain/registration/states';
import { payPath } from '@/lib/domain/registration/step-path';
import type { OrderView } from '@/lib/server/orders/load-order';

/** The state in words, and the one thing to do about it. */
export function OrderStanding({ view, now }: { view: OrderView; now: number }) {
  const { order, camp, due } = view;
  const { state, heldUntil, currency } = order;
  const payable = state === 'held' && heldUntil !== null && heldUntil > now;
  return (
    <section aria-label="Where it stands" className="grid justify-items-start gap-3">
      <p className="text-lead">
        <StateMark tone={orderTone(state)}>{STATE_WORDS[state]}</StateMark>
      </p>
      <p className="max-w-prose">
        {orderSentence({ state, heldUntil, currency, due, timeZone: camp.timeZone }, now)}
      </p>
      {payable && (
        <ButtonLink tone="primary" href={payPath(camp.slug, order.id) as Route}>
          Go on to pay
        </ButtonLink>
      )}
      {state === 'expired' && <ButtonLink href={`/camps/${camp.slug}` as Route}>See what is left</ButtonLink>}
    </section>
  );
}
