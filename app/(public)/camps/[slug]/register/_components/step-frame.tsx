import type { Route } from 'next';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { TenHoleStrip } from '@/components/harp/ten-hole-strip';
import { STEP_WORDS, STEPS, type Step } from '@/lib/domain/registration/steps';

type StepFrameProps = {
  camp: { name: string; slug: string };
  step: Step;
  /** The question of this page; the step's own name otherwise. */
  title?: string;
  lead?: ReactNode;
  /** Where "Back" leads; nothing where there is no going back. */
  back?: string;
  children: ReactNode;
};

/** Round every step: the camp, how far one is, the question, the way back. */
export function StepFrame({ camp, step, title, lead, back, children }: StepFrameProps) {
  const names = STEPS.map((name) => STEP_WORDS[name]);
  const at = STEPS.indexOf(step) + 1;
  return (
    <div className="mx-auto max-w-2xl pb-16">
      <p className="text-small text-soft">
        <Link href={`/camps/${camp.slug}` as Route}>{camp.name}</Link>
      </p>
      <div className="mt-3 flex items-center gap-4">
        <TenHoleStrip mode="steps" step={at} names={names} className="max-w-56" />
        <p className="whitespace-nowrap text-small text-soft" aria-hidden="true">
          Step {at} of {names.length}
        </p>
      </div>
      <h1 className="mt-5 break-words">{title ?? STEP_WORDS[step]}</h1>
      {lead && <div className="mt-3 max-w-prose text-soft">{lead}</div>}
      <div className="mt-8">{children}</div>
      {back && (
        <p className="mt-10 border-t border-line pt-4">
          <Link href={back as Route} className="inline-flex min-h-target items-center">
            Back
          </Link>
        </p>
      )}
    </div>
  );
}
