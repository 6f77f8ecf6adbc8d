import { takeWebhook } from '@/lib/server/registration/take-webhook';

/** Not by `route()`: the signature is over the raw body, and it is the proof that the ladder's rungs would be. */
export const POST = Object.assign((request: Request) => takeWebhook(request, Date.now()), {
  access: { permission: 'payment.notify' as const, on: null },
});
