import { SelectField } from '@/components/forms/select-field';
import { TextField } from '@/components/forms/text-field';
import type { Programme } from '@/lib/domain/timetable/programme';

/** When it begins: at a block of the camp's day, or at a time of its own. */
export function StartFields({ blocks }: { blocks: Programme['blocks'] }) {
  return (
    <>
      <div className="field">
        <SelectField
          name="block"
          label="Block"
          blank="None: give a time"
          choices={blocks.map(({ starts, ends, label }) => ({
            value: starts,
            label: `${starts}–${ends}${label && ` ${label}`}`,
          }))}
        />
      </div>
      <div className="field">
        <TextField name="time" type="time" label="Or starts at" optional hint="Wins over the block." />
      </div>
      <div className="field">
        <TextField
          name="lengthMinutes"
          type="number"
          label="Length in minutes"
          optional
          hint="Empty takes the workshop’s own."
          min={5}
          max={720}
          inputMode="numeric"
        />
      </div>
    </>
  );
}
