import { z } from 'zod';
import { NAME_MOST, PASSWORD_MOST } from '@/lib/domain/account/account-limits';

const oneLine = (text: string): boolean => ![...text].some((sign) => sign < ' ' || sign === '\u007f');

/** Trimmed and lower-cased; a line break inside is refused, because it would start a new header in a mail (ASVS 1.3.11). */
export const emailSchema = z
  .string({ error: 'E-mail is empty. Give the address you read your mail at.' })
  .trim()
  .toLowerCase()
  .max(254, 'E-mail is longer than 254 characters, which no address is. Check it.')
  .refine(oneLine, 'E-mail has a line break or another control character in it. Type it again.')
  .pipe(z.email('E-mail is not complete. It has a name, an @ and a domain, like sam@example.org.'));

/** The password as typed at sign-in: spaces count, nothing is cut. */
export const givenPasswordSchema = z
  .string({ error: 'Password is empty. Type it.' })
  .max(PASSWORD_MOST * 4, 'Password is longer than any we take. Check it.');

export const nextSchema = z.string().max(500).optional();

export const signInSchema = z.object({
  email: emailSchema,
  password: givenPasswordSchema,
  next: nextSchema,
});
export type SignInInput = z.infer<typeof signInSchema>;

export const nameSchema = z
  .string({ error: 'Name is empty. Give the name you go by.' })
  .trim()
  .normalize('NFC')
  .min(1, 'Name is empty. Give the name you go by.')
  .max(NAME_MOST, `Name is longer than ${NAME_MOST} characters. Give a shorter form.`)
  .refine(oneLine, 'Name has a line break or another control character in it. Type it on one line.');
