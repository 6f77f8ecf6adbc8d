import { ok } from '@/lib/domain/shared/result';
import { orderLinkSchema } from '@/lib/schemas/booking';
import { takeGrant } from '@/lib/server/auth/take-grant';
import { route } from '@/lib/server/route';

/** The payer's link of a mail. */
export const GET = route({
  schema: orderLinkSchema,
  permission: 'public.read',
  run: async ({ params, query }) =>
    ok(await takeGrant(params.orderId, query.key, `/my/orders/${params.orderId}`)),
});
