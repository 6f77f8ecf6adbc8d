import { formatMoney, type Minor, minor } from '@/lib/domain/shared/money';

/** What is due, in words where it is nothing or runs the other way. */
export function DueWords({ due, currency }: { due: Minor; currency: string }) {
  if (due === 0) return <span className="text-soft">nothing</span>;
  if (due > 0) return <span className="figures font-semibold">{formatMoney(due, currency)}</span>;
  return (
    <span className="font-semibold text-reed">
      <span className="figures">{formatMoney(minor(-due), currency)}</span> to give back
    </span>
  );
}
