import { ok } from '@/lib/domain/shared/result';
import { registrationLinkSchema } from '@/lib/schemas/booking';
import { takeGrant } from '@/lib/server/auth/take-grant';
import { route } from '@/lib/server/route';

/** The attendee's link of a mail. */
export const GET = route({
  schema: registrationLinkSchema,
  permission: 'public.read',
  run: async ({ params, query }) =>
    ok(
      await takeGrant(
        params.registrationId,
        query.key,
        `/my/registrations/${params.registrationId}/packing-list`,
      ),
    ),
});
