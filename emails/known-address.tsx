import { LetterFrame } from './parts/letter-frame';
import { Para, PressLink } from './parts/letter-parts';

export type KnownAddressProps = { name: string; signInUrl: string };

export const knownAddressSubject = 'You already have a Combwood account';

export function KnownAddress({ name, signInUrl }: KnownAddressProps) {
  return (
    <LetterFrame
      preview="Someone signed up with your address; you have an account already."
      title="You already have an account"
      foot="You get this because someone signed up at Combwood with this address. If it was not you, do nothing: nothing was changed, and they were not told that you have an account."
    >
      <Para>Hello {name},</Para>
      <Para>
        this address already has an account, so we did not make another one. Sign in with it. If you no longer
        know the password, the sign-in page helps you set a new one.
      </Para>
      <PressLink href={signInUrl}>Sign in</PressLink>
    </LetterFrame>
  );
}
