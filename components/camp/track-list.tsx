import { LEVEL_WORDS } from '@/lib/domain/camp/camp-words';
import { type TrackHarps as TrackHarpsById, trackHarps } from '@/lib/domain/packing/track-harps';
import { formatMoney } from '@/lib/domain/shared/money';
import type { Programme, ProgrammeTrack } from '@/lib/domain/timetable/programme';
import { PlacesSpot } from './places-spot';
import { TrackHarps } from './track-harps';

type TrackListProps = {
  programme: Programme;
  harps?: TrackHarpsById;
  places: readonly { id: string; places: { left: number; capacity: number } }[];
};

/** Every track: what it asks of a player, what it leaves free, and the harps it takes. */
export function TrackList({ programme, harps, places }: TrackListProps) {
  const { camp, tracks } = programme;
  return (
    <ol className="divide-y divide-edge border-y border-edge">
      {tracks.map((track) => {
        const seats = places.find(({ id }) => id === track.id)?.places;
        return (
          <li key={track.id} className="grid gap-x-8 gap-y-4 py-6 sm:grid-cols-[minmax(0,1fr)_13rem]">
            <div className="min-w-0">
              <h3 className="break-words">{track.name}</h3>
              <p className="mt-1 font-semibold text-soft">Level: {LEVEL_WORDS[track.level]}</p>
              {track.gate && (
                <p className="mt-2 max-w-prose break-words">
                  <span className="font-semibold">For you if: </span>
                  {track.gate}
                </p>
              )}
              <TrackHarps track={track} list={harps?.get(track.id) ?? trackHarps(programme, track.id)} />
            </div>
            <div className="space-y-2">
              {seats && (
                <PlacesSpot slug={camp.slug} trackId={track.id} left={seats.left} of={seats.capacity} />
              )}
              <TrackPrice track={track} camp={camp} />
            </div>
          </li>
        );
      })}
    </ol>
  );
}

function TrackPrice({ track, camp }: { track: ProgrammeTrack; camp: Programme['camp'] }) {
  const price = track.price ?? camp.price;
  if (price === null) return null;
  return <p className="figures">{formatMoney(price, camp.currency)}</p>;
}
