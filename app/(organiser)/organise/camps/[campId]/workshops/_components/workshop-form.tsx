import { ActionForm } from '@/components/forms/action-form';
import { ChoiceField } from '@/components/forms/choice-field';
import { SelectField } from '@/components/forms/select-field';
import { TextField } from '@/components/forms/text-field';
import { NeedsEditor } from '@/components/harp/needs-editor';
import type { Programme } from '@/lib/domain/timetable/programme';
import {
  AUDIENCE_WORDS,
  KIND_WORDS,
  WORKSHOP_AUDIENCES,
  WORKSHOP_KINDS,
} from '@/lib/domain/timetable/workshop-words';
import { FieldGroup } from '../../_components/field-group';
import { saveWorkshopAction } from '../actions';

const AUDIENCE_HINTS = {
  core: 'Everybody in its tracks goes. Tick the tracks below.',
  elective: 'Players choose it when they register.',
  everyone: 'A concert or an open jam: no choice to make.',
} as const;

type WorkshopFormProps = {
  campId: string;
  workshopId?: string;
  /** Mark of the workshop as this form shows it. */
  seen?: string;
  defaultValue?: Record<string, unknown>;
} & Pick<Programme, 'tracks' | 'instructors'>;

export function WorkshopForm({
  campId,
  workshopId,
  seen,
  defaultValue,
  tracks,
  instructors,
}: WorkshopFormProps) {
  const submit = workshopId ? 'Save' : 'Add the workshop';
  return (
    <ActionForm
      action={saveWorkshopAction}
      submit={submit}
      hidden={{ campId, ...(workshopId && { workshopId }), ...(seen && { seen }) }}
      defaultValue={defaultValue}
      labels={{ 'needs[]': 'Harp' }}
      className="grid max-w-4xl gap-10"
    >
      {/* Enter in a field presses the form's first button, which must not be one that takes a harp out. */}
      <button type="submit" tabIndex={-1} aria-hidden="true" className="sr-only">
        {submit}
      </button>
      <FieldGroup title="What">
        <TextField name="title" label="Title" />
        <TextField name="description" label="Description" rows={4} optional />
        <div className="grid gap-6 sm:grid-cols-3">
          <SelectField
            name="kind"
            label="Kind"
            blank="Choose"
            choices={WORKSHOP_KINDS.map((kind) => ({ value: kind, label: KIND_WORDS[kind] }))}
          />
          <TextField name="lengthMinutes" label="Length in minutes" inputMode="numeric" />
          <TextField name="capacity" label="People at most" inputMode="numeric" optional />
        </div>
      </FieldGroup>
      <FieldGroup title="Who">
        <ChoiceField
          name="audience"
          legend="Who comes"
          type="radio"
          choices={WORKSHOP_AUDIENCES.map((audience) => ({
            value: audience,
            label: AUDIENCE_WORDS[audience],
            hint: AUDIENCE_HINTS[audience],
          }))}
        />
        {tracks.length > 0 && (
          <ChoiceField
            name="trackIds"
            legend="Tracks"
            type="checkbox"
            hint="For a core workshop only."
            choices={tracks.map(({ id, name }) => ({ value: id, label: name }))}
          />
        )}
        {instructors.length > 0 && (
          <ChoiceField
            name="instructorIds"
            legend="Instructors"
            type="checkbox"
            choices={instructors.map(({ id, name }) => ({ value: id, label: name }))}
          />
        )}
      </FieldGroup>
      <FieldGroup title="Harps to bring">
        <p className="max-w-prose text-soft">
          One box a harp. Where either of two will do, name both in one box. A song’s key and its position
          give the harp, so nobody takes one for the other.
        </p>
        <NeedsEditor name="needs" />
      </FieldGroup>
    </ActionForm>
  );
}
