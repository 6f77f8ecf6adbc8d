import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { listLedger } from '@/lib/server/money/list-ledger';
import { listOrders, ORDER_FILTERS } from '@/lib/server/money/list-orders';
import { moneyQuestions } from '@/lib/server/money/money-questions';
import { moneyTotals } from '@/lib/server/money/money-totals';
import { LedgerTable } from './_components/ledger-table';
import { OrdersTable } from './_components/orders-table';
import { QuestionList } from './_components/question-list';
import { Totals } from './_components/totals';

export const metadata: Metadata = { title: 'Money' };
const SHOW_WORDS = { all: 'All orders', owes: 'Something to pay', back: 'Money to give back' };

export default async function MoneyPage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/money'>) {
  const { camp } = await requireCamp((await params).campId, 'money.read');
  const search = await searchParams;
  const show = ORDER_FILTERS.find((one) => one === search.show) ?? 'all';
  const { orders, total, page, pages } = listOrders(camp.id, show, Math.trunc(Number(search.page)) || 1);
  const questions = moneyQuestions(camp.id);
  const path = `/organise/camps/${camp.id}/money`;
  const at = (to: number) =>
    `${path}?${new URLSearchParams({ ...(show !== 'all' && { show }), page: String(to) })}#orders` as Route;
  return (
    <>
      <PageHead
        over={camp.name}
        title="Money"
        lead={`All amounts in ${camp.currency}, by the camp’s ledger.`}
      />
      <Totals totals={moneyTotals(camp.id)} currency={camp.currency} />
      {questions.length > 0 && <QuestionList questions={questions} timeZone={camp.timeZone} />}
      <section aria-labelledby="orders" className="mt-10">
        <h2 id="orders">Orders</h2>
        <nav aria-label="Which orders" className="mt-2 flex flex-wrap gap-x-6">
          {ORDER_FILTERS.map((one) => (
            <Link
              key={one}
              href={`${path}${one === 'all' ? '' : `?show=${one}`}` as Route}
              aria-current={one === show ? 'true' : undefined}
              className="inline-flex min-h-target items-center border-b-4 border-transparent font-semibold text-ink no-underline hover:border-line aria-[current]:border-pine"
            >
              {SHOW_WORDS[one]}
            </Link>
          ))}
        </nav>
        {orders.length === 0 ? (
          <Notice>{show === 'all' ? 'Nobody has ordered yet.' : 'No order is like that just now.'}</Notice>
        ) : (
          <OrdersTable orders={orders} timeZone={camp.timeZone} />
        )}
        <div className="mt-3 flex flex-wrap items-center gap-x-6">
          <p>
            <span className="figures">{total.toLocaleString('en-GB')}</span>{' '}
            {total === 1 ? 'order' : 'orders'}
            {pages > 1 && `, page ${page} of ${pages}`}
          </p>
          {page > 1 && (
            <Link href={at(page - 1)} className="inline-flex min-h-target items-center">
              Newer
            </Link>
          )}
          {page < pages && (
            <Link href={at(page + 1)} className="inline-flex min-h-target items-center">
              Older
            </Link>
          )}
        </div>
      </section>
      <LedgerTable lines={listLedger(camp.id)} timeZone={camp.timeZone} />
    </>
  );
}
