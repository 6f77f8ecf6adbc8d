import type { CampState, RoomLoudness, TrackLevel } from '../camp/camp-words';
import type { HarpNeed } from '../harp/harp-ask';
import type {
  CampId,
  InstructorId,
  MeetingId,
  OrganisationId,
  RoomId,
  TrackId,
  WorkshopId,
} from '../shared/ids';
import type { Minor } from '../shared/money';
import type { WorkshopAudience, WorkshopKind } from './workshop-words';

/** A camp's whole programme as plain data; what the public page, the grid, the checks and the packing list read. */
export type Programme = {
  camp: ProgrammeCamp;
  tracks: ProgrammeTrack[];
  rooms: ProgrammeRoom[];
  instructors: { id: InstructorId; name: string; bio: string }[];
  workshops: ProgrammeWorkshop[];
  meetings: ProgrammeMeeting[];
  blocks: { id: string; starts: string; ends: string; label: string }[];
  pictures: { id: string; alt: string; width: number; height: number }[];
};

export type ProgrammeCamp = {
  id: CampId;
  organisationId: OrganisationId;
  organisationName: string;
  organisationEmail: string;
  slug: string;
  name: string;
  summary: string;
  description: string;
  startsOn: string;
  endsOn: string;
  timeZone: string;
  currency: string;
  venueName: string;
  venueAddress: string;
  capacity: number;
  price: Minor | null;
  refundTerms: string;
  arrivalFrom: string;
  state: CampState;
  version: number;
  updatedAt: number;
};

export type ProgrammeTrack = {
  id: TrackId;
  name: string;
  level: TrackLevel;
  gate: string;
  capacity: number;
  price: Minor | null;
};

export type ProgrammeRoom = { id: RoomId; name: string; seats: number; loudness: RoomLoudness; kit: string };

export type ProgrammeWorkshop = {
  id: WorkshopId;
  title: string;
  description: string;
  kind: WorkshopKind;
  audience: WorkshopAudience;
  lengthMinutes: number;
  /** Null is as many as the room seats. */
  capacity: number | null;
  trackIds: TrackId[];
  instructorIds: InstructorId[];
  needs: HarpNeed[];
};

export type ProgrammeMeeting = {
  id: MeetingId;
  workshopId: WorkshopId;
  roomId: RoomId;
  /** Wall time in the camp's zone: ISO date, HH:MM, minutes. */
  day: string;
  starts: string;
  lengthMinutes: number;
  sequence: number;
  updatedAt: number;
};
