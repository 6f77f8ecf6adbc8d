import { headers } from 'next/headers';
import { ok } from '@/lib/domain/shared/result';
import { campAddressSchema } from '@/lib/schemas/camp-address';
import { meetingsCalendar } from '@/lib/server/calendar/meetings-calendar';
import { findPublicCampId } from '@/lib/server/camps/get-public-camp';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { env } from '@/lib/server/env';
import { refuse } from '@/lib/server/errors';
import { respondWithEtag } from '@/lib/server/respond-with-etag';
import { route } from '@/lib/server/route';

export const GET = route({
  schema: campAddressSchema,
  permission: 'public.read',
  run: async ({ params }) => {
    const id = findPublicCampId(params.slug);
    const programme = id && loadProgramme(id);
    if (!programme) return refuse('not_found');
    const { meetings, camp } = programme;
    const url = `${env().BASE_URL}/camps/${camp.slug}`;
    const text = meetingsCalendar({ programme, meetings, name: camp.name, url });
    return ok(
      respondWithEtag(text, (await headers()).get('if-none-match'), 'text/calendar; charset=utf-8', 300),
    );
  },
});
