import type { Route } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { ButtonLink, buttonClass } from '@/components/ui/button';
import type { Attendee } from '@/lib/server/packing/load-attendee';
import { mailPackingListAction } from '../actions';
import { PrintButton } from './print-button';

type PackingActionsProps = { person: Attendee['person']; hasMeetings: boolean };

export function PackingActions({ person, hasMeetings }: PackingActionsProps) {
  return (
    <>
      {person.ticket && (
        <ButtonLink href={`/my/registrations/${person.id}/ticket` as Route}>Show the ticket</ButtonLink>
      )}
      {hasMeetings && (
        <a className={buttonClass('plain')} href={`/api/my/registrations/${person.id}/calendar`}>
          Timetable for my calendar
        </a>
      )}
      <PrintButton />
      {person.state === 'confirmed' && (
        <ActionForm
          action={mailPackingListAction}
          submit="Mail me this list"
          tone="plain"
          hidden={{ registrationId: person.id }}
          done={`On its way to ${person.attendeeEmail}.`}
          className="grid gap-2"
        />
      )}
    </>
  );
}
