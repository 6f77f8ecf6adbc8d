import { z } from 'zod';
import { isId } from '@/lib/domain/shared/ids';
import { peopleQuerySchema } from '@/lib/schemas/people';
import { ownCamp } from '@/lib/server/camps/own-camp';
import { refuse } from '@/lib/server/errors';
import { exportPeople } from '@/lib/server/people/export-people';
import { route } from '@/lib/server/route';

export const GET = route({
  schema: z.object({ params: z.object({ campId: z.string() }), query: peopleQuerySchema }),
  permission: 'people.export',
  on: { kind: 'camp', param: 'campId' },
  rate: 'export',
  run: ({ params, query }, context) => {
    const camp = isId('cmp', params.campId) ? ownCamp(context.actor, params.campId, 'people.export') : null;
    if (!camp) return refuse('not_found');
    const headers = {
      'content-type': 'text/csv; charset=utf-8',
      'content-disposition': `attachment; filename="${camp.slug}-people.csv"`,
      'cache-control': 'no-store',
      'x-content-type-options': 'nosniff',
    };
    return { ok: true, value: new Response(exportPeople(camp, query, context), { headers }) };
  },
});
