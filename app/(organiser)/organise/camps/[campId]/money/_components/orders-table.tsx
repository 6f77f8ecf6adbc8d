import { DueWords } from '@/components/orders/due-words';
import { RegistrationStateMark } from '@/components/orders/registration-state-mark';
import { ScrollRegion } from '@/components/ui/scroll-region';
import type { MoneyOrder } from '@/lib/domain/money/camp-money';
import { formatMoney } from '@/lib/domain/shared/money';
import { Stamp } from './stamp';

const HEAD = 'sticky top-0 bg-board px-2 py-2 align-bottom';
const FIGURE = 'figures px-2 py-2 text-right align-top';

export function OrdersTable({ orders, timeZone }: { orders: readonly MoneyOrder[]; timeZone: string }) {
  return (
    <ScrollRegion label="Table of orders" className="mt-2 max-h-[75vh] border-t-2 border-ink">
      <table className="w-full border-collapse text-left">
        <thead>
          <tr>
            <th scope="col" className={HEAD}>
              Order
            </th>
            <th scope="col" className={`${HEAD} max-md:hidden`}>
              Payer
            </th>
            <th scope="col" className={HEAD}>
              State
            </th>
            <th scope="col" className={`${HEAD} max-md:hidden`}>
              Made ({timeZone})
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
              <th scope="row" className="px-2 py-2 align-top font-normal">
                <span className="figures font-semibold">{order.reference}</span>
                <span className="block break-words text-small md:hidden">{order.payer}</span>
              </th>
              <td className="break-words px-2 py-2 align-top max-md:hidden">{order.payer}</td>
              <td className="px-2 py-2 align-top">
                <RegistrationStateMark state={order.state} />
              </td>
              <td className="px-2 py-2 align-top max-md:hidden">
                <Stamp at={order.createdAt} timeZone={timeZone} />
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
