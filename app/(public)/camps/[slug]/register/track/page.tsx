import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { Notice } from '@/components/ui/notice';
import { stepPath } from '@/lib/domain/registration/step-path';
import { openStep } from '@/lib/server/registration/open-step';
import { StepFrame } from '../_components/step-frame';
import { TrackFields } from '../_components/track-fields';
import { saveTrackAction } from '../actions';

export const metadata: Metadata = { title: 'Register: track and electives', robots: { index: false } };

export default async function TrackPage({ params, searchParams }: PageProps<'/camps/[slug]/register/track'>) {
  const { slug } = await params;
  const { from, full, clash } = await searchParams;
  const { programme, places, answers } = await openStep(slug, 'track');
  const fullName = [
    ...programme.tracks.map(({ id, name }) => ({ id: id as string, name })),
    ...programme.workshops.map(({ id, title }) => ({ id: id as string, name: title })),
  ].find(({ id }) => id === full)?.name;
  return (
    <StepFrame
      camp={programme.camp}
      step="track"
      lead={
        <p>A track is the group you learn with all week. Take the one whose line you can truly play today.</p>
      }
      back={stepPath(slug, from === 'check' ? 'check' : 'who')}
    >
      {fullName && (
        <Notice tone="stop" title={`${fullName} filled up while you were answering`} live>
          Choose another below. Everything else you answered is kept.
        </Notice>
      )}
      {clash && (
        <Notice tone="stop" title="The timetable changed while you were answering" live>
          Two of your choices now meet at the same time. Take one out below.
        </Notice>
      )}
      <ActionForm
        action={saveTrackAction}
        submit="Continue"
        defaultValue={{ trackId: answers.track?.trackId, electives: answers.track?.electives ?? [] }}
        hidden={{ slug, ...(from === 'check' && { from: 'check' }) }}
      >
        <TrackFields programme={programme} places={places} />
      </ActionForm>
    </StepFrame>
  );
}
