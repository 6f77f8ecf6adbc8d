import type { Route } from 'next';
import Link from 'next/link';
import { Button } from '@/components/ui/button';
import type { Programme } from '@/lib/domain/timetable/programme';
import { PickFilter } from './pick-filter';
import { timetableHref, type View } from './view';

type FiltersProps = { programme: Programme; view: View; shown: number };

/** Plain GET form: the address says what is shown, and it works without JavaScript. */
export function Filters({ programme, view, shown }: FiltersProps) {
  const filtered = Boolean(view.track ?? view.instructor ?? view.in);
  return (
    <form
      method="get"
      action={timetableHref(programme.camp.id, '')}
      className="no-print mb-4 grid grid-cols-2 items-end gap-x-4 gap-y-3 sm:flex sm:flex-wrap"
    >
      {view.on && <input type="hidden" name="on" value={view.on} />}
      <PickFilter name="track" label="Track" value={view.track} all="All tracks" rows={programme.tracks} />
      <PickFilter
        name="instructor"
        label="Instructor"
        value={view.instructor}
        all="All instructors"
        rows={programme.instructors}
      />
      <PickFilter name="in" label="Room" value={view.in} all="All rooms" rows={programme.rooms} />
      <div className="flex items-center gap-4">
        <Button type="submit">Show</Button>
        {filtered && (
          <Link
            href={timetableHref(programme.camp.id, view.on ? `on=${view.on}` : '') as Route}
            className="inline-flex min-h-target items-center"
          >
            Show all
          </Link>
        )}
      </div>
      <p className="col-span-2 text-soft sm:ml-auto sm:py-2" role="status">
        {shown === programme.meetings.length
          ? `${shown} meetings`
          : `${shown} of ${programme.meetings.length} meetings`}
      </p>
    </form>
  );
}
