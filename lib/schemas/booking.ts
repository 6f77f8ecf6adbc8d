import { z } from 'zod';
import { emailSchema } from './account';
import { harpsFormSchema } from './registration';
import { rowId } from './row-id';

// A mail's link. What has the wrong shape is a wrong link and led to the page that says so, not answered with a fault.
const loose = z.string().max(200).catch('');
const query = z.object({ key: loose });
const orderId = z.object({ orderId: rowId('ord') });
const registrationId = z.object({ registrationId: rowId('reg') });

export const orderLinkSchema = z.object({ params: z.object({ orderId: loose }), query });
export const registrationLinkSchema = z.object({ params: z.object({ registrationId: loose }), query });
export const orderParamsSchema = z.object({ params: orderId });
export const receiptParamsSchema = z.object({
  params: orderId.extend({ number: z.coerce.number().int().min(1) }),
});
export const registrationParamsSchema = z.object({ params: registrationId });

/** Asks for the link again: the two things that a payer has on paper. Spaces and dashes in the reference don't matter. */
export const askForLinkSchema = z.object({
  email: emailSchema,
  reference: z
    .string({ error: 'Booking reference is empty. It stands on the receipt and the ticket.' })
    .max(40, 'Booking reference is longer than 40 characters. It has eight letters and digits.')
    .transform((text) => text.toUpperCase().replace(/[\s–-]/g, ''))
    .pipe(
      z
        .string()
        .regex(
          /^[A-Z0-9]{6,12}$/,
          'Booking reference has eight letters and digits, such as K7WD4RXZ. Check it.',
        ),
    ),
});

export const mailPackingListSchema = registrationId;

/** The harps an attendee owns: the same form as when registering. */
export const ownHarpsSchema = harpsFormSchema.omit({ slug: true, from: true }).extend(registrationId.shape);
