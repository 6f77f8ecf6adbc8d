import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PageHead } from '@/components/ui/page-head';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { DeleteBox } from '../../../../../_components/delete-box';
import { RoomForm } from '../_components/room-form';
import { deleteRoomAction } from '../actions';

export const metadata: Metadata = { title: 'Room' };

export default async function RoomPage({ params }: PageProps<'/organise/camps/[campId]/rooms/[roomId]'>) {
  const { campId, roomId } = await params;
  const { camp } = await requireCamp(campId, 'camp.edit');
  const room = loadProgramme(camp.id)?.rooms.find(({ id }) => id === roomId) ?? notFound();
  return (
    <>
      <PageHead over={`${camp.name} · Room`} title={room.name} />
      <RoomForm
        campId={camp.id}
        roomId={room.id}
        defaultValue={{ name: room.name, seats: room.seats, loudness: room.loudness, kit: room.kit }}
      />
      <DeleteBox what="this room" action={deleteRoomAction} hidden={{ campId: camp.id, roomId: room.id }} />
    </>
  );
}
