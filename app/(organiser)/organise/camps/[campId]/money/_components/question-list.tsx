import { StateMark } from '@/components/ui/state-mark';
import type { MoneyQuestion } from '@/lib/domain/money/camp-money';
import { formatMoney } from '@/lib/domain/shared/money';
import { sayInstant } from '@/lib/domain/shared/say-date';

/** What a program must not decide alone: compare it with the provider's own page, then put it right there. */
export function QuestionList({
  questions,
  timeZone,
}: {
  questions: readonly MoneyQuestion[];
  timeZone: string;
}) {
  return (
    <section aria-labelledby="for-a-person" className="mt-10">
      <h2 id="for-a-person">For a person to look at</h2>
      <p className="mt-1 max-w-prose text-soft">
        These did not fit our books and changed nothing. Compare each with the payment provider’s own pages.
      </p>
      <ul className="mt-3 border-t-2 border-reed">
        {questions.map((question) => (
          <li key={question.id} className="border-b border-line py-3">
            <p className="flex flex-wrap items-baseline gap-x-4">
              <StateMark tone="stop">Look at this</StateMark>
              <span className="font-semibold">{question.what}</span>
              {question.amount && (
                <span className="figures">
                  {formatMoney(question.amount.amount, question.amount.currency)}
                </span>
              )}
            </p>
            <p className="max-w-prose break-words">{question.why}</p>
            <p className="text-small text-soft">
              {question.reference ? (
                <>
                  Order <span className="figures">{question.reference}</span>
                </>
              ) : (
                'No order of ours'
              )}
              , <time>{sayInstant(question.at, timeZone)}</time>,{' '}
              <span className="figures break-all">{question.id}</span>
            </p>
          </li>
        ))}
      </ul>
    </section>
  );
}
