import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { LOUDNESS_WORDS } from '@/lib/domain/camp/camp-words';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { DoneNotice } from '../../../../_components/done-notice';
import { MoveButtons } from '../../../../_components/move-buttons';

export const metadata: Metadata = { title: 'Rooms' };

export default async function RoomsPage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/rooms'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  const rooms = loadProgramme(camp.id)?.rooms ?? [];
  const base = `/organise/camps/${camp.id}/rooms`;
  const add = (
    <ButtonLink tone="primary" href={`${base}/new` as Route}>
      Add a room
    </ButtonLink>
  );
  return (
    <>
      <DoneNotice done={(await searchParams).done} />
      <PageHead
        over={camp.name}
        title="Rooms"
        lead="The lanes of the timetable, in this order."
        actions={rooms.length > 0 && add}
      />
      {rooms.length === 0 && (
        <Empty title="No rooms yet">
          <p>Meetings need somewhere to meet. A porch counts.</p>
          <p className="mt-4">{add}</p>
        </Empty>
      )}
      <ol className={rooms.length > 0 ? '-mt-6' : 'hidden'}>
        {rooms.map((room, at) => (
          <li
            key={room.id}
            className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-8 gap-y-1 border-b border-line py-3 md:grid-cols-[minmax(0,1fr)_8rem_10rem_auto] md:items-center"
          >
            <div className="min-w-0">
              <Link
                href={`${base}/${room.id}` as Route}
                className="inline-flex min-h-target items-center break-words font-head text-h3 font-bold"
              >
                {room.name}
              </Link>
              {room.kit && <p className="break-words text-soft">{room.kit}</p>}
            </div>
            <p className="col-start-1 md:col-start-auto">
              <span className="figures">{room.seats}</span> seats
            </p>
            <p className="col-start-1 md:col-start-auto">{LOUDNESS_WORDS[room.loudness]}</p>
            <div className="col-start-2 row-span-3 row-start-1 md:col-start-auto md:row-span-1 md:row-start-auto">
              <MoveButtons
                campId={camp.id}
                list="rooms"
                id={room.id}
                name={room.name}
                first={at === 0}
                last={at === rooms.length - 1}
              />
            </div>
          </li>
        ))}
      </ol>
    </>
  );
}
