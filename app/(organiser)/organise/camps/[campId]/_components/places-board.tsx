import { TenHoleStrip } from '@/components/harp/ten-hole-strip';
import type { Scarce } from '@/lib/domain/camp/scarcest-first';

/** Places left, what runs out first on top and large. */
export function PlacesBoard({ scarce }: { scarce: readonly Scarce[] }) {
  const [first, ...rest] = scarce;
  if (!first) return null;
  return (
    <>
      <div className="max-w-xl">
        <p className="font-semibold">{first.name} runs out first</p>
        <TenHoleStrip
          mode="places"
          left={first.places.left}
          of={first.places.capacity}
          what={first.name}
          className="my-2"
        />
        <PlacesLine {...first} />
      </div>
      {rest.length > 0 && (
        <ul className="mt-6 grid gap-x-10 gap-y-4 sm:grid-cols-2 xl:grid-cols-3">
          {rest.map((row) => (
            <li key={`${row.kind}-${row.name}`} className="border-t border-line pt-2">
              <p className="break-words">{row.name}</p>
              <TenHoleStrip
                mode="places"
                left={row.places.left}
                of={row.places.capacity}
                what={row.name}
                className="my-1 max-w-60"
              />
              <PlacesLine {...row} />
            </li>
          ))}
        </ul>
      )}
    </>
  );
}

const PlacesLine = ({ places }: Pick<Scarce, 'places'>) => (
  <p className="text-small text-soft">
    <span className="figures text-ink">{places.left}</span> left ·{' '}
    <span className="figures">{places.taken}</span> of <span className="figures">{places.capacity}</span>{' '}
    taken
  </p>
);
