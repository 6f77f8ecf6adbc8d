import { PriceLines } from '@/components/orders/price-lines';
import { Section } from '@/components/ui/section';
import { formatMoney } from '@/lib/domain/shared/money';
import { sayInstant } from '@/lib/domain/shared/say-date';
import type { OrderView } from '@/lib/server/orders/load-order';

const BACK = {
  owed: 'is on its way back to you',
  pending: 'is on its way back to you',
  succeeded: 'has been sent back; banks take five to ten working days to show it',
  failed: 'did not get through to you; we try again',
} as const;

/** What it cost, what was paid and what went back. */
export function OrderMoney({ view }: { view: OrderView }) {
  const { order, lines, receipts, refunds, due, camp } = view;
  return (
    <Section id="money" title="Money">
      <div className="max-w-prose">
        <PriceLines currency={order.currency} lines={lines} total={order.total} />
        {receipts.length > 0 && (
          <ul className="mt-4">
            {receipts.map(({ id, number, amount, currency, issuedAt }) => (
              <li key={id} className="flex flex-wrap items-center gap-x-4">
                <span>
                  Paid {formatMoney(amount, currency)}, {sayInstant(issuedAt, camp.timeZone)}
                </span>
                <a
                  className="inline-flex min-h-target items-center"
                  href={`/api/my/orders/${order.id}/receipts/${number}`}
                >
                  Receipt {number} as PDF
                </a>
              </li>
            ))}
          </ul>
        )}
        {refunds.map(({ id, amount, currency, state }) => (
          <p key={id} className="mt-2">
            {formatMoney(amount, currency)} {BACK[state]}.
          </p>
        ))}
        {order.state === 'expired' && receipts.length === 0 && <p className="mt-2">Nothing was charged.</p>}
        {due > 0 && <p className="mt-2 font-semibold">Still to pay: {formatMoney(due, order.currency)}</p>}
      </div>
    </Section>
  );
}
