import { LetterFrame } from './parts/letter-frame';
import { Para, PressLink } from './parts/letter-parts';

export type ResetProps = { name: string; url: string; minutes: number };

export const resetSubject = 'Set a new password for Combwood';

export function Reset({ name, url, minutes }: ResetProps) {
  return (
    <LetterFrame
      preview={`The link works once, for ${minutes} minutes.`}
      title="Set a new password"
      foot="You get this because someone asked for a new password for this address. If it was not you, do nothing: your password stays as it is."
    >
      <Para>Hello {name},</Para>
      <Para>Press the button and choose a new password. It signs you out on all other devices.</Para>
      <PressLink href={url}>Set a new password</PressLink>
      <Para>The link works once, for {minutes} minutes.</Para>
    </LetterFrame>
  );
}
