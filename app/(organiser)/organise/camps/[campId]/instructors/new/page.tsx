import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { listLinkable } from '@/lib/server/instructors/list-linkable';
import { InstructorForm } from '../_components/instructor-form';

export const metadata: Metadata = { title: 'Add an instructor' };

export default async function NewInstructorPage({
  params,
}: PageProps<'/organise/camps/[campId]/instructors/new'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  return (
    <>
      <PageHead over={camp.name} title="Add an instructor" />
      <InstructorForm
        campId={camp.id}
        organisationId={camp.organisationId}
        accounts={listLinkable(camp.organisationId)}
      />
    </>
  );
}
