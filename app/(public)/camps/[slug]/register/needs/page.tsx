import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { Notice } from '@/components/ui/notice';
import type { Answers } from '@/lib/domain/registration/answers';
import { NEEDS_KEPT_DAYS } from '@/lib/domain/registration/needs-kept-days';
import { stepPath } from '@/lib/domain/registration/step-path';
import { sayPhone } from '@/lib/domain/shared/to-e164';
import { openStep } from '@/lib/server/registration/open-step';
import { NeedsFields } from '../_components/needs-fields';
import { StepFrame } from '../_components/step-frame';
import { saveNeedsAction } from '../actions';

export const metadata: Metadata = { title: 'Register: what we should know', robots: { index: false } };

/** What was answered; a payer who books for somebody under 18 is most likely the guardian, and is not asked again. */
function known({ who, needs }: Answers): Record<string, unknown> {
  const payer = who?.payer === 'other' ? { guardianName: who.payerName, guardianEmail: who.payerEmail } : {};
  if (!needs) return payer;
  const { guardianName, guardianEmail, ...rest } = needs;
  return {
    ...rest,
    emergencyPhone: sayPhone(needs.emergencyPhone),
    guardianPhone: needs.guardianPhone && sayPhone(needs.guardianPhone),
    ...payer,
    ...(guardianName && { guardianName }),
    ...(guardianEmail && { guardianEmail }),
    consent: needs.consent ? 'on' : undefined,
  };
}

export default async function NeedsPage({ params, searchParams }: PageProps<'/camps/[slug]/register/needs'>) {
  const { slug } = await params;
  const { from } = await searchParams;
  const { programme, answers } = await openStep(slug, 'needs');
  return (
    <StepFrame camp={programme.camp} step="needs" back={stepPath(slug, from === 'check' ? 'check' : 'harps')}>
      <Notice title="Who sees this">
        Only the organisers of this camp see what you write here, and the kitchen what it needs of it. The
        door sees that there is a note, not the note. It is deleted {NEEDS_KEPT_DAYS} days after the camp.
      </Notice>
      <ActionForm
        action={saveNeedsAction}
        submit="Continue"
        defaultValue={known(answers)}
        hidden={{ slug, ...(from === 'check' && { from: 'check' }) }}
      >
        <NeedsFields minor={answers.who?.minor ?? false} />
      </ActionForm>
    </StepFrame>
  );
}
