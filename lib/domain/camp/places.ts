import type { TrackId, WorkshopId } from '../shared/ids';

export type Places = { capacity: number; taken: number; left: number };

export type CampPlaces = {
  camp: Places;
  tracks: { id: TrackId; places: Places }[];
  /** By their own limit, else the seats of their smallest room; those with neither are left out. */
  electives: { id: WorkshopId; places: Places }[];
};
