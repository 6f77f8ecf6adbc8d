import 'server-only';
import { ARRIVAL_WORDS } from '@/lib/domain/door/arrival-states';
import type { PeopleRow } from '@/lib/domain/people/people-row';
import { STATE_WORDS } from '@/lib/domain/registration/states';
import { localMinute } from '@/lib/domain/shared/local-time';
import { minor, plainMoney } from '@/lib/domain/shared/money';

export const CSV_HEAD = [
  'Name',
  'Under age',
  'E-mail',
  'Track',
  'State',
  'Arrival',
  'Electives',
  'Harps owned',
  'Order',
  'Payer',
  'Payer e-mail',
  'Currency',
  'Order total',
  'Order paid',
  'Order still to pay',
  'Order to give back',
] as const;

type Exported = Omit<PeopleRow, 'electives' | 'harps' | 'due'> & { due: number; total: number; paid: number };

/** One line. What is due is split into two columns, so that no amount begins with a minus sign, which is a formula's. */
export function csvRecord(row: Exported, electives: string[], harps: string[], timeZone: string): string[] {
  const money = (amount: number) => plainMoney(minor(amount), row.currency);
  return [
    row.name,
    row.minor ? 'yes' : 'no',
    row.email,
    row.track,
    STATE_WORDS[row.state],
    ARRIVAL_WORDS[row.arrival],
    electives.join('; '),
    harps.join('; '),
    row.reference,
    row.payer,
    row.payerEmail,
    row.currency,
    money(row.total),
    money(Math.max(0, row.paid)),
    money(Math.max(0, row.due)),
    money(Math.max(0, -row.due)),
    localMinute(row.registeredAt, timeZone),
  ];
}
