import type { Route } from 'next';
import Link from 'next/link';
import { WorkFrame } from '@/components/ui/work-frame';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { campEntries } from '../../../_components/camp-entries';
import { CampStateMark } from '../../../_components/camp-state';

export default async function CampLayout({ params, children }: LayoutProps<'/organise/camps/[campId]'>) {
  const { actor, camp } = await requireCamp((await params).campId, 'camp.read');
  const back = (
    <Link
      href={`/organise/organisations/${camp.organisationId}` as Route}
      className="inline-flex min-h-target items-center text-small lg:min-h-0"
    >
      All camps
    </Link>
  );
  return (
    <WorkFrame
      name={camp.name}
      entries={campEntries(actor, camp.id, camp.organisationId)}
      head={
        <>
          {back}
          <p className="break-words font-head font-bold leading-tight">{camp.name}</p>
          <p className="text-small">
            <CampStateMark state={camp.state} />
          </p>
        </>
      }
      phoneHead={
        <p className="flex flex-wrap items-center gap-x-4 text-small">
          {back}
          <CampStateMark state={camp.state} />
        </p>
      }
    >
      {children}
    </WorkFrame>
  );
}
