import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { TenHoleStrip } from '@/components/harp/ten-hole-strip';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { LEVEL_WORDS } from '@/lib/domain/camp/camp-words';
import { formatMoney } from '@/lib/domain/shared/money';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { countPlaces } from '@/lib/server/registration/count-places';
import { DoneNotice } from '../../../../_components/done-notice';
import { MoveButtons } from '../../../../_components/move-buttons';

export const metadata: Metadata = { title: 'Tracks' };

export default async function TracksPage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/tracks'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  const tracks = loadProgramme(camp.id)?.tracks ?? [];
  const places = countPlaces(camp.id)?.tracks ?? [];
  const base = `/organise/camps/${camp.id}/tracks`;
  const add = (
    <ButtonLink tone="primary" href={`${base}/new` as Route}>
      Add a track
    </ButtonLink>
  );
  return (
    <>
      <DoneNotice done={(await searchParams).done} />
      <PageHead
        over={camp.name}
        title="Tracks"
        lead="A skill level’s group. Players see them in this order, with the gate each one asks for."
        actions={tracks.length > 0 && add}
      />
      {tracks.length === 0 && (
        <Empty title="No tracks yet">
          <p>Every player is in one. Begin with the lowest level.</p>
          <p className="mt-4">{add}</p>
        </Empty>
      )}
      <ol className={tracks.length > 0 ? '-mt-6' : 'hidden'}>
        {tracks.map((track, at) => {
          const own = places.find(({ id }) => id === track.id)?.places;
          return (
            <li
              key={track.id}
              className="grid gap-x-8 gap-y-2 border-b border-line py-4 md:grid-cols-[minmax(0,1fr)_12rem_auto] md:items-center"
            >
              <div className="min-w-0">
                <Link
                  href={`${base}/${track.id}` as Route}
                  className="inline-flex min-h-target items-center break-words font-head text-h3 font-bold"
                >
                  {track.name}
                </Link>
                <p className="text-soft">
                  {LEVEL_WORDS[track.level]}
                  {track.price !== null && (
                    <>
                      {' · '}
                      <span className="figures">{formatMoney(track.price, camp.currency)}</span>
                    </>
                  )}
                </p>
                <p className="max-w-prose break-words">{track.gate || <em>No gate yet.</em>}</p>
              </div>
              <div>
                <TenHoleStrip mode="places" left={own?.left ?? 0} of={track.capacity} what={track.name} />
                <p className="mt-1 text-small text-soft">
                  <span className="figures text-ink">{own?.left}</span> of{' '}
                  <span className="figures">{track.capacity}</span> places left
                </p>
              </div>
              <MoveButtons
                campId={camp.id}
                list="tracks"
                id={track.id}
                name={track.name}
                first={at === 0}
                last={at === tracks.length - 1}
              />
            </li>
          );
        })}
      </ol>
    </>
  );
}
