import type { MoneyTotals } from '@/lib/domain/money/camp-money';
import { formatMoney, type Minor } from '@/lib/domain/shared/money';

export function Totals({ totals, currency }: { totals: MoneyTotals; currency: string }) {
  const rows: [string, Minor, string][] = [
    ['Still to come', totals.owed, orders(totals.owing)],
    ['Paid in', totals.paid, ''],
    ['Given back', totals.refunded, ''],
    ['To give back', totals.back, orders(totals.backing)],
    ['Places sold', totals.sold, orders(totals.orders, ' in all')],
  ];
  return (
    <dl className="-mt-4 grid sm:grid-cols-2 xl:grid-cols-5">
      {rows.map(([word, amount, note]) => (
        <div key={word} className="border-b border-line py-3 pr-4">
          <dt className="text-soft">{word}</dt>
          <dd>
            <span className="figures block text-h3 font-bold">{formatMoney(amount, currency)}</span>
            <span className="text-small text-soft">{note}</span>
          </dd>
        </div>
      ))}
    </dl>
  );
}

const orders = (count: number, more = ''): string =>
  `${count.toLocaleString('en-GB')} ${count === 1 ? 'order' : 'orders'}${more}`;
