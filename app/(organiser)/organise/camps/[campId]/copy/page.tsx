import type { Metadata } from 'next';
import { ActionForm } from '@/components/forms/action-form';
import { CheckField } from '@/components/forms/check-field';
import { TextField } from '@/components/forms/text-field';
import { PageHead } from '@/components/ui/page-head';
import { dayAfter } from '@/lib/domain/camp/day-offset';
import { sayDays } from '@/lib/domain/shared/say-date';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { copyCampAction } from './actions';

export const metadata: Metadata = { title: 'Copy' };

/** 52 weeks: the same weekday, about a year on. */
const YEAR_DAYS = 364;

export default async function CopyPage({ params }: PageProps<'/organise/camps/[campId]/copy'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  return (
    <>
      <PageHead
        over={camp.name}
        title="Copy to a new camp"
        lead="Tracks, rooms, instructors, workshops with their harps, times of day and the timetable come along, moved to the new dates. People, orders and money stay here."
      />
      <ActionForm
        action={copyCampAction}
        submit="Make the copy"
        hidden={{ campId: camp.id }}
        defaultValue={{
          name: camp.name,
          startsOn: dayAfter(camp.startsOn, YEAR_DAYS),
          withPictures: 'on',
        }}
      >
        <TextField name="name" label="Name of the new camp" />
        <TextField
          name="startsOn"
          label="Its first day"
          type="date"
          hint={`This camp: ${sayDays(camp.startsOn, camp.endsOn)}. The copy lasts as long; suggested is the same weekday, 52 weeks on.`}
        />
        <CheckField name="withPictures" label="Copy the pictures too" />
      </ActionForm>
    </>
  );
}
