import { z } from 'zod';

const read = (text: string, least: number, most: number): number | null => {
  const plain = text.trim();
  const value = Number(plain);
  return /^\d{1,9}$/.test(plain) && value >= least && value <= most ? value : null;
};

/** A whole number as a form sends it. "Seats: “-3” will not do. Give a whole number from 1 to 500." */
export const wholeNumber = (field: string, least: number, most: number) => {
  const remedy = `Give a whole number from ${least} to ${most}.`;
  return z.string({ error: `${field} is empty. ${remedy}` }).transform((text, context) => {
    const value = read(text, least, most);
    if (value !== null) return value;
    const message =
      text.trim() === '' ? `${field} is empty.` : `${field}: “${text.trim().slice(0, 20)}” will not do.`;
    context.addIssue({ code: 'custom', message: `${message} ${remedy}`, input: text });
    return z.NEVER;
  });
};

/** As `wholeNumber`; left empty it is null. */
export const optionalWholeNumber = (field: string, least: number, most: number) =>
  z.union([z.literal('').transform(() => null), wholeNumber(field, least, most)]).default(null);
