import type { Minor } from '../shared/money';
import type { PeopleRow } from './people-row';

/** One attendee with the order they stand on; no health, no emergency contact. */
export type PersonDetails = PeopleRow & {
  orderState: PeopleRow['state'];
  total: Minor;
  paid: Minor;
  arrivedAt: number | null;
  lines: { id: string; label: string; quantity: number; amount: Minor }[];
  /** Others on the same order. */
  others: { id: PeopleRow['id']; name: string; state: PeopleRow['state'] }[];
  refunds: {
    id: string;
    amount: Minor;
    state: 'owed' | 'pending' | 'succeeded' | 'failed';
    reason: string;
  }[];
};
