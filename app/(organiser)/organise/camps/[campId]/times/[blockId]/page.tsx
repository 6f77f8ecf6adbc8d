import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PageHead } from '@/components/ui/page-head';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { DeleteBox } from '../../../../../_components/delete-box';
import { BlockForm } from '../_components/block-form';
import { deleteBlockAction } from '../actions';

export const metadata: Metadata = { title: 'Time of day' };

export default async function BlockPage({ params }: PageProps<'/organise/camps/[campId]/times/[blockId]'>) {
  const { campId, blockId } = await params;
  const { camp } = await requireCamp(campId, 'camp.edit');
  const block = loadProgramme(camp.id)?.blocks.find(({ id }) => id === blockId) ?? notFound();
  const { id, starts, ends, label } = block;
  return (
    <>
      <PageHead
        over={`${camp.name} · Time of day`}
        title={`${starts}–${ends}`}
        lead="Meetings that are placed keep their own times; move them in the timetable."
      />
      <BlockForm campId={camp.id} blockId={id} defaultValue={{ starts, ends, label }} />
      <DeleteBox what="this time" action={deleteBlockAction} hidden={{ campId: camp.id, blockId: id }}>
        The row goes from the grid. Meetings that are placed keep their times.
      </DeleteBox>
    </>
  );
}
