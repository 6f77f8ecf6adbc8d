import { ok } from '@/lib/domain/shared/result';
import { registrationParamsSchema } from '@/lib/schemas/booking';
import { download } from '@/lib/server/download';
import { refuse } from '@/lib/server/errors';
import { attendeeCalendar } from '@/lib/server/orders/order-calendars';
import { loadAttendee } from '@/lib/server/packing/load-attendee';
import { route } from '@/lib/server/route';

export const GET = route({
  schema: registrationParamsSchema,
  permission: 'registration.read',
  on: { kind: 'registration', param: 'registrationId' },
  run: ({ params }) => {
    const attendee = loadAttendee(params.registrationId);
    const text = attendee && attendeeCalendar(attendee);
    return text
      ? ok(download(text, `timetable-${attendee.person.reference}`, 'ics'))
      : refuse('not_found', { sentence: 'No meetings have a time yet. Look again nearer the camp.' });
  },
});
