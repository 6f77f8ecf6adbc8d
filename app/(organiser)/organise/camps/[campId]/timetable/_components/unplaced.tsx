import type { Route } from 'next';
import Link from 'next/link';
import type { Programme } from '@/lib/domain/timetable/programme';
import { KIND_WORDS } from '@/lib/domain/timetable/workshop-words';
import { filtersOf, timetableHref, type View } from './view';

/** Workshops that meet nowhere yet: choose one to place it, or drag it to a free place. */
export function Unplaced({ programme, view }: { programme: Programme; view: View }) {
  const placed = new Set(programme.meetings.map(({ workshopId }) => workshopId));
  const waiting = programme.workshops.filter(({ id }) => !placed.has(id));
  if (waiting.length === 0) return null;
  return (
    <section aria-labelledby="unplaced" className="no-print mb-6">
      <h2 id="unplaced" className="text-h3">
        Not placed yet: {waiting.length}
      </h2>
      <ul className="mt-2 flex flex-wrap gap-2">
        {waiting.map((workshop) => (
          <li key={workshop.id}>
            <Link
              href={
                `${timetableHref(programme.camp.id, filtersOf(view), { place: workshop.id })}#place` as Route
              }
              draggable
              data-workshop={workshop.id}
              aria-current={view.place === workshop.id ? 'true' : undefined}
              className="inline-flex min-h-target flex-col justify-center rounded border-2 border-dashed border-edge px-3 py-1 text-ink no-underline hover:border-pine aria-[current]:border-solid aria-[current]:border-pine"
            >
              <span className="font-semibold leading-tight">{workshop.title}</span>
              <span className="text-small text-soft">
                {KIND_WORDS[workshop.kind]}, {workshop.lengthMinutes} min
              </span>
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
