import { z } from 'zod';

const CONTROL = /\p{Cc}/u;

/** "Name has 140 characters; keep it to 100." */
const tooLong = (field: string, most: number) => ({
  error: ({ input }: { input?: unknown }) =>
    `${field} has ${String(input ?? '').length} characters; keep it to ${most}.`,
});

/** One line of plain text, trimmed, that must be there. `remedy` says what to give: "Give the name players know." */
export const lineText = (field: string, most: number, remedy: string) =>
  z
    .string({ error: `${field} is empty. ${remedy}` })
    .trim()
    .normalize('NFC')
    .min(1, `${field} is empty. ${remedy}`)
    .max(most, tooLong(field, most))
    .refine(
      (text) => !CONTROL.test(text),
      `${field} has a line break or another control character. Take it out.`,
    );

/** One line that may be left empty. */
export const optionalLine = (field: string, most: number) =>
  z
    .string()
    .trim()
    .normalize('NFC')
    .max(most, tooLong(field, most))
    .refine(
      (text) => !CONTROL.test(text),
      `${field} has a line break or another control character. Take it out.`,
    )
    .default('');

/** Several lines of plain text that may be left empty; line breaks come out as \n. */
export const proseText = (field: string, most: number) =>
  z
    .string()
    .transform((text) => text.replace(/\r\n?/g, '\n').trim().normalize('NFC'))
    .pipe(
      z
        .string()
        .max(most, tooLong(field, most))
        .refine(
          (text) => !CONTROL.test(text.replace(/[\n\t]/g, '')),
          `${field} has a control character in it. Type that part again.`,
        ),
    )
    .default('');
