import { ChoiceField } from '@/components/forms/choice-field';
import { TextField } from '@/components/forms/text-field';

/** Who comes, who pays, and whether they are under 18. The payer's fields open by CSS alone. */
export function WhoFields({ firstDay }: { firstDay: string }) {
  return (
    <>
      <TextField
        name="attendeeName"
        label="Full name of the person who comes"
        hint="As it should stand on the ticket and the badge."
        autoComplete="name"
      />
      <TextField
        name="attendeeEmail"
        label="Their e-mail address"
        hint="The ticket and the packing list go there. If they have none, give yours."
        type="email"
        autoComplete="email"
        spellCheck={false}
      />
      <div className="group grid gap-6">
        <ChoiceField
          name="payer"
          legend="Who pays?"
          type="radio"
          choices={[
            { value: 'attendee', label: 'The person who comes' },
            { value: 'other', label: 'Somebody else', hint: 'A parent, a partner, a club.' },
          ]}
        />
        <div className="hidden gap-6 border-l-4 border-line pl-5 group-has-[input[value=other]:checked]:grid">
          <TextField name="payerName" label="Full name of the payer" autoComplete="billing name" />
          <TextField
            name="payerEmail"
            label="Payer’s e-mail address"
            hint="The booking’s link and the receipt go there."
            type="email"
            autoComplete="billing email"
            spellCheck={false}
          />
        </div>
      </div>
      <ChoiceField
        name="minor"
        legend={`Under 18 on ${firstDay}?`}
        type="radio"
        hint="The camp’s first day. If so, we ask for a parent or guardian. We do not need a birth date."
        choices={[
          { value: 'no', label: 'No, 18 or older' },
          { value: 'yes', label: 'Yes, under 18' },
        ]}
      />
    </>
  );
}
