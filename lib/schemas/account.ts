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

/** A new password: its rules need the person's name and address, so they are judged by the use-case. */
const newPasswordSchema = z
  .string({ error: 'Password is empty. Choose one.' })
  .max(PASSWORD_MOST * 4, `Password is longer than ${PASSWORD_MOST} characters. Choose a shorter one.`);
const tokenSchema = z.string({ error: 'Link is incomplete. Open it from the letter again.' }).max(100);

export const signUpSchema = z.object({
  email: emailSchema,
  // It is in the greeting of a letter to an address that nobody has proven, so it may carry no advertisement.
  name: nameSchema.refine(
    (text) => !/:\/\/|www\.|@/i.test(text),
    'Name has a web or mail address in it. Give just the name.',
  ),
  password: newPasswordSchema,
  next: nextSchema,
});
export type SignUpInput = z.infer<typeof signUpSchema>;

export const verifySchema = z.object({ token: tokenSchema, password: givenPasswordSchema.optional() });
export type VerifyInput = z.infer<typeof verifySchema>;

export const askResetSchema = z.object({ email: emailSchema });
export type AskResetInput = z.infer<typeof askResetSchema>;

export const resetSchema = z.object({ token: tokenSchema, password: newPasswordSchema });
export type ResetInput = z.infer<typeof resetSchema>;

export const changePasswordSchema = z.object({ current: givenPasswordSchema, password: newPasswordSchema });
export type ChangePasswordInput = z.infer<typeof changePasswordSchema>;

export const changeAddressSchema = z.object({ email: emailSchema, current: givenPasswordSchema });
export type ChangeAddressInput = z.infer<typeof changeAddressSchema>;

export const changeNameSchema = z.object({ name: signUpSchema.shape.name });
export type ChangeNameInput = z.infer<typeof changeNameSchema>;

export const endSessionSchema = z.object({
  sessionId: z.string({ error: 'Sign-in is missing.' }).min(1).max(100),
});
