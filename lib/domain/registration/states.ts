/** held: reserved until a time, unpaid · confirmed: deposit or full price paid. */
export const REGISTRATION_STATES = [
  'held',
  'confirmed',
  'waitlisted',
  'offered',
  'cancelled',
  'transferred',
  'expired',
] as const;
export type RegistrationState = (typeof REGISTRATION_STATES)[number];

/** The states that use up a place. */
export const SEATED_STATES = ['held', 'confirmed', 'offered'] as const satisfies readonly RegistrationState[];

export const STATE_WORDS = {
  held: 'Held',
  confirmed: 'Confirmed',
  waitlisted: 'Waitlisted',
  offered: 'Offered',
  cancelled: 'Cancelled',
  transferred: 'Transferred',
  expired: 'Expired',
} satisfies Record<RegistrationState, string>;
