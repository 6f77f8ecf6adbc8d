import type { RegistrationState } from '../registration/states';
import type { CampId } from '../shared/ids';
import type { ArrivalState } from './arrival-states';

export const DOOR_VERDICTS = [
  'arrived',
  'already',
  'other-camp',
  'cancelled',
  'not-confirmed',
  'consent-missing',
  'not-valid',
  'undone',
  'nothing-to-undo',
] as const;
export type DoorVerdict = (typeof DOOR_VERDICTS)[number];

/** What the door knows of the person, whether read on the server or from the roster on the device. */
export type DoorPerson = {
  campId: CampId;
  state: RegistrationState;
  arrival: ArrivalState;
  /** Under 18 and no guardian has agreed yet. */
  consentMissing: boolean;
};

/**
 * The verdict of one scan or name pick. `person` is null when the code is forged, unreadable, revoked or names nobody.
 * Two scans decide the same in either order: the first that is received arrives, the other is told already.
 */
export function decideArrival(campId: CampId, person: DoorPerson | null): DoorVerdict {
  if (!person) return 'not-valid';
  if (person.campId !== campId) return 'other-camp';
  if (person.state === 'cancelled' || person.state === 'transferred' || person.state === 'expired')
    return 'cancelled';
  if (person.state !== 'confirmed') return 'not-confirmed';
  if (person.arrival === 'arrived') return 'already';
  if (person.consentMissing) return 'consent-missing';
  return 'arrived';
}

/** An undo takes back an arrival and nothing else. */
export const decideUndo = (campId: CampId, person: DoorPerson | null): DoorVerdict =>
  person && person.campId === campId && person.arrival === 'arrived' ? 'undone' : 'nothing-to-undo';

/** One word or two, readable from two metres; a shape each, so that colour is never alone. */
export const VERDICT_WORDS = {
  arrived: { word: 'Arrived', shape: 'tick', next: 'Let them in.' },
  already: {
    word: 'Already in',
    shape: 'ring',
    next: 'They came in before. Ask their name if in doubt.',
  },
  'other-camp': { word: 'Other camp', shape: 'cross', next: 'The ticket is real, but for another camp.' },
  cancelled: {
    word: 'Cancelled',
    shape: 'cross',
    next: 'This place was given up. Send them to the organiser.',
  },
  'not-confirmed': {
    word: 'Not paid',
    shape: 'cross',
    next: 'No place is confirmed. Send them to the organiser.',
  },
  'consent-missing': {
    word: 'Wait',
    shape: 'bar',
    next: 'Under 18 and a guardian has not agreed yet. Call the organiser.',
  },
  'not-valid': { word: 'Not valid', shape: 'cross', next: 'This is no ticket of ours. Try their name.' },
  undone: { word: 'Undone', shape: 'bar', next: 'They count as expected again.' },
  'nothing-to-undo': { word: 'Nothing to undo', shape: 'ring', next: 'They were not marked as arrived.' },
} satisfies Record<DoorVerdict, { word: string; shape: 'tick' | 'ring' | 'cross' | 'bar'; next: string }>;
