import type { ArrivalState } from '../door/arrival-states';
import type { RegistrationState } from '../registration/states';
import type { RegistrationId, TrackId } from '../shared/ids';
import type { Minor } from '../shared/money';

/** One attendee in a list: no health, no emergency contact. Times are epoch ms. */
export type PeopleRow = {
  id: RegistrationId;
  name: string;
  /** Under age: the word only; a guardian's details are asked for apart. */
  minor: boolean;
  email: string;
  trackId: TrackId;
  track: string;
  state: RegistrationState;
  arrival: ArrivalState;
  reference: string;
  payer: string;
  payerEmail: string;
  /** Of the whole order, which may be for several people; negative is to be given back. */
  due: Minor;
  currency: string;
  registeredAt: number;
  electives: string[];
  /** Labels, lowest harp first. */
  harps: string[];
};

export type PeoplePage = { rows: PeopleRow[]; total: number; page: number; pages: number };
