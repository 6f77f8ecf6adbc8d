import { ActionForm } from '@/components/forms/action-form';
import { TextField } from '@/components/forms/text-field';
import { StateMark } from '@/components/ui/state-mark';
import { resendVerificationAction } from '../../sign-up/actions';
import { changeAddressAction } from '../actions';

type AddressSectionProps = { email: string; verified: boolean };

export function AddressSection({ email, verified }: AddressSectionProps) {
  return (
    <section aria-labelledby="address">
      <h2 id="address" className="mb-4 text-h3">
        E-mail
      </h2>
      <p className="mb-4 flex flex-wrap items-center gap-x-4">
        <span className="wrap-anywhere">{email}</span>
        <StateMark tone={verified ? 'done' : 'wait'}>
          {verified ? 'confirmed' : 'not confirmed yet'}
        </StateMark>
      </p>
      {!verified && (
        <div className="mb-8">
          <p className="mb-3 max-w-prose text-soft">
            Bookings made with this address show here once you confirm it. The letter we sent has the link.
          </p>
          <ActionForm
            action={resendVerificationAction}
            submit="Send the letter again"
            tone="plain"
            done="Another letter is on its way. Its link works once, for 24 hours."
          />
        </div>
      )}
      <ActionForm
        action={changeAddressAction}
        submit="Move to this address"
        tone="plain"
        done="We wrote to the new address. Press the link in that letter and your account moves; until then all stays as it is."
      >
        <TextField name="email" label="New e-mail" type="email" autoComplete="email" spellCheck={false} />
        <TextField name="current" label="Password" type="password" autoComplete="current-password" />
      </ActionForm>
    </section>
  );
}
