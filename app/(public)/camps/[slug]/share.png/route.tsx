import { ImageResponse } from 'next/og';
import { SharePicture } from '@/components/camp/share-picture';
import { toLivePlaces } from '@/lib/domain/camp/live-places';
import { ok } from '@/lib/domain/shared/result';
import { sayDays } from '@/lib/domain/shared/say-date';
import { campAddressSchema } from '@/lib/schemas/camp-address';
import { getPublicCamp } from '@/lib/server/camps/get-public-camp';
import { refuse } from '@/lib/server/errors';
import { route } from '@/lib/server/route';

/** A plain route rather than the `opengraph-image` convention, whose address inside a route group is not ours to know. */
export const GET = route({
  schema: campAddressSchema,
  permission: 'public.read',
  // Drawing costs a tenth of a second of the processor, as much as a PDF.
  rate: 'export',
  run: ({ params }) => {
    const found = getPublicCamp(params.slug);
    if (!found) return refuse('not_found');
    const { startsOn, endsOn } = found.programme.camp;
    const { left, of } = toLivePlaces(found.places).camp;
    const picture = <SharePicture days={sayDays(startsOn, endsOn)} left={left} of={of} />;
    const headers = { 'cache-control': 'public, max-age=600' };
    return ok(new ImageResponse(picture, { width: 1200, height: 630, headers }));
  },
});
