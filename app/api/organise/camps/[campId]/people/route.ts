import { z } from 'zod';
import { isId } from '@/lib/domain/shared/ids';
import { peopleQuerySchema } from '@/lib/schemas/people';
import { refuse } from '@/lib/server/errors';
import { listPeople } from '@/lib/server/people/list-people';
import { route } from '@/lib/server/route';

export const GET = route({
  schema: z.object({ params: z.object({ campId: z.string() }), query: peopleQuerySchema }),
  permission: 'people.read',
  on: { kind: 'camp', param: 'campId' },
  run: ({ params, query }) => {
    if (!isId('cmp', params.campId)) return refuse('not_found');
    const headers = { 'cache-control': 'no-store' };
    return { ok: true, value: Response.json(listPeople(params.campId, query), { headers }) };
  },
});
