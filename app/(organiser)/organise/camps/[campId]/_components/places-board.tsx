import { TenHoleStrip } from '@/components/harp/ten-hole-strip';
import type { Scarce } from '@/lib/domain/camp/scarcest-first';
import { listWords } from '@/lib/domain/shared/list-words';

const GROUPS = [
  { kind: 'track', title: 'Tracks' },
  { kind: 'elective', title: 'Electives with a limit' },
] as const;

/** Places left: what runs out first on top and large, then the camp, its tracks and electives, scarcest first. */
export function PlacesBoard({ scarce }: { scarce: readonly Scarce[] }) {
  const whole = scarce.find(({ kind }) => kind === 'camp');
  const full = scarce.filter(({ kind, places }) => kind !== 'camp' && places.left === 0);
  const next = scarce.find(({ places }) => places.left > 0);
  return (
    <>
      <div className="grid gap-x-10 gap-y-6 md:grid-cols-2">
        {whole && <Big {...whole} words={whole.places.left > 0 ? whole.name : 'The whole camp is full'} />}
        {next && next.kind !== 'camp' && <Big {...next} words={`${next.name} runs out next`} />}
      </div>
      {full.length > 0 && (
        <p className="mt-4 font-semibold text-reed">Full: {listWords(full.map(({ name }) => name))}.</p>
      )}
      {GROUPS.map(({ kind, title }) => {
        const rows = scarce.filter((row) => row.kind === kind);
        return (
          rows.length > 0 && (
            <div key={kind}>
              <h3 className="mb-2 mt-6">{title}</h3>
              <ul className="grid gap-x-10 border-t border-line md:grid-cols-2">
                {rows.map((row) => (
                  <li
                    key={row.name}
                    className="grid grid-cols-[minmax(0,1fr)_9rem] items-center gap-x-4 border-b border-line py-1.5"
                  >
                    <span className="min-w-0">
                      <span className="block break-words">{row.name}</span>
                      <PlacesLine {...row} />
                    </span>
                    <TenHoleStrip
                      mode="places"
                      left={row.places.left}
                      of={row.places.capacity}
                      what={row.name}
                    />
                  </li>
                ))}
              </ul>
            </div>
          )
        );
      })}
    </>
  );
}

function Big({ words, ...row }: Scarce & { words: string }) {
  return (
    <div>
      <p className="font-semibold">{words}</p>
      <TenHoleStrip
        mode="places"
        left={row.places.left}
        of={row.places.capacity}
        what={row.name}
        className="my-2"
      />
      <PlacesLine {...row} />
    </div>
  );
}

const PlacesLine = ({ places }: Pick<Scarce, 'places'>) => (
  <span className="block text-small text-soft">
    <span className="figures font-bold text-ink">{places.left}</span> left ·{' '}
    <span className="figures">{places.taken}</span> of <span className="figures">{places.capacity}</span>{' '}
    taken
  </span>
);
