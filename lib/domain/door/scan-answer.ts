import type { RegistrationId } from '../shared/ids';
import type { DoorVerdict } from './decide-arrival';

/** What the door's screen shows after a scan. A person of another camp is named by the camp only. */
export type ScanAnswer = {
  verdict: DoorVerdict;
  person: {
    registrationId: RegistrationId;
    name: string;
    track: string;
    minor: boolean;
    /** There is a diet or access note; the door learns that, never what it says. */
    hasNeeds: boolean;
    /** In words with its currency; null when nothing is due. */
    due: string | null;
    /** HH:MM in the camp's zone, by the server's clock. */
    arrivedAt: string | null;
    arrivedBy: string | null;
  } | null;
  otherCamp: string | null;
};
