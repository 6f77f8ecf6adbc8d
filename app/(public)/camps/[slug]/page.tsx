import type { Metadata } from 'next';
import { headers } from 'next/headers';
import { notFound } from 'next/navigation';
import { CampPage } from '@/components/camp/camp-page';
import { EventScript } from '@/components/camp/event-script';
import { PlacesWatch } from '@/components/camp/places-watch';
import { toLivePlaces } from '@/lib/domain/camp/live-places';
import { sayDays } from '@/lib/domain/shared/say-date';
import { eventData } from '@/lib/server/camps/event-data';
import { getPublicCamp } from '@/lib/server/camps/get-public-camp';
import { env } from '@/lib/server/env';

type PageProps = { params: Promise<{ slug: string }> };

export async function generateMetadata({ params }: PageProps): Promise<Metadata> {
  const found = getPublicCamp((await params).slug);
  if (!found) return {};
  const { camp } = found.programme;
  const when = `${sayDays(camp.startsOn, camp.endsOn)}${camp.venueName && `, ${camp.venueName}`}`;
  const description = [when, camp.summary].filter(Boolean).join('. ');
  const canonical = `/camps/${camp.slug}`;
  const share = { url: `${canonical}/share.png`, width: 1200, height: 630, alt: `${camp.name}, ${when}` };
  return {
    title: camp.name,
    description,
    alternates: { canonical, types: { 'text/calendar': `${canonical}/calendar.ics` } },
    openGraph: { title: camp.name, description, url: canonical, siteName: 'Combwood', images: [share] },
    twitter: { card: 'summary_large_image', title: camp.name, description, images: [share] },
  };
}

export default async function Page({ params }: PageProps) {
  const found = getPublicCamp((await params).slug);
  if (!found) notFound();
  const { programme, harps, places, standing } = found;
  const sells = standing === 'open' || standing === 'full';
  return (
    <>
      <EventScript
        data={eventData(found, env().BASE_URL)}
        nonce={(await headers()).get('x-nonce') ?? undefined}
      />
      <CampPage
        programme={programme}
        harps={harps}
        places={places}
        standing={standing}
        watch={sells && <PlacesWatch slug={programme.camp.slug} left={toLivePlaces(places).camp.left} />}
      />
    </>
  );
}
