import type { Route } from 'next';
import type { RailEntry } from '@/components/ui/rail-link';
import type { Actor } from '@/lib/domain/access/actor';
import { can } from '@/lib/domain/access/can';
import type { Permission } from '@/lib/domain/access/permissions';
import type { CampId, OrganisationId } from '@/lib/domain/shared/ids';

type Entry = Omit<RailEntry, 'href'> & { at: string; needs: Permission };

const ENTRIES: readonly Entry[] = [
  { at: '', word: 'Overview', needs: 'camp.read', exact: true, near: true },
  { at: '/people', word: 'People', needs: 'people.read', near: true },
  { at: '/money', word: 'Money', needs: 'money.read', near: true },
  { at: '/timetable', word: 'Timetable', needs: 'camp.read', near: true, apart: true },
  { at: '/workshops', word: 'Workshops', needs: 'camp.edit' },
  { at: '/tracks', word: 'Tracks', needs: 'camp.edit' },
  { at: '/instructors', word: 'Instructors', needs: 'camp.edit' },
  { at: '/rooms', word: 'Rooms', needs: 'camp.edit' },
  { at: '/times', word: 'Times of day', needs: 'camp.edit' },
  { at: '/details', word: 'Details', needs: 'camp.edit', apart: true },
  { at: '/pictures', word: 'Pictures', needs: 'camp.edit' },
  { at: '/preview', word: 'Preview', needs: 'camp.read' },
  { at: '/copy', word: 'Copy', needs: 'camp.edit' },
  { at: '/my-meetings', word: 'My meetings', needs: 'roster.own', apart: true, near: true },
];

/** What of a camp the actor's roles open. Each page asks again for itself. */
export function campEntries(actor: Actor, campId: CampId, organisationId: OrganisationId): RailEntry[] {
  const open = ENTRIES.filter(({ needs }) => can(actor, needs, { organisationId })).map(
    ({ at, needs: _, ...entry }): RailEntry => ({
      ...entry,
      href: `/organise/camps/${campId}${at}` as Route,
    }),
  );
  if (can(actor, 'door.work', { organisationId }))
    open.push({ href: `/door/${campId}` as Route, word: 'Door', apart: true });
  return open;
}
