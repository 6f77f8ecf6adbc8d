import type { TrackId, WorkshopId } from '../shared/ids';

export type WhoAnswer = {
  attendeeName: string;
  attendeeEmail: string;
  /** Whether the attendee pays, or somebody else whose name and address follow. */
  payer: 'attendee' | 'other';
  payerName: string;
  payerEmail: string;
  /** Under 18 on the first day. Asked as such: a birth date would be more than the camp needs. */
  minor: boolean;
};

export type TrackAnswer = { trackId: TrackId; electives: WorkshopId[] };

/** Canonical harp ids; an empty list is an answer too. */
export type HarpsAnswer = { harpIds: string[] };

export type NeedsAnswer = {
  diet: string;
  access: string;
  emergencyName: string;
  /** E.164, as is the guardian's. */
  emergencyPhone: string;
  guardianName: string;
  guardianEmail: string;
  guardianPhone: string;
  consent: boolean;
};

/** What a person has answered so far; a missing key is a step not done. */
export type Answers = {
  who?: WhoAnswer;
  track?: TrackAnswer;
  harps?: HarpsAnswer;
  needs?: NeedsAnswer;
};

export type CompleteAnswers = Required<Answers>;

/** What the organiser's consent record keeps, word for word. */
export const CONSENT_TEXT =
  'I am the parent or guardian of this attendee. I agree that they take part in this camp, and I can be reached on this phone while it runs.';
