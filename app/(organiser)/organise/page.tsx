import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { WorkFrame } from '@/components/ui/work-frame';
import { can } from '@/lib/domain/access/can';
import { ROLE_WORDS } from '@/lib/domain/access/roles';
import { requirePermission } from '@/lib/server/access/require-permission';
import { listCamps } from '@/lib/server/camps/list-camps';
import { listNextSteps } from '@/lib/server/camps/list-next-steps';
import { listOrganisations } from '@/lib/server/organisations/list-organisations';
import { CampList } from '../_components/camp-list';

export const metadata: Metadata = { title: 'Organise' };

export default async function OrganisePage() {
  const actor = await requirePermission('account.own');
  const organisations = listOrganisations(actor);
  const camps = listCamps(actor);
  const next = listNextSteps(camps, Date.now());
  return (
    <WorkFrame name="Organise" entries={[]}>
      <PageHead
        title="Organise"
        lead={organisations.length > 0 ? 'Your organisations and their camps.' : undefined}
        actions={
          organisations.length > 0 && (
            <ButtonLink href={'/organise/new' as Route}>Add an organisation</ButtonLink>
          )
        }
      />
      {organisations.length === 0 && (
        <Empty title="You organise nothing yet">
          <p>
            Start an organisation to run camps of your own. To help with someone else’s, ask its organiser for
            an invitation by e-mail.
          </p>
          <p className="mt-4">
            <ButtonLink tone="primary" href={'/organise/new' as Route}>
              Start an organisation
            </ButtonLink>
          </p>
        </Empty>
      )}
      {organisations.map((organisation) => {
        const own = camps.filter((camp) => camp.organisationId === organisation.id);
        const base = `/organise/organisations/${organisation.id}`;
        const creates = can(actor, 'camp.create', { organisationId: organisation.id });
        return (
          <section key={organisation.id} aria-labelledby={organisation.id} className="mb-12">
            <div className="mb-3 flex flex-wrap items-end justify-between gap-x-8 gap-y-2">
              <div>
                <h2 id={organisation.id} className="break-words">
                  <Link href={base as Route} className="text-ink">
                    {organisation.name}
                  </Link>
                </h2>
                <p className="text-small text-soft">
                  You are {organisation.roles.map((role) => ROLE_WORDS[role].toLowerCase()).join(' and ')}.
                </p>
              </div>
              {creates && <ButtonLink href={`${base}/camps/new` as Route}>New camp</ButtonLink>}
            </div>
            {own.length > 0 ? (
              <CampList camps={own} label={`Camps of ${organisation.name}`} next={next} />
            ) : (
              <Empty title="No camps yet">
                <p>
                  {creates
                    ? 'Make the first one: a name and dates are enough to begin.'
                    : 'Nothing to do here yet.'}
                </p>
              </Empty>
            )}
          </section>
        );
      })}
    </WorkFrame>
  );
}
