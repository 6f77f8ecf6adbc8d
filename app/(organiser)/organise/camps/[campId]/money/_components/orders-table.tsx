import { DueWords } from '@/components/orders/due-words';
import { RegistrationStateMark } from '@/components/orders/registration-state-mark';
import { ScrollRegion } from '@/components/ui/scroll-region';
import type { MoneyOrder } from '@/lib/domain/money/camp-money';
import { formatMoney } from '@/lib/domain/shared/money';
import { sayInstant } from '@/lib/domain/shared/say-date';

const HEAD = 'sticky top-0 bg-board px-2 py-2 align-bottom';
const FIGURE = 'figures px-2 py-2 text-right align-top';

export function OrdersTable({ orders, timeZone }: { orders: readonly MoneyOrder[]; timeZone: string }) {
  return (
    <ScrollRegion label="Orders" className="mt-2 max-h-[75vh] border-t-2 border-ink">
      <table className="w-full border-collapse text-left">
        <thead>
          <tr>
            <th scope="col" className={HEAD}>
              Order
            </th>
            <th scope="col" className={HEAD}>
              Payer
            </th>
            <th scope="col" className={HEAD}>
              State
            </th>
            <th scope="col" className={`${HEAD} max-md:hidden`}>
              Made
            </th>
            <th scope="col" className={`${HEAD} text-right max-md:hidden`}>
              Total
            </th>
            <th scope="col" className={`${HEAD} text-right max-md:hidden`}>
              Paid
            </th>
            <th scope="col" className={`${HEAD} text-right`}>
              Due
            </th>
          </tr>
        </thead>
        <tbody>
          {orders.map((order) => (
            <tr key={order.id} className="border-t border-line">
              <th scope="row" className="figures px-2 py-2 align-top font-semibold">
                {order.reference}
              </th>
              <td className="break-words px-2 py-2 align-top">{order.payer}</td>
              <td className="px-2 py-2 align-top">
                <RegistrationStateMark state={order.state} />
              </td>
              <td className="px-2 py-2 align-top max-md:hidden">
                <time>{sayInstant(order.createdAt, timeZone)}</time>
              </td>
              <td className={`${FIGURE} max-md:hidden`}>{formatMoney(order.total, order.currency)}</td>
              <td className={`${FIGURE} max-md:hidden`}>{formatMoney(order.paid, order.currency)}</td>
              <td className="px-2 py-2 text-right align-top">
                <DueWords due={order.due} currency={order.currency} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </ScrollRegion>
  );
}
