import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { AddHarp } from '@/components/harp/add-harp';
import { HarpChoices } from '@/components/harp/harp-choices';
import { COMMON_HARPS } from '@/lib/domain/harp/common-harps';
import { compareHarps } from '@/lib/domain/harp/compare-harps';
import { harpId, parseHarpId } from '@/lib/domain/harp/harp-id';
import { stepPath } from '@/lib/domain/registration/step-path';
import { openStep } from '@/lib/server/registration/open-step';
import { StepFrame } from '../_components/step-frame';
import { saveHarpsAction } from '../actions';

export const metadata: Metadata = { title: 'Register: harps you own', robots: { index: false } };

export default async function HarpsPage({ params, searchParams }: PageProps<'/camps/[slug]/register/harps'>) {
  const { slug } = await params;
  const { from } = await searchParams;
  const { programme, answers } = await openStep(slug, 'harps');
  const owned = answers.harps?.harpIds ?? [];
  const others = owned
    .flatMap((id) => parseHarpId(id) ?? [])
    .sort(compareHarps)
    .map(harpId)
    .filter((id) => !COMMON_HARPS.includes(id));
  return (
    <StepFrame
      camp={programme.camp}
      step="harps"
      lead={
        <p>
          So that your packing list says which of your own to bring, and which you still need or can borrow.
        </p>
      }
      back={stepPath(slug, from === 'check' ? 'check' : 'track')}
    >
      <ActionForm
        // A harp that was added is one more choice: the form begins afresh with it ticked.
        key={owned.join()}
        action={saveHarpsAction}
        submit="Continue"
        defaultValue={{ harpIds: owned, addTuning: 'natural-minor', addRegister: 'standard' }}
        hidden={{ slug, ...(from === 'check' && { from: 'check' }) }}
      >
        {/* Enter in a tick box sends by the first button of a form; that must be "Continue", not "Add". */}
        <button type="submit" className="sr-only" tabIndex={-1} aria-hidden="true">
          Continue
        </button>
        <HarpChoices common={COMMON_HARPS} others={others} />
        <AddHarp />
      </ActionForm>
    </StepFrame>
  );
}
