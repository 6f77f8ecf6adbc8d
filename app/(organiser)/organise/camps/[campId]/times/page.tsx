import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { DoneNotice } from '../../../../_components/done-notice';
import { BlockForm } from './_components/block-form';

export const metadata: Metadata = { title: 'Times of day' };

export default async function TimesPage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/times'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  const blocks = loadProgramme(camp.id)?.blocks ?? [];
  return (
    <>
      <DoneNotice done={(await searchParams).done} />
      <PageHead
        over={camp.name}
        title="Times of day"
        lead="The rows of the timetable, the same on every day. Leave 15 minutes between two for changing rooms."
      />
      {blocks.length === 0 ? (
        <Empty title="No times yet">
          <p>Common is: two in the morning, two in the afternoon, one in the evening.</p>
        </Empty>
      ) : (
        <ol className="-mt-6 max-w-prose">
          {blocks.map(({ id, starts, ends, label }) => (
            <li key={id} className="flex flex-wrap items-center gap-x-6 border-b border-line">
              <Link
                href={`/organise/camps/${camp.id}/times/${id}` as Route}
                className="inline-flex min-h-target items-center font-semibold"
              >
                <time>
                  {starts}–{ends}
                </time>
              </Link>
              <span>{label}</span>
              {ends < starts && <span className="text-small text-soft">past midnight</span>}
            </li>
          ))}
        </ol>
      )}
      <h2 className="mb-4 mt-10">Add a time</h2>
      <BlockForm campId={camp.id} />
    </>
  );
}
