import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { CheckField } from '@/components/forms/check-field';
import { TextField } from '@/components/forms/text-field';
import { PageHead } from '@/components/ui/page-head';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import type { CampRow } from '@/lib/server/camps/own-camp';
import { priceText } from '@/lib/server/camps/read-price';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { countPlaces } from '@/lib/server/registration/count-places';
import { CurrencyField, ZoneField } from '../../../../_components/zone-and-currency';
import { FieldGroup } from '../_components/field-group';
import { editCampAction } from './actions';

export const metadata: Metadata = { title: 'Details' };

export default async function DetailsPage({ params }: PageProps<'/organise/camps/[campId]/details'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  const meetings = loadProgramme(camp.id)?.meetings.length ?? 0;
  const taken = countPlaces(camp.id)?.camp.taken ?? 0;
  return (
    <>
      <PageHead over={camp.name} title="Details" />
      <ActionForm
        action={editCampAction}
        submit="Save"
        hidden={{ campId: camp.id, version: camp.version }}
        defaultValue={detailsOf(camp)}
        className="grid max-w-prose gap-10"
      >
        <FieldGroup title="What and when">
          <TextField name="name" label="Name" />
          <TextField
            name="slug"
            label="Web name"
            hint={
              camp.state === 'draft'
                ? `The end of its address: /camps/${camp.slug}`
                : 'Fixed once it was on sale.'
            }
            spellCheck={false}
            autoCapitalize="off"
          />
          <div className="grid gap-6 sm:grid-cols-2">
            <TextField name="startsOn" label="First day" type="date" />
            <TextField name="endsOn" label="Last day" type="date" />
          </div>
          {meetings > 0 && (
            <CheckField
              name="moveMeetings"
              label={`Let all ${meetings} meetings go along, by as many days as the first day moves`}
            />
          )}
          <TextField
            name="arrivalFrom"
            label="Arrival from"
            type="time"
            hint="When the door opens on the first day."
          />
          <ZoneField current={camp.timeZone} />
          {meetings > 0 && (
            <CheckField
              name="zoneConfirmed"
              label="If the zone changes: meetings keep their clock times, and that is right"
            />
          )}
        </FieldGroup>
        <FieldGroup title="Where">
          <TextField name="venueName" label="Venue" autoComplete="off" />
          <TextField name="venueAddress" label="Address" autoComplete="off" />
        </FieldGroup>
        <FieldGroup title="Places and money">
          <TextField
            name="capacity"
            label="Places in all"
            inputMode="numeric"
            hint={taken > 0 ? `${taken} are taken or held.` : 'As many as beds, rooms and tracks can bear.'}
          />
          <CurrencyField />
          <TextField
            name="price"
            label="Price of a place"
            inputMode="decimal"
            optional
            hint="What a player pays unless their track has its own price. Whether tax is in it, ask somebody licensed to say."
          />
          <TextField
            name="refundTerms"
            label="Refund terms"
            rows={5}
            optional
            hint="Until when how much comes back, by date. Shown before paying and kept with each order."
          />
        </FieldGroup>
        <FieldGroup title="In words">
          <TextField
            name="summary"
            label="Summary"
            optional
            hint="One sentence for lists and shared links."
          />
          <TextField
            name="description"
            label="Description"
            rows={10}
            optional
            hint="Plain text; an empty line begins a paragraph."
          />
        </FieldGroup>
      </ActionForm>
    </>
  );
}

/** What the form begins with: its own fields, not the row. */
const detailsOf = (camp: CampRow) => ({
  name: camp.name,
  slug: camp.slug,
  startsOn: camp.startsOn,
  endsOn: camp.endsOn,
  arrivalFrom: camp.arrivalFrom,
  timeZone: camp.timeZone,
  venueName: camp.venueName,
  venueAddress: camp.venueAddress,
  capacity: camp.capacity,
  currency: camp.currency,
  price: priceText(camp.price, camp.currency),
  refundTerms: camp.refundTerms,
  summary: camp.summary,
  description: camp.description,
});
