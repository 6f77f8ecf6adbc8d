import type { ReactNode } from 'react';
import { HarpName } from '@/components/harp/harp-name';
import { DueWords } from '@/components/orders/due-words';
import { RegistrationStateMark } from '@/components/orders/registration-state-mark';
import { ARRIVAL_WORDS } from '@/lib/domain/door/arrival-states';
import type { PeopleSort } from '@/lib/domain/people/people-query';
import type { PeopleRow } from '@/lib/domain/people/people-row';
import { sayInstant } from '@/lib/domain/shared/say-date';
import { PersonLink } from './person-link';

type With = { campId: string; timeZone: string; onOpen: (registrationId: string) => void };
export type PeopleColumn = {
  id: string;
  head: string;
  /** The server can order by it. */
  sort?: PeopleSort;
  /** Shown until the person chooses otherwise. */
  usual: boolean;
  phone?: boolean;
  /** Aligned to the right: figures. */
  end?: boolean;
  cell: (row: PeopleRow, by: With) => ReactNode;
};

export const PEOPLE_COLUMNS: readonly PeopleColumn[] = [
  {
    id: 'name',
    head: 'Name',
    sort: 'name',
    usual: true,
    phone: true,
    cell: (row, by) => <PersonLink row={row} {...by} />,
  },
  { id: 'track', head: 'Track', sort: 'track', usual: true, cell: (row) => row.track },
  {
    id: 'state',
    head: 'State',
    sort: 'state',
    usual: true,
    phone: true,
    cell: (row) => <RegistrationStateMark state={row.state} />,
  },
  { id: 'arrival', head: 'Arrival', sort: 'arrival', usual: true, cell: (row) => ARRIVAL_WORDS[row.arrival] },
  {
    id: 'due',
    head: 'Order due',
    sort: 'due',
    usual: true,
    phone: true,
    end: true,
    cell: ({ due, currency }) => <DueWords due={due} currency={currency} />,
  },
  {
    id: 'order',
    head: 'Order',
    sort: 'order',
    usual: true,
    cell: (row) => <span className="figures">{row.reference}</span>,
  },
  {
    id: 'email',
    head: 'E-mail',
    usual: false,
    cell: (row) => <span className="break-all">{row.email}</span>,
  },
  {
    id: 'payer',
    head: 'Payer',
    usual: false,
    cell: (row) => (
      <>
        <span className="block break-words">{row.payer}</span>
        <span className="block break-all text-small text-soft">{row.payerEmail}</span>
      </>
    ),
  },
  { id: 'electives', head: 'Electives', usual: false, cell: (row) => row.electives.join(', ') || 'none' },
  {
    id: 'harps',
    head: 'Harps owned',
    usual: false,
    cell: (row) => (row.harps.length > 0 ? <HarpName>{row.harps.join(', ')}</HarpName> : 'none'),
  },
  {
    id: 'registered',
    head: 'Registered',
    sort: 'registered',
    usual: false,
    cell: (row, { timeZone }) => <time>{sayInstant(row.registeredAt, timeZone)}</time>,
  },
];
