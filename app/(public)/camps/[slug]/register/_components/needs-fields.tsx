import { CheckField } from '@/components/forms/check-field';
import { TextField } from '@/components/forms/text-field';
import { CONSENT_TEXT } from '@/lib/domain/registration/answers';

/** Food, access, who to call; for a minor a guardian. Each with why it is asked. */
export function NeedsFields({ minor }: { minor: boolean }) {
  return (
    <>
      <TextField
        name="diet"
        label="Food: diet and allergies"
        optional
        rows={3}
        hint="For the kitchen. Name an allergy even if you carry what you need for it."
      />
      <TextField
        name="access"
        label="Access and health"
        optional
        rows={3}
        hint="Steps, hearing, sight, breathing, rest: whatever helps us to make the week work for you."
      />
      <fieldset className="grid gap-6">
        <legend className="mb-2 font-head text-h3 font-bold">In an emergency</legend>
        <TextField
          name="emergencyName"
          label="Whom should we call?"
          hint="Somebody who is not at the camp. Used only if something happens to you."
          autoComplete="off"
        />
        <TextField
          name="emergencyPhone"
          label="Their phone number"
          type="tel"
          inputMode="tel"
          hint="However you write it. From another country, begin with + and the country code."
          autoComplete="off"
        />
      </fieldset>
      {minor && (
        <fieldset className="grid gap-6">
          <legend className="mb-2 font-head text-h3 font-bold">Parent or guardian</legend>
          <p className="text-soft">
            Somebody under 18 comes with the consent of a parent or guardian, who fills this in. The
            organisers may ask for more on arrival: local law and the venue’s rules come first.
          </p>
          <TextField name="guardianName" label="Guardian’s full name" autoComplete="off" />
          <TextField
            name="guardianEmail"
            label="Guardian’s e-mail address"
            type="email"
            autoComplete="off"
            spellCheck={false}
          />
          <TextField
            name="guardianPhone"
            label="Guardian’s phone number while the camp runs"
            type="tel"
            inputMode="tel"
            autoComplete="off"
          />
          <CheckField name="consent" label={CONSENT_TEXT} />
        </fieldset>
      )}
    </>
  );
}
