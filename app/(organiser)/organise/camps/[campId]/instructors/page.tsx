import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { StateMark } from '@/components/ui/state-mark';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { listInstructors } from '@/lib/server/instructors/list-instructors';
import { DoneNotice } from '../../../../_components/done-notice';
import { MoveButtons } from '../../../../_components/move-buttons';

export const metadata: Metadata = { title: 'Instructors' };

export default async function InstructorsPage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/instructors'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  const instructors = listInstructors(camp.id);
  const workshops = loadProgramme(camp.id)?.workshops ?? [];
  const base = `/organise/camps/${camp.id}/instructors`;
  const add = (
    <ButtonLink tone="primary" href={`${base}/new` as Route}>
      Add an instructor
    </ButtonLink>
  );
  return (
    <>
      <DoneNotice done={(await searchParams).done} />
      <PageHead
        over={camp.name}
        title="Instructors"
        lead="Who teaches at this camp; the public page shows them in this order."
        actions={instructors.length > 0 && add}
      />
      {instructors.length === 0 && (
        <Empty title="No instructors yet">
          <p>Add whoever teaches. An account can be linked later.</p>
          <p className="mt-4">{add}</p>
        </Empty>
      )}
      <ol className={instructors.length > 0 ? '-mt-6' : 'hidden'}>
        {instructors.map((instructor, at) => {
          const taught = workshops.filter(({ instructorIds }) => instructorIds.includes(instructor.id));
          return (
            <li
              key={instructor.id}
              className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-8 gap-y-1 border-b border-line py-3 md:grid-cols-[minmax(0,1fr)_14rem_auto] md:items-center"
            >
              <div className="min-w-0">
                <Link
                  href={`${base}/${instructor.id}` as Route}
                  className="inline-flex min-h-target items-center break-words font-head text-h3 font-bold"
                >
                  {instructor.name}
                </Link>
                <p className="break-words text-soft">
                  {taught.length > 0 ? taught.map(({ title }) => title).join(' · ') : 'Teaches nothing yet.'}
                </p>
              </div>
              <p className="col-start-1 md:col-start-auto">
                {instructor.account ? (
                  <StateMark tone="done">Account linked</StateMark>
                ) : (
                  <StateMark tone="off">No account</StateMark>
                )}
              </p>
              <div className="col-start-2 row-span-2 row-start-1 md:col-start-auto md:row-span-1 md:row-start-auto">
                <MoveButtons
                  campId={camp.id}
                  list="instructors"
                  id={instructor.id}
                  name={instructor.name}
                  first={at === 0}
                  last={at === instructors.length - 1}
                />
              </div>
            </li>
          );
        })}
      </ol>
    </>
  );
}
