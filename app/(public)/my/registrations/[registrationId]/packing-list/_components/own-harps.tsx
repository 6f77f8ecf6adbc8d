import { ActionForm } from '@/components/forms/action-form';
import { AddHarp } from '@/components/harp/add-harp';
import { HarpChoices } from '@/components/harp/harp-choices';
import { HarpRow } from '@/components/harp/harp-row';
import { COMMON_HARPS } from '@/lib/domain/harp/common-harps';
import type { Harp } from '@/lib/domain/harp/harp';
import { harpId } from '@/lib/domain/harp/harp-id';
import type { RegistrationId } from '@/lib/domain/shared/ids';
import { saveOwnHarpsAction } from '../actions';

/** The harps one owns, and the form to change them behind a press: most people come here to read. */
export function OwnHarps({
  registrationId,
  owned,
}: {
  registrationId: RegistrationId;
  owned: readonly Harp[];
}) {
  const ids = owned.map(harpId);
  return (
    <>
      <div className="mt-4">
        {owned.length > 0 ? <HarpRow harps={[...owned]} label="Harps you own" /> : <p>None so far.</p>}
      </div>
      <details className="mt-4">
        <summary className="inline-flex min-h-target items-center font-semibold text-lake underline underline-offset-4">
          Change what you own
        </summary>
        <div className="mt-4">
          <ActionForm
            // A harp that was added is one more choice: the form begins afresh with it ticked.
            key={ids.join()}
            action={saveOwnHarpsAction}
            submit="Save my harps"
            tone="plain"
            defaultValue={{ harpIds: ids, addTuning: 'natural-minor', addRegister: 'standard' }}
            hidden={{ registrationId }}
            done="Saved. The packing list above is up to date."
            labels={{ addKey: 'Key' }}
          >
            {/* Enter in a tick box sends by the first button of a form; that must be "Save", not "Add". */}
            <button type="submit" className="sr-only" tabIndex={-1} aria-hidden="true">
              Save
            </button>
            <HarpChoices common={COMMON_HARPS} others={ids.filter((id) => !COMMON_HARPS.includes(id))} />
            <AddHarp />
          </ActionForm>
        </div>
      </details>
    </>
  );
}
