import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { TextField } from '@/components/forms/text-field';
import { PageHead } from '@/components/ui/page-head';
import { listCamps } from '@/lib/server/camps/list-camps';
import { requireOrganisation } from '@/lib/server/organisations/require-organisation';
import { CurrencyField, ZoneField } from '../../../../../_components/zone-and-currency';
import { createCampAction } from './actions';

export const metadata: Metadata = { title: 'New camp' };

export default async function NewCampPage({
  params,
}: PageProps<'/organise/organisations/[organisationId]/camps/new'>) {
  const { actor, organisation } = await requireOrganisation((await params).organisationId, 'camp.create');
  const [last] = listCamps(actor, organisation.id);
  return (
    <>
      <PageHead
        over={organisation.name}
        title="New camp"
        lead={
          last
            ? `Much the same as before? Open ${last.name} and choose Copy: it brings tracks, workshops and timetable along.`
            : 'Enough to begin; nobody sees it before you publish it.'
        }
      />
      <ActionForm
        action={createCampAction}
        submit="Make the draft"
        hidden={{ organisationId: organisation.id }}
        defaultValue={last && { timeZone: last.timeZone, currency: last.currency }}
      >
        <TextField name="name" label="Name" hint="Like Kettle Lake Harp Week." />
        <div className="grid gap-6 sm:grid-cols-2">
          <TextField name="startsOn" label="First day" type="date" />
          <TextField name="endsOn" label="Last day" type="date" />
        </div>
        <ZoneField />
        <CurrencyField />
      </ActionForm>
    </>
  );
}
