import { placesWords } from '@/lib/domain/camp/places-words';
import { filledHoles, HOLES } from '../harp/filled-holes';
import { StripHoles } from '../harp/strip-holes';

type PlacesLeftProps = { left: number; of: number };

/** Places left in words, over a strip whose holes fill from the left as they sell. */
export function PlacesLeft({ left, of }: PlacesLeftProps) {
  const filled = filledHoles(left, of);
  return (
    <span className="block max-w-60">
      <StripHoles looks={Array.from({ length: HOLES }, (_, hole) => (hole < filled ? 'filled' : 'open'))} />
      <span className="mt-1.5 block font-semibold">{placesWords({ left, of })}</span>
    </span>
  );
}
