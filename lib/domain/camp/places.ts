import type { TrackId, WorkshopId } from '../shared/ids';

export type Places = { capacity: number; taken: number; left: number };

export type CampPlaces = {
  camp: Places;
  tracks: { id: TrackId; places: Places }[];
  /** Electives with a limit of their own; those without are left out. */
  electives: { id: WorkshopId; places: Places }[];
};
