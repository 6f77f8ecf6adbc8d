import { LetterFrame } from './parts/letter-frame';
import { Para, PressLink } from './parts/letter-parts';

export type AccountChangedProps = { name: string; change: 'password' | 'address'; resetUrl: string };

export const accountChangedSubject = ({ change }: Pick<AccountChangedProps, 'change'>): string =>
  change === 'password'
    ? 'Your Combwood password was changed'
    : 'Your Combwood account moved to another address';

const SAID = {
  password: 'the password of your account was changed just now, and every other sign-in of it ended.',
  address: 'your account moved to another e-mail address just now. We write there from now on.',
} satisfies Record<AccountChangedProps['change'], string>;

export function AccountChanged({ name, change, resetUrl }: AccountChangedProps) {
  const subject = accountChangedSubject({ change });
  return (
    <LetterFrame preview={subject} title={subject} foot="You get this because it is your account.">
      <Para>Hello {name},</Para>
      <Para>{SAID[change]}</Para>
      {change === 'password' ? (
        <>
          <Para>If that was you, there is nothing to do. If it was not, set a new password now.</Para>
          <PressLink href={resetUrl}>Set a new password</PressLink>
        </>
      ) : (
        <Para>If that was you, there is nothing to do. If it was not, answer this letter at once.</Para>
      )}
    </LetterFrame>
  );
}
