import type { CampPlaces, Places } from './places';

export type Scarce = { kind: 'camp' | 'track' | 'elective'; name: string; places: Places };

/**
 * Everything that can run out, the one that does so first on top. A track has no more left than the camp. The camp
 * comes before its tracks where they are level.
 */
export function scarcestFirst(
  places: CampPlaces,
  names: {
    tracks: readonly { id: string; name: string }[];
    workshops: readonly { id: string; title: string }[];
  },
): Scarce[] {
  const left = (own: Places): Places => ({ ...own, left: Math.min(own.left, places.camp.left) });
  const nameOf = (id: string): string =>
    names.tracks.find((row) => row.id === id)?.name ??
    names.workshops.find((row) => row.id === id)?.title ??
    id;
  const all: Scarce[] = [
    { kind: 'camp', name: 'The whole camp', places: places.camp },
    ...places.tracks.map(
      (row): Scarce => ({ kind: 'track', name: nameOf(row.id), places: left(row.places) }),
    ),
    ...places.electives.map(
      (row): Scarce => ({ kind: 'elective', name: nameOf(row.id), places: left(row.places) }),
    ),
  ];
  return all
    .map((scarce, at) => ({ scarce, at }))
    .sort((a, b) => a.scarce.places.left - b.scarce.places.left || a.at - b.at)
    .map(({ scarce }) => scarce);
}
