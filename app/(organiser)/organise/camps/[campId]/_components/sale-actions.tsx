import type { Route } from 'next';
import { ActionButton } from '@/components/forms/action-button';
import { ButtonLink } from '@/components/ui/button';
import type { CampState } from '@/lib/domain/camp/camp-words';
import type { CampId } from '@/lib/domain/shared/ids';
import { closeCampAction, publishCampAction } from '../actions';

type SaleActionsProps = {
  camp: { id: CampId; slug: string; state: CampState };
  publishes: boolean;
  /** Nothing that must be there is missing. */
  ready: boolean;
};

/** Preview, and the one step in a camp's life that comes next. */
export function SaleActions({ camp, publishes, ready }: SaleActionsProps) {
  const hidden = { campId: camp.id };
  return (
    <>
      {camp.state === 'draft' ? (
        <ButtonLink href={`/organise/camps/${camp.id}/preview` as Route}>Preview</ButtonLink>
      ) : (
        <ButtonLink href={`/camps/${camp.slug}` as Route}>Public page</ButtonLink>
      )}
      {publishes && camp.state === 'published' && (
        <ActionButton action={closeCampAction} hidden={hidden} tone="danger">
          Close the sale
        </ActionButton>
      )}
      {publishes && camp.state !== 'published' && ready && (
        <ActionButton action={publishCampAction} hidden={hidden} tone="primary">
          {camp.state === 'draft' ? 'Publish' : 'Open the sale again'}
        </ActionButton>
      )}
    </>
  );
}
