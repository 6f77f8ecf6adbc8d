import { err, ok, type Result } from '../shared/result';
import type { RegistrationState } from './states';

/** What can happen to an order and to each registration in it. */
export const REGISTRATION_EVENTS = [
  /** Places are reserved until a time. */
  'hold',
  /** Paid, or nothing to pay. */
  'confirm',
  /** The time of the hold, or of an offer, ran out unpaid. */
  'lapse',
  /** Paid after the hold ran out, and a place was left. */
  'seat-again',
  /** Given up before or after paying. */
  'cancel',
  /** Wants a place where none is left. */
  'wait',
  /** A place came free for the next in line. */
  'offer',
  /** Given to another person. */
  'transfer',
] as const;
export type RegistrationEvent = (typeof REGISTRATION_EVENTS)[number];

/** `new` is before the first row is written. What is not here is refused. */
export const TRANSITIONS = {
  new: { hold: 'held', confirm: 'confirmed', wait: 'waitlisted' },
  held: { confirm: 'confirmed', lapse: 'expired', cancel: 'cancelled' },
  waitlisted: { offer: 'offered', cancel: 'cancelled' },
  offered: { hold: 'held', confirm: 'confirmed', lapse: 'expired', cancel: 'cancelled' },
  confirmed: { cancel: 'cancelled', transfer: 'transferred' },
  expired: { 'seat-again': 'confirmed' },
  cancelled: {},
  transferred: {},
} as const satisfies Record<RegistrationState | 'new', Partial<Record<RegistrationEvent, RegistrationState>>>;

export type IllegalTransition = {
  code: 'illegal_transition';
  from: RegistrationState | 'new';
  event: RegistrationEvent;
};

/** The state after an event, or a refusal: nothing moves that the table does not name. */
export function transition(
  from: RegistrationState | 'new',
  event: RegistrationEvent,
): Result<RegistrationState, IllegalTransition> {
  const ways: Partial<Record<RegistrationEvent, RegistrationState>> = TRANSITIONS[from];
  const to = ways[event];
  return to ? ok(to) : err({ code: 'illegal_transition', from, event });
}
