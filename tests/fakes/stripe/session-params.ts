import { z } from 'zod';
import { isCurrency, MAX_AMOUNT } from './currency-rules';
import { expandable, flag, integer, listed, metadata, text, webUrl } from './parse-params';

const currency = z
  .string()
  .min(1)
  .transform((code) => code.toLowerCase())
  .refine(isCurrency, {
    message: 'Invalid currency. Use a three-letter ISO 4217 code in lowercase.',
    params: { code: 'parameter_invalid' },
  });

const lineItem = z.strictObject({
  quantity: integer(1, 999_999),
  price_data: z.strictObject({
    currency,
    unit_amount: integer(0, MAX_AMOUNT),
    tax_behavior: z.enum(['exclusive', 'inclusive', 'unspecified']).default('unspecified'),
    product_data: z.strictObject({
      name: text(250),
      description: text(1000).optional(),
      images: z.array(webUrl).max(8).optional(),
      metadata: metadata.optional(),
    }),
  }),
});

export type LineItemParams = z.output<typeof lineItem>;

/**
 * The part of Checkout's parameters that the app uses: one-off payments by prices given in the call. Anything else is
 * refused by name rather than ignored, so that a change of the app shows here first.
 */
export const createSessionParams = z.strictObject({
  ...expandable,
  mode: z.literal('payment', { message: 'this stand-in takes one-off payments only (mode=payment)' }),
  ui_mode: z.literal('hosted_page').optional(),
  line_items: z.array(lineItem).min(1).max(100),
  success_url: webUrl,
  cancel_url: webUrl.optional(),
  client_reference_id: text(200).optional(),
  customer_email: text(800)
    .refine((address) => z.email().safeParse(address).success, {
      message: 'Invalid email address.',
      params: { code: 'email_invalid' },
    })
    .optional(),
  customer_creation: z.enum(['always', 'if_required']).optional(),
  billing_address_collection: z.enum(['auto', 'required']).optional(),
  submit_type: z.enum(['auto', 'book', 'donate', 'pay']).optional(),
  locale: text(10).optional(),
  allow_promotion_codes: flag.optional(),
  expires_at: integer(0).optional(),
  metadata: metadata.default({}),
  payment_intent_data: z
    .strictObject({
      description: text(1000).optional(),
      metadata: metadata.default({}),
      receipt_email: text(800).optional(),
      statement_descriptor: text(22).optional(),
      statement_descriptor_suffix: text(22).optional(),
      capture_method: z.enum(['automatic', 'automatic_async']).optional(),
    })
    .optional(),
});

export type CreateSessionParams = z.output<typeof createSessionParams>;

export const listSessionsParams = z.strictObject({
  ...listed,
  status: z.enum(['open', 'complete', 'expired']).optional(),
  payment_intent: text().optional(),
  customer_details: z.strictObject({ email: text(800) }).optional(),
});
