import type { ReactNode } from 'react';
import type { CampStanding } from '@/lib/domain/camp/camp-standing';
import { toLivePlaces } from '@/lib/domain/camp/live-places';
import type { CampPlaces } from '@/lib/domain/camp/places';
import { priceFrom } from '@/lib/domain/camp/price-from';
import type { TrackHarps } from '@/lib/domain/packing/track-harps';
import type { Programme } from '@/lib/domain/timetable/programme';
import { PlainText } from '../ui/plain-text';
import { Section } from '../ui/section';
import { CampPictures } from './camp-pictures';
import { CampPoster } from './camp-poster';
import { CampStandingNote } from './camp-standing-note';
import { InstructorList } from './instructor-list';
import { PageParts } from './page-parts';
import { PlacesSpot } from './places-spot';
import { ProgrammeBoard } from './programme-board';
import { TakingPart } from './taking-part';
import { TrackList } from './track-list';
import { WorkshopList } from './workshop-list';

type CampPageProps = {
  programme: Programme;
  places: CampPlaces;
  standing: CampStanding;
  /** Worked out already, where the page is read often. */
  harps?: TrackHarps;
  /** What keeps the counts fresh; absent in the organiser's preview. */
  watch?: ReactNode;
};

/** A camp as the public sees it; the organiser's preview shows this very page. */
export function CampPage({ programme, places, standing, harps, watch }: CampPageProps) {
  const { camp, tracks, instructors } = programme;
  const sells = standing === 'open' || standing === 'full' || standing === 'draft';
  const namesPosition = programme.workshops.some(({ needs }) =>
    needs.some(({ anyOf }) => anyOf.some(({ by }) => by !== 'harp')),
  );
  const { left, of } = toLivePlaces(places).camp;
  return (
    <article>
      <CampPoster camp={camp} price={priceFrom(camp, tracks)}>
        <div className="grid gap-4">
          {sells && <PlacesSpot slug={camp.slug} left={left} of={of} />}
          <CampStandingNote
            standing={standing}
            registerHref={`/camps/${camp.slug}/register/who`}
            email={camp.organisationEmail}
          />
          {watch}
        </div>
      </CampPoster>
      <PageParts
        parts={[
          tracks.length > 0 && { id: 'tracks', title: 'Tracks and harps' },
          { id: 'programme', title: 'Programme' },
          { id: 'workshops', title: 'Workshops' },
          instructors.length > 0 && { id: 'instructors', title: 'Instructors' },
          { id: 'taking-part', title: 'Taking part' },
        ]}
      />
      {camp.description && <PlainText text={camp.description} className="mt-10 text-lead" />}
      <CampPictures pictures={programme.pictures} />
      {tracks.length > 0 && (
        <Section
          id="tracks"
          title="Tracks and harps"
          note="Chips show the key on the cover, lowest harp first."
        >
          <TrackList programme={programme} harps={harps} places={sells ? places.tracks : []} />
        </Section>
      )}
      <Section id="programme" title="Programme" note={`Times are local: ${camp.timeZone}.`} wide>
        <ProgrammeBoard programme={programme} />
      </Section>
      <Section
        id="workshops"
        title="Workshops"
        note={namesPosition && 'A position says how a song lies on the harp. Take the harp after the arrow.'}
      >
        <WorkshopList programme={programme} />
      </Section>
      {instructors.length > 0 && (
        <Section id="instructors" title="Instructors">
          <InstructorList instructors={instructors} />
        </Section>
      )}
      <Section id="taking-part" title="Taking part">
        <TakingPart camp={camp} />
      </Section>
    </article>
  );
}
