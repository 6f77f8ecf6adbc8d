import { notFound } from 'next/navigation';
import { CampPage } from '@/components/camp/camp-page';
import { PlacesWatch } from '@/components/camp/places-watch';
import { toLivePlaces } from '@/lib/domain/camp/live-places';
import { getPublicCamp } from '@/lib/server/camps/get-public-camp';

type PageProps = { params: Promise<{ slug: string }> };

export default async function Page({ params }: PageProps) {
  const found = getPublicCamp((await params).slug);
  if (!found) notFound();
  const { programme, places, standing } = found;
  const sells = standing === 'open' || standing === 'full';
  return (
    <CampPage
      programme={programme}
      places={places}
      standing={standing}
      watch={sells && <PlacesWatch slug={programme.camp.slug} left={toLivePlaces(places).camp.left} />}
    />
  );
}
