import { z } from 'zod';
import { isId } from '@/lib/domain/shared/ids';
import { searchPeople } from '@/lib/server/door/search-people';
import { refuse } from '@/lib/server/errors';
import { route } from '@/lib/server/route';

export const GET = route({
  schema: z.object({
    params: z.object({ campId: z.string() }),
    query: z.object({ q: z.string().trim().min(1, 'Type a letter of the name.').max(100) }),
  }),
  permission: 'door.work',
  on: { kind: 'camp', param: 'campId' },
  rate: 'scan',
  run: ({ params, query }) =>
    isId('cmp', params.campId)
      ? {
          ok: true,
          value: Response.json(
            { people: searchPeople(params.campId, query.q) },
            { headers: { 'cache-control': 'no-store' } },
          ),
        }
      : refuse('not_found'),
});
