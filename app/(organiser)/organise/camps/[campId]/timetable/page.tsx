import type { Metadata } from 'next';
import { Empty } from '@/components/ui/empty';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { can } from '@/lib/domain/access/can';
import { sayDays } from '@/lib/domain/shared/say-date';
import { buildGrid } from '@/lib/domain/timetable/build-grid';
import { changeoverMinutes } from '@/lib/domain/timetable/changeover';
import { findClashes } from '@/lib/domain/timetable/find-clashes';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { ClashNotice } from './_components/clash-notice';
import { DayTabs } from './_components/day-tabs';
import { DragLayer } from './_components/drag-layer';
import { Filters } from './_components/filters';
import { GridTable } from './_components/grid-table';
import { PlacePanel } from './_components/place-panel';
import { PrintButton } from './_components/print-button';
import { showsMeeting } from './_components/shows-meeting';
import { Unplaced } from './_components/unplaced';
import { filtersOf, readView } from './_components/view';

export const metadata: Metadata = { title: 'Timetable' };
const DONE: Record<string, string> = {
  placed: 'The meeting is placed.',
  moved: 'The meeting is moved.',
  removed: 'The meeting is off the timetable. Its workshop is still there.',
};

export default async function TimetablePage({
  params,
  searchParams,
}: PageProps<'/organise/camps/[campId]/timetable'>) {
  const { actor, camp } = await requireCamp((await params).campId, 'camp.read');
  const programme = loadProgramme(camp.id);
  if (!programme) return null;
  const view = readView(await searchParams);
  const mayEdit = can(actor, 'timetable.edit', { organisationId: camp.organisationId });
  const changeover = changeoverMinutes(programme.blocks);
  const clashes = findClashes(programme, changeover);
  const shown = programme.meetings.filter((meeting) => showsMeeting(programme, meeting, view));
  const grid = buildGrid({ ...programme, meetings: shown });
  const placing = mayEdit
    ? {
        workshop: programme.workshops.find(({ id }) => id === view.place),
        meeting: programme.meetings.find(({ id }) => id === view.move),
      }
    : {};
  const day = grid.days.find((one) => one === view.on) ?? grid.days[0] ?? '';
  const ready = programme.rooms.length > 0 && programme.workshops.length > 0;

  return (
    <>
      <PageHead
        over={
          <>
            {camp.name} · {sayDays(programme.camp.startsOn, programme.camp.endsOn)} ·{' '}
            {programme.camp.timeZone}
          </>
        }
        title="Timetable"
        actions={<PrintButton />}
      />
      {view.done && DONE[view.done] && (
        <Notice tone="done" live>
          {DONE[view.done]}
        </Notice>
      )}
      {ready ? (
        <>
          <ClashNotice clashes={clashes} programme={programme} changeover={changeover} />
          {mayEdit && <PlacePanel programme={programme} view={view} {...placing} />}
          <DragLayer campId={camp.id} view={filtersOf(view)} enabled={mayEdit}>
            {mayEdit && <Unplaced programme={programme} view={view} />}
            <Filters programme={programme} view={view} shown={shown.length} />
            <DayTabs campId={camp.id} days={grid.days} day={day} view={view} />
            <GridTable
              programme={programme}
              grid={grid}
              clashes={clashes}
              view={view}
              day={day}
              mayEdit={mayEdit}
              changeover={changeover}
              {...placing}
            />
          </DragLayer>
        </>
      ) : (
        <Empty title="No timetable yet">
          A meeting is a workshop at a time in a room. Add rooms, times of day and workshops first; they then
          wait here to be placed.
        </Empty>
      )}
    </>
  );
}
