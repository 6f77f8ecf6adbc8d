import 'server-only';
import { dictionary } from '@zxcvbn-ts/language-common';
import { PASSWORD_LEAST } from '@/lib/domain/account/account-limits';

let common: Set<string> | undefined;

/** Is it among the published 49,000 most used (ASVS 6.2.4 asks for 3,000)? Those under our least length cost no room. */
export function isCommonPassword(word: string): boolean {
  common ??= new Set(dictionary['passwords-common'].filter((entry) => entry.length >= PASSWORD_LEAST - 2));
  return common.has(word);
}
