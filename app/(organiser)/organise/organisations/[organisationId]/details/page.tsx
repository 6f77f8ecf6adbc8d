import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { PageHead } from '@/components/ui/page-head';
import { requireOrganisation } from '@/lib/server/organisations/require-organisation';
import { OrganisationFields } from '../../../../_components/organisation-fields';
import { editOrganisationAction } from './actions';

export const metadata: Metadata = { title: 'Details of the organisation' };

export default async function OrganisationDetailsPage({
  params,
}: PageProps<'/organise/organisations/[organisationId]/details'>) {
  const { organisation } = await requireOrganisation((await params).organisationId, 'organisation.edit');
  const { id, name, email } = organisation;
  return (
    <>
      <PageHead over={name} title="Details" />
      <ActionForm
        action={editOrganisationAction}
        submit="Save"
        hidden={{ organisationId: id }}
        defaultValue={{ name, email }}
      >
        <OrganisationFields />
      </ActionForm>
    </>
  );
}
