import { useQuery } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { Button } from '@/components/ui/button';
import type { PersonDetails } from '@/lib/domain/people/person-details';
import { PersonFacts } from './person-facts';

type PersonSheetProps = {
  campId: string;
  timeZone: string;
  /** Null is closed. */
  registrationId: string | null;
  mayReadNeeds: boolean;
  onClose: () => void;
};

/** One person beside the list; Escape or Close leads back to the row one came from. */
export function PersonSheet({ campId, timeZone, registrationId, mayReadNeeds, onClose }: PersonSheetProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const { data: person, isError } = useQuery({
    queryKey: ['person', campId, registrationId],
    enabled: registrationId !== null,
    queryFn: async ({ signal }): Promise<PersonDetails> => {
      const response = await fetch(`/api/organise/camps/${campId}/people/${registrationId}`, { signal });
      if (!response.ok) throw new Error(`person: ${response.status}`);
      return response.json() as Promise<PersonDetails>;
    },
  });
  useEffect(() => {
    if (registrationId !== null) dialog.current?.showModal();
    else dialog.current?.close();
  }, [registrationId]);
  return (
    <dialog
      ref={dialog}
      aria-label={person?.name ?? 'Person'}
      onClose={onClose}
      className="fixed inset-y-0 left-auto right-0 m-0 h-dvh max-h-none w-full max-w-[32rem] overflow-y-auto border-l-2 border-ink bg-board p-5 text-ink backdrop:bg-ink/40 sm:p-7"
    >
      {registrationId && (
        <>
          <div className="mb-4 flex justify-end">
            <Button onClick={() => dialog.current?.close()}>Close</Button>
          </div>
          {person && (
            <>
              <h2 className="mb-4 break-words">{person.name}</h2>
              <PersonFacts person={person} campId={campId} timeZone={timeZone} mayReadNeeds={mayReadNeeds} />
            </>
          )}
          {!person && !isError && <p role="status">One moment…</p>}
          {isError && <p role="alert">This does not answer just now. Close it and try again.</p>}
        </>
      )}
    </dialog>
  );
}
