import Link from 'next/link';
import { WorkFrame } from '@/components/ui/work-frame';
import { requireOrganisation } from '@/lib/server/organisations/require-organisation';
import { organisationEntries } from '../../../_components/organisation-entries';

export default async function OrganisationLayout({
  params,
  children,
}: LayoutProps<'/organise/organisations/[organisationId]'>) {
  const { actor, organisation } = await requireOrganisation(
    (await params).organisationId,
    'organisation.read',
  );
  const back = (
    <Link href="/organise" className="inline-flex min-h-target items-center text-small lg:min-h-0">
      Everything I organise
    </Link>
  );
  return (
    <WorkFrame
      name={organisation.name}
      entries={organisationEntries(actor, organisation.id)}
      head={
        <>
          {back}
          <p className="break-words font-head font-bold leading-tight">{organisation.name}</p>
        </>
      }
      phoneHead={back}
    >
      {children}
    </WorkFrame>
  );
}
