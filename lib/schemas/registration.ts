import { z } from 'zod';
import { isId, type TrackId, type WorkshopId } from '@/lib/domain/shared/ids';
import { ownedHarpsSchema, pitchClassSchema, registerSchema, tuningSchema } from './harp';

// Control characters never belong in a name or a note (line breaks in a note apart): they break mail heads and lists.
const ONE_LINE = /^[^\p{Cc}\p{Cf}\u2028\u2029]*$/u;
const NOTE = /^[^\p{Cc}\u2028\u2029]*$/u;

const line = (what: string, most: number) =>
  z
    .string()
    .trim()
    .max(most, `${what} is longer than ${most} characters: shorten it.`)
    .regex(ONE_LINE, `${what} has a character in it that cannot be shown: type it again.`);

const required = (what: string, most: number, remedy: string) =>
  z
    .string({ error: remedy })
    .trim()
    .min(1, remedy)
    .max(most, `${what} is longer than ${most} characters: shorten it.`)
    .regex(ONE_LINE, `${what} has a character in it that cannot be shown: type it again.`);

const note = (what: string) =>
  z
    .string()
    .trim()
    .max(
      1000,
      `${what} is longer than 1,000 characters: shorten it, or write to the organisers for the rest.`,
    )
    .refine(
      (text) => NOTE.test(text.replace(/[\r\n\t]/g, '')),
      `${what} has a character in it that cannot be shown.`,
    )
    .default('');

/** Kept as typed but for case, which mail services do not tell apart. */
const email = (remedy: string) =>
  z
    .string({ error: remedy })
    .trim()
    .min(1, remedy)
    .max(254, 'The address is longer than 254 characters, more than e-mail allows: check it.')
    .toLowerCase()
    .pipe(
      z.email('This is not an e-mail address: it needs a name, an @ and a domain, like noor@example.org.'),
    );

const isTrackId = (value: string): value is TrackId => isId('trk', value);
const isWorkshopId = (value: string): value is WorkshopId => isId('wsh', value);

/** A checkbox as a form sends it (absent or "on") and as a draft keeps it. */
const tick = z
  .union([z.boolean(), z.literal('on').transform(() => true)])
  .optional()
  .transform((value) => value ?? false);

const route = { slug: z.string().min(1).max(120), from: z.literal('check').optional() };

const whoShape = {
  attendeeName: required('The name', 120, 'Give the full name of the person who comes.'),
  attendeeEmail: email('Give an e-mail address: the ticket goes there.'),
  payer: z.enum(['attendee', 'other'], { error: 'Say who pays.' }),
  payerName: line('The payer’s name', 120).default(''),
  payerEmail: z
    .string()
    .trim()
    .toLowerCase()
    .max(254, 'The payer’s address is longer than 254 characters.')
    .default(''),
  minor: z.union([z.boolean(), z.enum(['yes', 'no']).transform((answer) => answer === 'yes')], {
    error: 'Say whether they will be under 18.',
  }),
};

const PAYER_EMAIL = 'Give the payer’s e-mail address: the receipt goes there.';

const paidByAnother = (value: unknown): boolean =>
  typeof value === 'object' && value !== null && 'payer' in value && value.payer === 'other';

/** The payer's own fields count only where somebody else pays: asked for then, dropped otherwise. */
function withPayer<T extends z.output<z.ZodObject<typeof whoShape>>>(schema: z.ZodType<T>) {
  return schema
    .superRefine(
      (who, context) => {
        const say = (path: string, message: string) =>
          context.addIssue({ code: 'custom', path: [path], message });
        if (who.payerName === '') say('payerName', 'Give the full name of the person who pays.');
        const read = email(PAYER_EMAIL).safeParse(who.payerEmail);
        if (!read.success) say('payerEmail', read.error.issues[0]?.message ?? PAYER_EMAIL);
      },
      // Even when another field is wrong: one look tells all that is missing.
      { when: ({ value }) => paidByAnother(value) },
    )
    .transform((who) => (who.payer === 'other' ? who : { ...who, payerName: '', payerEmail: '' }));
}

export const whoSchema = withPayer(z.object(whoShape));
export const whoFormSchema = withPayer(z.object({ ...whoShape, ...route }));

export const trackSchema = z.object({
  trackId: z.string({ error: 'Choose a track.' }).refine(isTrackId, 'Choose a track from the list.'),
  electives: z
    .array(z.string().refine(isWorkshopId, 'Choose electives from the list.'))
    .max(60, 'That is more electives than a camp has: take some out.')
    .default([])
    .transform((ids) => [...new Set(ids)]),
});

export const harpsSchema = z.object({ harpIds: ownedHarpsSchema.default([]) });

export const needsSchema = z.object({
  diet: note('The note on food'),
  access: note('The note on access'),
  emergencyName: required('The name', 120, 'Give the name of somebody to call if anything happens.'),
  emergencyPhone: required('The phone number', 40, 'Give their phone number.'),
  guardianName: line('The guardian’s name', 120).default(''),
  guardianEmail: z
    .string()
    .trim()
    .toLowerCase()
    .max(254, 'The guardian’s address is longer than 254 characters.')
    .default(''),
  guardianPhone: line('The guardian’s phone number', 40).default(''),
  consent: tick,
});

export const trackFormSchema = trackSchema.extend(route);
// Who to call is asked for by `checkNeeds`, together with the guardian: one look tells all that is missing.
export const needsFormSchema = needsSchema.extend({
  ...route,
  emergencyName: line('The name', 120).default(''),
  emergencyPhone: line('The phone number', 40).default(''),
});
export const harpsFormSchema = harpsSchema.extend({
  ...route,
  /** `add` notes the harp of the three lists and stays; anything else goes on. */
  intent: z.enum(['add', 'next']).default('next'),
  addKey: pitchClassSchema.optional(),
  addTuning: tuningSchema.default('richter'),
  addRegister: registerSchema.default('standard'),
});
export const submitFormSchema = z.object({ slug: route.slug });
export const orderFormSchema = z.object({
  orderId: z.string().refine((id) => isId('ord', id), 'Not an order.'),
});
