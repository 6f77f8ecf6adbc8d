import type { Route } from 'next';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { stepPath } from '@/lib/domain/registration/step-path';
import type { AnswerStep } from '@/lib/domain/registration/steps';

type AnswerListProps = {
  slug: string;
  step: AnswerStep;
  title: string;
  answers: readonly { term: string; value: ReactNode }[];
};

/** The answers of one step with one link to change them, which comes back here. */
export function AnswerList({ slug, step, title, answers }: AnswerListProps) {
  return (
    <section aria-labelledby={`answers-${step}`} className="border-t-2 border-ink pt-3">
      <div className="flex items-baseline justify-between gap-4">
        <h2 id={`answers-${step}`} className="text-h3">
          {title}
        </h2>
        <Link
          href={stepPath(slug, step, 'check') as Route}
          className="inline-flex min-h-target items-center"
          aria-label={`Change: ${title}`}
        >
          Change
        </Link>
      </div>
      <dl className="divide-y divide-line">
        {answers.map(({ term, value }) => (
          <div key={term} className="grid gap-x-6 py-2 sm:grid-cols-[12rem_1fr]">
            <dt className="text-soft">{term}</dt>
            <dd className="min-w-0 whitespace-pre-line break-words">{value}</dd>
          </div>
        ))}
      </dl>
    </section>
  );
}
