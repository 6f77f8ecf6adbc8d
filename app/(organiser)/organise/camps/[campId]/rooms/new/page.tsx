import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { RoomForm } from '../_components/room-form';

export const metadata: Metadata = { title: 'Add a room' };

export default async function NewRoomPage({ params }: PageProps<'/organise/camps/[campId]/rooms/new'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  return (
    <>
      <PageHead over={camp.name} title="Add a room" />
      <RoomForm campId={camp.id} />
    </>
  );
}
