import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PageHead } from '@/components/ui/page-head';
import { formatMoney } from '@/lib/domain/shared/money';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { priceText } from '@/lib/server/camps/read-price';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { rowMark } from '@/lib/server/camps/row-mark';
import { countPlaces } from '@/lib/server/registration/count-places';
import { DeleteBox } from '../../../../../_components/delete-box';
import { TrackForm } from '../_components/track-form';
import { deleteTrackAction } from '../actions';

export const metadata: Metadata = { title: 'Track' };

export default async function TrackPage({ params }: PageProps<'/organise/camps/[campId]/tracks/[trackId]'>) {
  const { campId, trackId } = await params;
  const { camp } = await requireCamp(campId, 'camp.edit');
  const track = loadProgramme(camp.id)?.tracks.find(({ id }) => id === trackId) ?? notFound();
  const places = countPlaces(camp.id)?.tracks.find(({ id }) => id === trackId)?.places;
  return (
    <>
      <PageHead over={`${camp.name} · Track`} title={track.name} />
      <TrackForm
        campId={camp.id}
        trackId={track.id}
        seen={rowMark(track)}
        taken={places?.taken ?? 0}
        campPrice={camp.price === null ? null : formatMoney(camp.price, camp.currency)}
        defaultValue={{
          name: track.name,
          level: track.level,
          gate: track.gate,
          capacity: track.capacity,
          price: priceText(track.price, camp.currency),
        }}
      />
      <DeleteBox
        what="this track"
        action={deleteTrackAction}
        hidden={{ campId: camp.id, trackId: track.id }}
      />
    </>
  );
}
