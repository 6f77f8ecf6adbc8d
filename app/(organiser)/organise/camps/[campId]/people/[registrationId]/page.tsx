import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { PageHead } from '@/components/ui/page-head';
import { can } from '@/lib/domain/access/can';
import { isId } from '@/lib/domain/shared/ids';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { getPerson } from '@/lib/server/people/get-person';
import { PersonFacts } from '../_components/person-facts';

export const metadata: Metadata = { title: 'Person' };

export default async function PersonPage({
  params,
}: PageProps<'/organise/camps/[campId]/people/[registrationId]'>) {
  const { campId, registrationId } = await params;
  const { actor, camp } = await requireCamp(campId, 'people.read');
  const person = isId('reg', registrationId) ? getPerson(camp.id, registrationId) : null;
  if (!person) notFound();
  return (
    <>
      <PageHead
        over={<Link href={`/organise/camps/${camp.id}/people` as Route}>People</Link>}
        title={person.name}
      />
      <div className="max-w-prose">
        <PersonFacts
          person={person}
          campId={camp.id}
          timeZone={camp.timeZone}
          mayReadNeeds={can(actor, 'people.needs', camp)}
        />
      </div>
    </>
  );
}
