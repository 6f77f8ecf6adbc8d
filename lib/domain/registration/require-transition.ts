import type { RegistrationState } from './states';
import { type RegistrationEvent, transition } from './transitions';

/** For callers that have checked already: an illegal move there is a bug, so it throws. */
export function requireTransition(
  from: RegistrationState | 'new',
  event: RegistrationEvent,
): RegistrationState {
  const moved = transition(from, event);
  if (!moved.ok) throw new Error(`A registration cannot go by "${event}" from "${from}"`);
  return moved.value;
}
