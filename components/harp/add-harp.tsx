import { SelectField } from '@/components/forms/select-field';
import { Button } from '@/components/ui/button';
import { PITCH_CLASSES } from '@/lib/domain/harp/pitch-class';
import { REGISTERS } from '@/lib/domain/harp/register';
import { TUNING_FACTS, TUNINGS } from '@/lib/domain/harp/tuning';

const REGISTER_WORDS = { low: 'Low', standard: 'Standard', high: 'High' };

/** Three lists and a button of its own, for harps beyond the twelve: it adds one and stays on the page. */
export function AddHarp() {
  return (
    <fieldset className="grid gap-4 border-l-4 border-line pl-5">
      <legend className="float-left w-full font-semibold">Another tuning or register</legend>
      <p className="-mt-3 text-small text-soft">
        Low harps, minor tunings, chromatics. Give the key that is printed on the cover.
      </p>
      <div className="grid gap-4 sm:grid-cols-3">
        <SelectField
          name="addKey"
          label="Key"
          blank="None"
          choices={PITCH_CLASSES.map((key) => ({ value: key, label: key }))}
        />
        <SelectField
          name="addTuning"
          label="Tuning"
          choices={TUNINGS.map((tuning) => ({ value: tuning, label: TUNING_FACTS[tuning].name }))}
        />
        <SelectField
          name="addRegister"
          label="Register"
          choices={REGISTERS.map((register) => ({ value: register, label: REGISTER_WORDS[register] }))}
        />
      </div>
      <p>
        <Button type="submit" name="intent" value="add">
          Add this harp
        </Button>
      </p>
    </fieldset>
  );
}
