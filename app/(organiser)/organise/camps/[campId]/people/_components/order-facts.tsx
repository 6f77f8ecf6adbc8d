import type { PersonDetails } from '@/lib/domain/people/person-details';
import { formatMoney } from '@/lib/domain/shared/money';

const REFUND_WORDS = {
  owed: 'owed, not yet sent',
  pending: 'on its way',
  succeeded: 'given back',
  failed: 'failed, owed again',
} satisfies Record<PersonDetails['refunds'][number]['state'], string>;

/** The lines of an order and what of it went back. */
export function OrderFacts({ person }: { person: PersonDetails }) {
  const { lines, refunds, currency } = person;
  return (
    <ul className="mt-4 border-t border-line">
      {lines.map((line) => (
        <li key={line.id} className="flex justify-between gap-4 border-b border-line py-2">
          <span className="min-w-0 break-words">
            {line.label}
            {line.quantity !== 1 && ` × ${line.quantity}`}
          </span>
          <span className="figures">{formatMoney(line.amount, currency)}</span>
        </li>
      ))}
      {refunds.map((refund) => (
        <li key={refund.id} className="flex justify-between gap-4 border-b border-line py-2">
          <span className="min-w-0 break-words">
            Refund, {REFUND_WORDS[refund.state]}: {refund.reason}
          </span>
          <span className="figures">{formatMoney(refund.amount, currency)}</span>
        </li>
      ))}
    </ul>
  );
}
