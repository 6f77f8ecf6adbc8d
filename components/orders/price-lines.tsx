import { formatMoney, type Minor } from '@/lib/domain/shared/money';

type PriceLinesProps = {
  currency: string;
  lines: readonly { id?: string; label: string; quantity: number; amount: Minor }[];
  total: Minor;
};

/** What is paid for, line by line, and the sum. */
export function PriceLines({ currency, lines, total }: PriceLinesProps) {
  return (
    <table className="w-full border-t-2 border-ink text-left">
      <caption className="sr-only">Price</caption>
      <tbody>
        {lines.map((line) => (
          <tr key={line.id ?? line.label} className="border-b border-line align-top">
            <th scope="row" className="py-2 pr-4 font-normal">
              {line.quantity > 1 && `${line.quantity} × `}
              {line.label}
            </th>
            <td className="figures whitespace-nowrap py-2 text-right">
              {formatMoney(line.amount, currency)}
            </td>
          </tr>
        ))}
      </tbody>
      <tfoot>
        <tr className="font-bold">
          <th scope="row" className="py-2 pr-4">
            Total
          </th>
          <td className="figures whitespace-nowrap py-2 text-right">{formatMoney(total, currency)}</td>
        </tr>
      </tfoot>
    </table>
  );
}
