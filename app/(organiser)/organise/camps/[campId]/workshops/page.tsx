import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { HarpName } from '@/components/harp/harp-name';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { needSentence } from '@/lib/domain/harp/need-sentence';
import { listWords } from '@/lib/domain/shared/list-words';
import type { Programme } from '@/lib/domain/timetable/programme';
import { AUDIENCE_WORDS, KIND_WORDS, WORKSHOP_AUDIENCES } from '@/lib/domain/timetable/workshop-words';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { DoneNotice } from '../../../../_components/done-notice';

export const metadata: Metadata = { title: 'Workshops' };

export default async function WorkshopsPage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/workshops'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.edit');
  const programme = loadProgramme(camp.id);
  if (!programme) return null;
  const base = `/organise/camps/${camp.id}/workshops`;
  const add = (
    <ButtonLink tone="primary" href={`${base}/new` as Route}>
      Add a workshop
    </ButtonLink>
  );
  return (
    <>
      <DoneNotice done={(await searchParams).done} />
      <PageHead
        over={camp.name}
        title="Workshops"
        lead="What is taught and played. Each says who comes and which harps it needs; the timetable says when."
        actions={programme.workshops.length > 0 && add}
      />
      {programme.workshops.length === 0 && (
        <Empty title="No workshops yet">
          <p>Begin with the core workshops, one or more for each track.</p>
          <p className="mt-4">{add}</p>
        </Empty>
      )}
      {WORKSHOP_AUDIENCES.map((audience) => {
        const rows = programme.workshops.filter((workshop) => workshop.audience === audience);
        if (rows.length === 0) return null;
        return (
          <section key={audience} aria-labelledby={audience} className="mb-10">
            <h2 id={audience} className="mb-2">
              {audience === 'core'
                ? 'Core workshops'
                : audience === 'elective'
                  ? 'Electives'
                  : AUDIENCE_WORDS[audience]}
            </h2>
            <ul className="border-t-2 border-ink">
              {rows.map((workshop) => (
                <WorkshopRow key={workshop.id} base={base} workshop={workshop} programme={programme} />
              ))}
            </ul>
          </section>
        );
      })}
    </>
  );
}

type WorkshopRowProps = { base: string; workshop: Programme['workshops'][number]; programme: Programme };

function WorkshopRow({ base, workshop, programme }: WorkshopRowProps) {
  const names = (ids: readonly string[], rows: readonly { id: string; name: string }[]) =>
    listWords(rows.filter(({ id }) => ids.includes(id)).map(({ name }) => name));
  const placed = programme.meetings.filter(({ workshopId }) => workshopId === workshop.id);
  const meetings = placed.length;
  const lengths = [...new Set(placed.map(({ lengthMinutes }) => lengthMinutes))].sort((a, b) => a - b);
  const others = lengths.filter((minutes) => minutes !== workshop.lengthMinutes);
  const facts = [
    KIND_WORDS[workshop.kind],
    `${workshop.lengthMinutes} min`,
    workshop.capacity === null ? null : `${workshop.capacity} at most`,
    names(workshop.trackIds, programme.tracks),
    names(workshop.instructorIds, programme.instructors),
  ].filter(Boolean);
  return (
    <li className="grid gap-x-8 gap-y-1 border-b border-line py-3 md:grid-cols-[minmax(0,1fr)_8rem]">
      <div className="min-w-0">
        <Link
          href={`${base}/${workshop.id}` as Route}
          className="inline-flex min-h-target items-center break-words font-head text-h3 font-bold"
        >
          {workshop.title}
        </Link>
        <p className="break-words text-soft">{facts.join(' · ')}</p>
        {workshop.needs.length > 0 && (
          <ul className="mt-1">
            {workshop.needs.map((need) => (
              <li key={needSentence(need)} className="text-small">
                <HarpName>{needSentence(need)}</HarpName>
              </li>
            ))}
          </ul>
        )}
      </div>
      <p className="text-small text-soft md:pt-3 md:text-right">
        {meetings === 0 ? 'Not placed yet' : `${meetings} ${meetings === 1 ? 'meeting' : 'meetings'}`}
        {others.length > 0 && `, placed with ${listWords(others.map(String), 'and')} min`}
      </p>
    </li>
  );
}
