import { headers } from 'next/headers';
import { toLivePlaces } from '@/lib/domain/camp/live-places';
import { ok } from '@/lib/domain/shared/result';
import { campAddressSchema } from '@/lib/schemas/camp-address';
import { findPublicCampId } from '@/lib/server/camps/get-public-camp';
import { refuse } from '@/lib/server/errors';
import { countPlaces } from '@/lib/server/registration/count-places';
import { respondWithEtag } from '@/lib/server/respond-with-etag';
import { route } from '@/lib/server/route';

export const GET = route({
  schema: campAddressSchema,
  permission: 'public.read',
  run: async ({ params }) => {
    const id = findPublicCampId(params.slug);
    const places = id && countPlaces(id);
    if (!places) return refuse('not_found');
    const text = JSON.stringify(toLivePlaces(places));
    return ok(respondWithEtag(text, (await headers()).get('if-none-match'), 'application/json', 5));
  },
});
