import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';
import { can } from '@/lib/domain/access/can';
import { mayPublish, publishChecklist } from '@/lib/domain/camp/publish-checklist';
import { scarcestFirst } from '@/lib/domain/camp/scarcest-first';
import { localDay } from '@/lib/domain/shared/local-time';
import { sayDays } from '@/lib/domain/shared/say-date';
import { listChanges } from '@/lib/server/audit/list-changes';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { countPlaces } from '@/lib/server/registration/count-places';
import { DoneNotice } from '../../../_components/done-notice';
import { ChangeList } from './_components/change-list';
import { PlacesBoard } from './_components/places-board';
import { PublishList } from './_components/publish-list';
import { SaleActions } from './_components/sale-actions';

export const metadata: Metadata = { title: 'Overview' };

const CHANGES_SHOWN = 15;

export default async function CampOverviewPage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]'>) {
  const { actor, camp } = await requireCamp((await params).campId, 'camp.read');
  const programme = loadProgramme(camp.id);
  const places = countPlaces(camp.id);
  if (!programme || !places) return null;
  const edits = can(actor, 'camp.edit', camp);
  const items = publishChecklist(programme, localDay(Date.now(), camp.timeZone));
  const missing = items.filter((item) => item.missing !== null);
  const venue = camp.venueName ? ` · ${camp.venueName}` : '';
  return (
    <>
      <DoneNotice done={(await searchParams).done} />
      <PageHead
        title={camp.name}
        lead={`${sayDays(camp.startsOn, camp.endsOn)}${venue}`}
        actions={
          <SaleActions camp={camp} publishes={can(actor, 'camp.publish', camp)} ready={mayPublish(items)} />
        }
      />
      {camp.state !== 'draft' && (
        <section aria-labelledby="places" className="mb-12">
          <h2 id="places" className="mb-3">
            Places left
          </h2>
          <PlacesBoard scarce={scarcestFirst(places, programme)} />
        </section>
      )}
      {(edits || camp.state === 'draft') && missing.length > 0 && (
        <section aria-labelledby="missing" className="mb-12 max-w-4xl">
          <h2 id="missing" className="mb-3">
            {camp.state === 'draft' ? 'Before you publish' : 'Worth another look'}
          </h2>
          <PublishList campId={camp.id} items={items} mends={edits} />
        </section>
      )}
      {edits && (
        <section aria-labelledby="changes" className="max-w-4xl">
          <h2 id="changes" className="mb-3">
            What changed
          </h2>
          <ChangeList changes={listChanges(camp.id, CHANGES_SHOWN)} timeZone={camp.timeZone} />
        </section>
      )}
    </>
  );
}
