import { z } from 'zod';
import { isId } from '@/lib/domain/shared/ids';
import { scanSchema } from '@/lib/schemas/scan';
import { recordScan } from '@/lib/server/door/record-scan';
import { refuse } from '@/lib/server/errors';
import { route } from '@/lib/server/route';

export const POST = route({
  schema: z.object({ params: z.object({ campId: z.string() }), body: scanSchema }),
  permission: 'door.work',
  on: { kind: 'camp', param: 'campId' },
  rate: 'scan',
  limit: 4096,
  run: ({ params, body }, { actor, now }) => {
    if (!isId('cmp', params.campId) || !actor.user) return refuse('not_found');
    const scanned = recordScan(params.campId, body, { userId: actor.user.id, now });
    return scanned.ok ? { ok: true, value: Response.json(scanned.value) } : scanned;
  },
});
