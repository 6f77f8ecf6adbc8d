import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { stepPath } from '@/lib/domain/registration/step-path';
import { sayDay } from '@/lib/domain/shared/say-date';
import { getActor } from '@/lib/server/auth/get-actor';
import { openStep } from '@/lib/server/registration/open-step';
import { StepFrame } from '../_components/step-frame';
import { WhoFields } from '../_components/who-fields';
import { saveWhoAction } from '../actions';

export const metadata: Metadata = { title: 'Register: who is coming', robots: { index: false } };

export default async function WhoPage({ params, searchParams }: PageProps<'/camps/[slug]/register/who'>) {
  const { slug } = await params;
  const fromCheck = (await searchParams).from === 'check';
  const { programme, answers } = await openStep(slug, 'who');
  const { user } = await getActor();
  const known = answers.who
    ? { ...answers.who, minor: answers.who.minor ? 'yes' : 'no' }
    : { attendeeName: user?.name ?? '', attendeeEmail: user?.email ?? '' };
  return (
    <StepFrame
      camp={programme.camp}
      step="who"
      lead={<p>One person at a time. You need no account; the ticket comes by e-mail.</p>}
      back={fromCheck ? stepPath(slug, 'check') : `/camps/${slug}`}
    >
      <ActionForm
        action={saveWhoAction}
        submit="Continue"
        defaultValue={known}
        hidden={{ slug, ...(fromCheck && { from: 'check' }) }}
      >
        <WhoFields firstDay={sayDay(programme.camp.startsOn)} />
      </ActionForm>
    </StepFrame>
  );
}
