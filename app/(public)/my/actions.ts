'use server';

import { ok } from '@/lib/domain/shared/result';
import { askForLinkSchema } from '@/lib/schemas/booking';
import { action } from '@/lib/server/action';
import { sendBookingLink } from '@/lib/server/orders/send-booking-link';

export const askForLinkAction = action({
  schema: askForLinkSchema,
  permission: 'public.read',
  rate: 'mail-link',
  run: ({ email, reference }, { now }) => ok(sendBookingLink({ email, reference, now })),
});
