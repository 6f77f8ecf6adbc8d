import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { isId } from '@/lib/domain/shared/ids';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { readNeeds } from '@/lib/server/people/read-needs';
import { NeedsFacts } from '../../_components/needs-facts';

// No name in the title: a tab or a history entry is seen by others.
export const metadata: Metadata = { title: 'Needs' };

export default async function NeedsPage({
  params,
}: PageProps<'/organise/camps/[campId]/people/[registrationId]/needs'>) {
  const { campId, registrationId } = await params;
  const { actor, camp } = await requireCamp(campId, 'people.needs');
  const read = isId('reg', registrationId) ? readNeeds(actor, camp.id, registrationId, Date.now()) : null;
  if (!read) notFound();
  const back = `/organise/camps/${camp.id}/people/${registrationId}` as Route;
  return (
    <>
      <PageHead over={<Link href={back}>{read.name}</Link>} title="Needs and contacts" />
      <Notice title="Keep this to those who need it">
        That you looked is noted. These details are deleted after the camp. Medical questions go to a doctor;
        in an emergency call the local emergency number first.
      </Notice>
      {read.needs ? (
        <NeedsFacts needs={read.needs} minor={read.minor} timeZone={camp.timeZone} />
      ) : (
        <p>Nothing was given, or it has been deleted after the camp.</p>
      )}
    </>
  );
}
