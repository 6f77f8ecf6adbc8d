import { z } from 'zod';
import { isId } from '@/lib/domain/shared/ids';
import { refuse } from '@/lib/server/errors';
import { getPerson } from '@/lib/server/people/get-person';
import { route } from '@/lib/server/route';

export const GET = route({
  schema: z.object({ params: z.object({ campId: z.string(), registrationId: z.string() }) }),
  permission: 'people.read',
  on: { kind: 'camp', param: 'campId' },
  run: ({ params: { campId, registrationId } }) => {
    const person = isId('cmp', campId) && isId('reg', registrationId) && getPerson(campId, registrationId);
    if (!person) return refuse('not_found');
    return { ok: true, value: Response.json(person, { headers: { 'cache-control': 'no-store' } }) };
  },
});
