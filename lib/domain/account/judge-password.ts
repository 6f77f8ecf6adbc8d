import { PASSWORD_LEAST, PASSWORD_MOST } from './account-limits';

type Person = { email: string; name: string };

/**
 * What is wrong with a new password, as a sentence with its remedy, or null. Length and use only: no rules of capitals
 * and digits, which push people to predictable ones (ASVS 6.2.1, 6.2.4, 6.2.5, 6.2.9; NIST SP 800-63B).
 * `isCommon` answers for a lower-cased word.
 */
export function judgePassword(
  password: string,
  person: Person,
  isCommon: (word: string) => boolean,
): string | null {
  const text = password.normalize('NFC');
  const signs = [...text];
  if (signs.length < PASSWORD_LEAST)
    return `Password has ${signs.length} characters. It needs ${PASSWORD_LEAST} or more: three or four words are easy to keep in mind.`;
  if (signs.length > PASSWORD_MOST)
    return `Password has ${signs.length} characters. The most we take is ${PASSWORD_MOST}.`;
  const folded = text.toLowerCase();
  if (isCommon(folded) || isCommon(folded.replace(/[\d\p{P}\p{S}\s]+$/u, '')) || isRun(signs))
    return 'Password is one of those that are guessed first. Take a longer one, or three or four words.';
  if (namesOf(person).some((name) => folded.includes(name) && folded.length - name.length < PASSWORD_LEAST))
    return 'Password is made of your own name or e-mail, which is guessed first. Take other words.';
  return null;
}

/** `aaaaaaaa`, `abababab`, `23456789`, `hgfedcba`: three different signs or fewer, or one step all the way. */
function isRun(signs: readonly string[]): boolean {
  if (new Set(signs).size <= 3) return true;
  const steps = signs
    .slice(1)
    .map((sign, at) => (sign.codePointAt(0) ?? 0) - (signs[at]?.codePointAt(0) ?? 0));
  return Math.abs(steps[0] ?? 0) <= 1 && steps.every((step) => step === steps[0]);
}

/** The parts of a name and an address that are long enough to be somebody's password. */
const namesOf = ({ email, name }: Person): string[] =>
  [email, ...email.split(/[@.+_-]/), ...name.normalize('NFC').split(/\s+/), name.replace(/\s+/g, '')]
    .map((part) => part.toLowerCase())
    .filter((part) => [...part].length >= 4);
