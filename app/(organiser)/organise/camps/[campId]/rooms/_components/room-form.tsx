import { ActionForm } from '@/components/forms/action-form';
import { ChoiceField } from '@/components/forms/choice-field';
import { TextField } from '@/components/forms/text-field';
import { LOUDNESS_WORDS, ROOM_LOUDNESS } from '@/lib/domain/camp/camp-words';
import { saveRoomAction } from '../actions';

const HINTS = {
  quiet: 'Technique, theory, one-to-one.',
  acoustic: 'Playing together without amplifiers.',
  amplified: 'Band lab, jam, concert. Watch the neighbours, and the players’ hearing.',
} as const;

type RoomFormProps = { campId: string; roomId?: string; defaultValue?: Record<string, unknown> };

export function RoomForm({ campId, roomId, defaultValue }: RoomFormProps) {
  return (
    <ActionForm
      action={saveRoomAction}
      submit={roomId ? 'Save' : 'Add the room'}
      hidden={{ campId, ...(roomId && { roomId }) }}
      defaultValue={defaultValue}
    >
      <TextField name="name" label="Name" hint="As it stands on the door, like Barn." />
      <TextField
        name="seats"
        label="Seats"
        inputMode="numeric"
        hint="Players need elbow room: at least 1.4 m² each, and never more than the fire rules of the house allow."
      />
      <ChoiceField
        name="loudness"
        legend="The loudest it can take"
        type="radio"
        choices={ROOM_LOUDNESS.map((value) => ({ value, label: LOUDNESS_WORDS[value], hint: HINTS[value] }))}
      />
      <TextField name="kit" label="Kit" optional hint="Piano, PA, screen, tables, sink." />
    </ActionForm>
  );
}
