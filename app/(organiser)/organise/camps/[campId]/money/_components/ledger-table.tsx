import { ScrollRegion } from '@/components/ui/scroll-region';
import type { LedgerLine } from '@/lib/domain/money/camp-money';
import { formatMoney } from '@/lib/domain/shared/money';
import { Stamp } from './stamp';

const ACCOUNT_WORDS = {
  provider: 'At the payment provider',
  payers: 'Owed by payers',
  income: 'Earned by the camp',
} satisfies Record<LedgerLine['account'], string>;
const CELL = 'px-2 py-1.5 align-top';

/** Double entry: the lines of one posting sum to nothing, and no line is ever changed. */
export function LedgerTable({ lines, timeZone }: { lines: readonly LedgerLine[]; timeZone: string }) {
  if (lines.length === 0) return null;
  return (
    <details className="mt-10">
      <summary className="min-h-target py-2 font-head text-h2 font-bold">Ledger, newest first</summary>
      <p className="max-w-prose text-soft">
        Each event has lines that sum to nothing: more on one account, as much less on another. Nothing in it
        is ever changed.
      </p>
      <ScrollRegion label="Ledger" className="mt-2 max-h-[75vh] border-t-2 border-ink">
        <table className="w-full border-collapse text-left">
          <thead>
            <tr>
              {[`When (${timeZone})`, 'Order', 'What', 'Account'].map((word) => (
                <th key={word} scope="col" className={`sticky top-0 bg-board ${CELL}`}>
                  {word}
                </th>
              ))}
              <th scope="col" className={`sticky top-0 bg-board text-right ${CELL}`}>
                Amount
              </th>
            </tr>
          </thead>
          <tbody>
            {lines.map((line, at) => {
              const first = lines[at - 1]?.posting !== line.posting;
              return (
                <tr key={line.id} className={first ? 'border-t border-line' : ''}>
                  <td className={CELL}>{first && <Stamp at={line.at} timeZone={timeZone} />}</td>
                  <td className={`figures ${CELL}`}>{first && line.reference}</td>
                  <td className={CELL}>{first && line.memo}</td>
                  <td className={CELL}>{ACCOUNT_WORDS[line.account]}</td>
                  <td className={`figures whitespace-nowrap text-right ${CELL}`}>
                    {formatMoney(line.amount, line.currency)}
                  </td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </ScrollRegion>
    </details>
  );
}
