import { LetterFrame } from './parts/letter-frame';
import { Para, PressLink } from './parts/letter-parts';

export type VerifyProps = { name: string; url: string; hours: number };

export const verifySubject = 'Confirm your e-mail address for Combwood';

export function Verify({ name, url, hours }: VerifyProps) {
  return (
    <LetterFrame
      preview="One press, and your account is ready."
      title="Confirm your address"
      foot="You get this because someone signed up at Combwood with this address. If it was not you, do nothing: without the link the account stays shut."
    >
      <Para>Hello {name},</Para>
      <Para>Press the button to confirm that this address is yours. Then your account is ready.</Para>
      <PressLink href={url}>Confirm my address</PressLink>
      <Para>The link works once, for {hours} hours.</Para>
    </LetterFrame>
  );
}
