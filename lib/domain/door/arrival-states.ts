export const ARRIVAL_STATES = ['expected', 'arrived', 'left', 'no-show'] as const;
export type ArrivalState = (typeof ARRIVAL_STATES)[number];

export const ARRIVAL_WORDS = {
  expected: 'Expected',
  arrived: 'Arrived',
  left: 'Left',
  'no-show': 'No-show',
} satisfies Record<ArrivalState, string>;
