import { ActionForm } from '@/components/forms/action-form';
import { SelectField } from '@/components/forms/select-field';
import { TextField } from '@/components/forms/text-field';
import { LEVEL_WORDS, TRACK_LEVELS } from '@/lib/domain/camp/camp-words';
import { GATE_IDEAS } from '@/lib/domain/camp/gate-ideas';
import { saveTrackAction } from '../actions';

type TrackFormProps = {
  campId: string;
  trackId?: string;
  /** Mark of the track as this form shows it. */
  seen?: string;
  defaultValue?: Record<string, unknown>;
  taken: number;
  /** "€460.00", or nothing while the camp has no price. */
  campPrice: string | null;
};

export function TrackForm({ campId, trackId, seen, defaultValue, taken, campPrice }: TrackFormProps) {
  return (
    <ActionForm
      action={saveTrackAction}
      submit={trackId ? 'Save' : 'Add the track'}
      hidden={{ campId, ...(trackId && { trackId }), ...(seen && { seen }) }}
      defaultValue={defaultValue}
    >
      <TextField name="name" label="Name" hint="What players see, like Bending or Late starters." />
      <SelectField
        name="level"
        label="Level"
        blank="Choose"
        hint="The step of the ladder it is for."
        choices={TRACK_LEVELS.map((level) => ({ value: level, label: LEVEL_WORDS[level] }))}
      />
      <TextField
        name="gate"
        label="Gate"
        rows={4}
        optional
        hint="What a player must already do, by hole and bend: never “are you intermediate?”. Needed before you publish."
      />
      <details className="border-l-4 border-line pl-4 text-small">
        <summary className="min-h-target content-center font-semibold text-lake underline underline-offset-4">
          Ideas for gates, step by step
        </summary>
        <dl className="grid gap-2 pb-2">
          {TRACK_LEVELS.map((level) => (
            <div key={level}>
              <dt className="font-semibold">{LEVEL_WORDS[level]}</dt>
              <dd className="text-soft">{GATE_IDEAS[level]}</dd>
            </div>
          ))}
        </dl>
      </details>
      <TextField
        name="capacity"
        label="Places"
        inputMode="numeric"
        hint={taken > 0 ? `${taken} are taken or held.` : 'A technique class works with 8 to 15.'}
      />
      <TextField
        name="price"
        label="Price of its own"
        inputMode="decimal"
        optional
        hint={campPrice ? `Leave it empty for the camp’s ${campPrice}.` : 'The camp has no price yet.'}
      />
    </ActionForm>
  );
}
