import { ActionForm } from '@/components/forms/action-form';
import { TextField } from '@/components/forms/text-field';
import { saveBlockAction } from '../actions';

type BlockFormProps = { campId: string; blockId?: string; defaultValue?: Record<string, unknown> };

export function BlockForm({ campId, blockId, defaultValue }: BlockFormProps) {
  return (
    <ActionForm
      action={saveBlockAction}
      submit={blockId ? 'Save' : 'Add this time'}
      hidden={{ campId, ...(blockId && { blockId }) }}
      defaultValue={defaultValue}
    >
      <div className="grid gap-6 sm:grid-cols-2">
        <TextField name="starts" label="From" type="time" hint="No other time of day starts then." />
        <TextField name="ends" label="Until" type="time" hint="After midnight counts for the same evening." />
      </div>
      <TextField name="label" label="Name" optional hint="Like First morning or Evening." />
    </ActionForm>
  );
}
