import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';
import { formatMoney } from '@/lib/domain/shared/money';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { TrackForm } from '../_components/track-form';

export const metadata: Metadata = { title: 'Add a track' };

export default async function NewTrackPage({ params }: PageProps<'/organise/camps/[campId]/tracks/new'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  return (
    <>
      <PageHead over={camp.name} title="Add a track" />
      <TrackForm
        campId={camp.id}
        taken={0}
        campPrice={camp.price === null ? null : formatMoney(camp.price, camp.currency)}
      />
    </>
  );
}
