import type { Metadata, Route } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { can } from '@/lib/domain/access/can';
import { listCamps } from '@/lib/server/camps/list-camps';
import { listNextSteps } from '@/lib/server/camps/list-next-steps';
import { requireOrganisation } from '@/lib/server/organisations/require-organisation';
import { CampList } from '../../../_components/camp-list';
import { DoneNotice } from '../../../_components/done-notice';

export const metadata: Metadata = { title: 'Camps' };

export default async function OrganisationPage({
  params,
  searchParams,
}: PageProps<'/organise/organisations/[organisationId]'>) {
  const { actor, organisation } = await requireOrganisation(
    (await params).organisationId,
    'organisation.read',
  );
  const camps = listCamps(actor, organisation.id);
  const next = listNextSteps(camps, Date.now());
  const creates = can(actor, 'camp.create', { organisationId: organisation.id });
  const make = (tone: 'primary' | 'plain') => (
    <ButtonLink tone={tone} href={`/organise/organisations/${organisation.id}/camps/new` as Route}>
      New camp
    </ButtonLink>
  );
  return (
    <>
      <DoneNotice done={(await searchParams).done} />
      <PageHead
        over={organisation.name}
        title="Camps"
        actions={creates && camps.length > 0 && make('primary')}
      />
      {camps.length > 0 ? (
        <CampList camps={camps} label={`Camps of ${organisation.name}`} next={next} />
      ) : (
        <Empty title="No camps yet">
          <p>
            {creates ? 'A name and dates are enough to begin; the rest can wait.' : 'Nothing to do here yet.'}
          </p>
          {creates && <p className="mt-4">{make('primary')}</p>}
        </Empty>
      )}
    </>
  );
}
