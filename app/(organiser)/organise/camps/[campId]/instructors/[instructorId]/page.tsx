import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PageHead } from '@/components/ui/page-head';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { listInstructors } from '@/lib/server/instructors/list-instructors';
import { listLinkable } from '@/lib/server/instructors/list-linkable';
import { DeleteBox } from '../../../../../_components/delete-box';
import { InstructorForm } from '../_components/instructor-form';
import { deleteInstructorAction } from '../actions';

export const metadata: Metadata = { title: 'Instructor' };

export default async function InstructorPage({
  params,
}: PageProps<'/organise/camps/[campId]/instructors/[instructorId]'>) {
  const { campId, instructorId } = await params;
  const { camp } = await requireCamp(campId, 'camp.edit');
  const { id, name, bio, account } =
    listInstructors(camp.id).find((row) => row.id === instructorId) ?? notFound();
  const linkable = listLinkable(camp.organisationId);
  // A link made before the role ended is still shown, so that saving does not drop it unseen.
  const accounts =
    account && !linkable.some((row) => row.id === account.id) ? [account, ...linkable] : linkable;
  return (
    <>
      <PageHead over={`${camp.name} · Instructor`} title={name} />
      <InstructorForm
        campId={camp.id}
        organisationId={camp.organisationId}
        instructorId={id}
        accounts={accounts}
        defaultValue={{ name, bio, userId: account?.id }}
      />
      <DeleteBox
        what="this instructor"
        action={deleteInstructorAction}
        hidden={{ campId: camp.id, instructorId: id }}
      />
    </>
  );
}
