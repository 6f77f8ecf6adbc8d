import { ChoiceField } from '@/components/forms/choice-field';
import { LEVEL_WORDS } from '@/lib/domain/camp/camp-words';
import type { CampPlaces } from '@/lib/domain/camp/places';
import { formatMoney } from '@/lib/domain/shared/money';
import type { Programme } from '@/lib/domain/timetable/programme';
import { ElectiveHint } from './elective-hint';

const leftWords = (left: number, of: string): string =>
  left === 0 ? `Full: no ${of} left` : `${left} ${left === 1 ? of.replace(/s$/, '') : of} left`;

/** Tracks with gate, price and places left; electives with their times. What is full says so and cannot be taken. */
export function TrackFields({ programme, places }: { programme: Programme; places: CampPlaces }) {
  const { camp, tracks, workshops, meetings } = programme;
  const left = new Map(
    [...places.tracks, ...places.electives].map((of) => [of.id as string, of.places.left]),
  );
  const electives = workshops.filter(({ audience }) => audience === 'elective');
  return (
    <>
      <ChoiceField
        name="trackId"
        legend="Your track"
        type="radio"
        choices={tracks.map((track) => {
          const price = track.price ?? camp.price;
          const seats = Math.min(left.get(track.id) ?? 0, places.camp.left);
          return {
            value: track.id,
            label: `${track.name} (${LEVEL_WORDS[track.level]})`,
            disabled: seats === 0,
            hint: (
              <>
                {track.gate && <span className="block text-ink">Asked of you: {track.gate}</span>}
                <span className="block">
                  {price !== null && <span className="figures">{formatMoney(price, camp.currency)}</span>}
                  {price !== null && ' · '}
                  {leftWords(seats, 'places')}
                </span>
              </>
            ),
          };
        })}
      />
      {electives.length > 0 && (
        <ChoiceField
          name="electives"
          legend="Electives"
          type="checkbox"
          hint="As many as you like, or none. Two that meet at the same time cannot both be taken."
          choices={electives.map((workshop) => {
            const seats = left.get(workshop.id);
            return {
              value: workshop.id,
              label: workshop.title,
              disabled: seats === 0,
              hint: (
                <ElectiveHint
                  workshop={workshop}
                  meetings={meetings.filter(({ workshopId }) => workshopId === workshop.id)}
                  seats={seats === undefined ? null : leftWords(seats, 'seats')}
                />
              ),
            };
          })}
        />
      )}
    </>
  );
}
