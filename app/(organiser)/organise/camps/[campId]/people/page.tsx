import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';
import { can } from '@/lib/domain/access/can';
import { readPeopleQuery } from '@/lib/schemas/people';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { listPeople } from '@/lib/server/people/list-people';
import { listTracks } from '@/lib/server/people/list-tracks';
import { PeopleScreen } from './_components/people-screen';

export const metadata: Metadata = { title: 'People' };

export default async function PeoplePage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/people'>) {
  const { actor, camp } = await requireCamp((await params).campId, 'people.read');
  const query = readPeopleQuery(await searchParams);
  const first = listPeople(camp.id, query);
  return (
    <>
      <PageHead over={camp.name} title="People" />
      <PeopleScreen
        campId={camp.id}
        timeZone={camp.timeZone}
        tracks={listTracks(camp.id)}
        query={query}
        first={first}
        mayExport={can(actor, 'people.export', camp)}
        mayReadNeeds={can(actor, 'people.needs', camp)}
      />
    </>
  );
}
