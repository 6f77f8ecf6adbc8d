import type { Metadata, Route } from 'next';
import { redirect } from 'next/navigation';
import { ActionForm } from '@/components/forms/action-form';
import { PriceLines } from '@/components/orders/price-lines';
import { Notice } from '@/components/ui/notice';
import { quoteRegistration } from '@/lib/domain/registration/quote-registration';
import { stepPath } from '@/lib/domain/registration/step-path';
import { firstUnanswered, isComplete } from '@/lib/domain/registration/steps';
import { env } from '@/lib/server/env';
import { openStep } from '@/lib/server/registration/open-step';
import { AllAnswers } from '../_components/all-answers';
import { StepFrame } from '../_components/step-frame';
import { submitRegistrationAction } from '../actions';

export const metadata: Metadata = { title: 'Register: check your answers', robots: { index: false } };

export default async function CheckPage({ params }: PageProps<'/camps/[slug]/register/check'>) {
  const { slug } = await params;
  const { programme, answers } = await openStep(slug, 'check');
  if (!isComplete(answers)) redirect(stepPath(slug, firstUnanswered(answers)) as Route);
  const { camp } = programme;
  const quote = quoteRegistration(programme, [answers.track.trackId]);
  const free = quote?.total === 0;
  return (
    <StepFrame camp={camp} step="check" back={stepPath(slug, 'needs')}>
      <AllAnswers programme={programme} answers={answers} />
      <section aria-labelledby="price" className="mt-10 grid gap-6">
        <h2 id="price">Price</h2>
        {quote ? (
          <PriceLines {...quote} />
        ) : (
          <Notice tone="stop" title="The price is not set yet">
            Write to {camp.organisationEmail}; your answers are kept here.
          </Notice>
        )}
        {camp.refundTerms && (
          <div className="max-w-prose">
            <h3>If you cannot come</h3>
            <p className="mt-1 whitespace-pre-line">{camp.refundTerms}</p>
            <p className="mt-1 text-small text-soft">
              These terms are kept with your booking as they stand now.
            </p>
          </div>
        )}
        {quote && (
          <>
            <p className="max-w-prose">
              {free
                ? 'Nothing to pay: your place is yours as soon as you press the button.'
                : `Next we hold your place for ${env().HOLD_MINUTES} minutes while you pay. Nothing is charged before you confirm it on the payment page.`}
            </p>
            <ActionForm
              action={submitRegistrationAction}
              submit={free ? 'Take my place' : 'Hold my place and pay'}
              hidden={{ slug }}
            />
          </>
        )}
      </section>
    </StepFrame>
  );
}
