import { ActionForm } from '@/components/forms/action-form';
import { TextField } from '@/components/forms/text-field';
import { askForLinkAction } from '../actions';

/** Asks for a booking's link once more. Its answer is the same whether there is such a booking or not. */
export function FindBooking() {
  return (
    <section className="mt-12 border-t-2 border-ink pt-4">
      <h2>Find a booking</h2>
      <p className="mb-6 mt-2 max-w-prose">
        You need no account. Give the address you booked with and the reference, and we mail you the link
        again.
      </p>
      <ActionForm
        action={askForLinkAction}
        submit="Mail me the link"
        tone="plain"
        done="If there is a booking with this address and reference, its link is on the way. Look in the spam folder too; if nothing comes in ten minutes, check both for typing errors, or write to the organiser of the camp."
        labels={{ email: 'E-mail', reference: 'Booking reference' }}
      >
        <TextField
          name="email"
          label="E-mail"
          type="email"
          autoComplete="email"
          hint="The address of the one who paid."
        />
        <TextField
          name="reference"
          label="Booking reference"
          hint="Eight letters and digits, on the receipt and the ticket."
          autoComplete="off"
          autoCapitalize="characters"
          spellCheck={false}
          className="font-mono uppercase"
        />
      </ActionForm>
    </section>
  );
}
