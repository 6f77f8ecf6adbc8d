import type { Minor } from '../shared/money';

/** The lowest price of a place, and whether another track costs more. Null while no price is set. */
export function priceFrom(
  camp: { price: Minor | null },
  tracks: readonly { price: Minor | null }[],
): { price: Minor; varies: boolean } | null {
  const prices = (tracks.length > 0 ? tracks.map(({ price }) => price ?? camp.price) : [camp.price]).filter(
    (price) => price !== null,
  );
  const [first, ...others] = prices.sort((a, b) => a - b);
  return first === undefined ? null : { price: first, varies: others.some((price) => price !== first) };
}
