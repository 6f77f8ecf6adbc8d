import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { WorkshopForm } from '../_components/workshop-form';

export const metadata: Metadata = { title: 'Add a workshop' };

export default async function NewWorkshopPage({
  params,
}: PageProps<'/organise/camps/[campId]/workshops/new'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  const programme = loadProgramme(camp.id);
  if (!programme) return null;
  return (
    <>
      <PageHead over={camp.name} title="Add a workshop" />
      <WorkshopForm
        campId={camp.id}
        tracks={programme.tracks}
        instructors={programme.instructors}
        defaultValue={{ lengthMinutes: '75' }}
      />
    </>
  );
}
