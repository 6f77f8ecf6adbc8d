import 'server-only';
import type { Event, ItemAvailability, WithContext } from 'schema-dts';
import { Temporal } from 'temporal-polyfill';
import { type CampStanding, placesLeft } from '@/lib/domain/camp/camp-standing';
import { priceFrom } from '@/lib/domain/camp/price-from';
import { decimalMoney } from '@/lib/domain/shared/decimal-money';
import type { PublicCamp } from './get-public-camp';

/** A camp as schema.org has events, for search engines and calendars. `base` is the site's address. */
export function eventData(
  { programme, places, standing }: Omit<PublicCamp, 'harps'>,
  base: string,
): WithContext<Event> {
  const { camp, tracks, instructors, pictures } = programme;
  const url = `${base}/camps/${camp.slug}`;
  const price = priceFrom(camp, tracks);
  return {
    '@context': 'https://schema.org',
    '@type': 'Event',
    '@id': `${url}#event`,
    url,
    name: camp.name,
    description: camp.summary || camp.description.slice(0, 300),
    startDate: withOffset(camp.startsOn, camp.arrivalFrom, camp.timeZone),
    endDate: camp.endsOn,
    eventStatus: 'https://schema.org/EventScheduled',
    eventAttendanceMode: 'https://schema.org/OfflineEventAttendanceMode',
    location: { '@type': 'Place', name: camp.venueName, address: camp.venueAddress },
    organizer: { '@type': 'Organization', name: camp.organisationName, email: camp.organisationEmail },
    performer: instructors.map(({ name }) => ({ '@type': 'Person', name })),
    image: [...pictures.map(({ id }) => `${base}/api/pictures/${id}`), `${url}/share.png`],
    maximumAttendeeCapacity: camp.capacity,
    remainingAttendeeCapacity: placesLeft(places),
    ...(price && {
      offers: {
        '@type': 'Offer',
        url,
        price: decimalMoney(price.price, camp.currency),
        priceCurrency: camp.currency,
        availability: AVAILABILITY[standing],
      },
    }),
  };
}

const AVAILABILITY = {
  open: 'https://schema.org/InStock',
  full: 'https://schema.org/SoldOut',
  closed: 'https://schema.org/OutOfStock',
  begun: 'https://schema.org/OutOfStock',
  past: 'https://schema.org/OutOfStock',
  draft: 'https://schema.org/OutOfStock',
} satisfies Record<CampStanding, ItemAvailability>;

/** `2026-06-08T14:00:00+02:00`: the door's opening with the zone's offset on that day. */
const withOffset = (day: string, time: string, timeZone: string): string =>
  Temporal.PlainDateTime.from(`${day}T${time}`).toZonedDateTime(timeZone).toString({ timeZoneName: 'never' });
