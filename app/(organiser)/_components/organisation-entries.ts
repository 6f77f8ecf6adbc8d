import type { Route } from 'next';
import type { RailEntry } from '@/components/ui/rail-link';
import type { Actor } from '@/lib/domain/access/actor';
import { can } from '@/lib/domain/access/can';
import type { OrganisationId } from '@/lib/domain/shared/ids';

/** What of an organisation the actor's roles open. Each page asks again for itself. */
export function organisationEntries(actor: Actor, organisationId: OrganisationId): RailEntry[] {
  const base = `/organise/organisations/${organisationId}`;
  const open: RailEntry[] = [{ href: base as Route, word: 'Camps', exact: true }];
  if (can(actor, 'camp.create', { organisationId }))
    open.push({ href: `${base}/camps/new` as Route, word: 'New camp' });
  if (can(actor, 'staff.manage', { organisationId }))
    open.push({ href: `${base}/staff` as Route, word: 'Staff' });
  if (can(actor, 'organisation.edit', { organisationId }))
    open.push({ href: `${base}/details` as Route, word: 'Details' });
  return open;
}
