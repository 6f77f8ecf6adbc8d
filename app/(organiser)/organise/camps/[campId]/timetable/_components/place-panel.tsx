import type { Route } from 'next';
import Link from 'next/link';
import { ActionForm } from '@/components/forms/action-form';
import { SelectField } from '@/components/forms/select-field';
import { LOUDNESS_WORDS } from '@/lib/domain/camp/camp-words';
import { daysBetween } from '@/lib/domain/shared/local-time';
import { sayDay } from '@/lib/domain/shared/say-date';
import type { Programme, ProgrammeMeeting, ProgrammeWorkshop } from '@/lib/domain/timetable/programme';
import { moveMeetingAction, placeMeetingAction, removeMeetingAction } from '../actions';
import { StartFields } from './start-fields';
import { filtersOf, timetableHref, type View } from './view';

type PlacePanelProps = {
  programme: Programme;
  view: View;
  workshop?: ProgrammeWorkshop;
  meeting?: ProgrammeMeeting;
};

/** Place a workshop or move a meeting by form. A place chosen in the grid, or a card, fills it in beforehand. */
export function PlacePanel({ programme, view, workshop, meeting }: PlacePanelProps) {
  const moving = programme.workshops.find(({ id }) => id === meeting?.workshopId);
  const filters = filtersOf(view);
  const starts = view.starts ?? meeting?.starts;
  const inBlock = programme.blocks.some((block) => block.starts === starts);
  const values = {
    workshopId: workshop?.id,
    day: view.day ?? meeting?.day,
    block: inBlock ? starts : '',
    time: inBlock ? '' : (starts ?? ''),
    roomId: view.room ?? meeting?.roomId,
    lengthMinutes: meeting?.lengthMinutes ?? '',
  };
  const open = Boolean(moving ?? workshop ?? view.day);
  const cancel = (
    <Link
      href={timetableHref(programme.camp.id, filters) as Route}
      className="inline-flex min-h-target items-center"
    >
      Leave it
    </Link>
  );
  return (
    <details
      id="place"
      // A chosen cell or card opens it anew with what was chosen.
      key={JSON.stringify(values)}
      open={open}
      className="no-print mb-6 scroll-mt-4 border-2 border-line bg-panel open:border-pine"
    >
      <summary className="min-h-target px-4 py-2 font-head text-h3 font-bold">
        {moving ? `Move ${moving.title}` : workshop ? `Place ${workshop.title}` : 'Place a workshop'}
      </summary>
      <div className="grid gap-4 px-4 pb-4">
        <ActionForm
          action={meeting ? moveMeetingAction : placeMeetingAction}
          submit={meeting ? 'Move' : 'Place'}
          defaultValue={values}
          labels={{ workshopId: 'Workshop', day: 'Day', block: 'Time', time: 'Time', roomId: 'Room' }}
          hidden={{
            campId: programme.camp.id,
            view: filters,
            ...(meeting && { meetingId: meeting.id, updatedAt: meeting.updatedAt }),
          }}
          beside={open && cancel}
          className="grid gap-x-6 gap-y-4 *:col-span-full md:grid-cols-3 md:[&>.field]:col-span-1"
        >
          {!meeting && (
            <div className="field">
              <SelectField
                name="workshopId"
                label="Workshop"
                blank="Choose a workshop"
                choices={programme.workshops.map(({ id, title, lengthMinutes }) => ({
                  value: id,
                  label: `${title} (${lengthMinutes} min)`,
                }))}
              />
            </div>
          )}
          <div className="field">
            <SelectField
              name="day"
              label="Day"
              blank="Choose a day"
              choices={daysBetween(programme.camp.startsOn, programme.camp.endsOn).map((day) => ({
                value: day,
                label: sayDay(day),
              }))}
            />
          </div>
          <div className="field">
            <SelectField
              name="roomId"
              label="Room"
              blank="Choose a room"
              choices={programme.rooms.map(({ id, name, seats, loudness }) => ({
                value: id,
                label: `${name} (${seats} seats, ${LOUDNESS_WORDS[loudness].toLowerCase()})`,
              }))}
            />
          </div>
          <StartFields blocks={programme.blocks} />
        </ActionForm>
        {meeting && moving && (
          <ActionForm
            action={removeMeetingAction}
            submit="Take it off the timetable"
            tone="danger"
            hidden={{
              campId: programme.camp.id,
              view: filters,
              meetingId: meeting.id,
              updatedAt: meeting.updatedAt,
            }}
          />
        )}
      </div>
    </details>
  );
}
