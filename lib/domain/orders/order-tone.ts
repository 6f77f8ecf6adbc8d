import type { RegistrationState } from '../registration/states';

/** Which mark goes with a state's word. */
const TONES = {
  held: 'wait',
  confirmed: 'done',
  waitlisted: 'wait',
  offered: 'open',
  cancelled: 'off',
  transferred: 'off',
  expired: 'stop',
} as const satisfies Record<RegistrationState, 'done' | 'open' | 'wait' | 'stop' | 'off'>;

export const orderTone = (state: RegistrationState) => TONES[state];
