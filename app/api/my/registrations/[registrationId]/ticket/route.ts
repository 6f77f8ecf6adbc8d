import { ok } from '@/lib/domain/shared/result';
import { registrationParamsSchema } from '@/lib/schemas/booking';
import { download } from '@/lib/server/download';
import { refuse } from '@/lib/server/errors';
import { loadOrder } from '@/lib/server/orders/load-order';
import { loadAttendee } from '@/lib/server/packing/load-attendee';
import { route } from '@/lib/server/route';
import { ticketPdf } from '@/lib/server/tickets/ticket-pdf';

export const GET = route({
  schema: registrationParamsSchema,
  permission: 'registration.read',
  on: { kind: 'registration', param: 'registrationId' },
  rate: 'export',
  run: async ({ params }) => {
    const attendee = loadAttendee(params.registrationId);
    const view = attendee && loadOrder(attendee.person.orderId);
    const pdf = view && (await ticketPdf(view, params.registrationId));
    return pdf ? ok(download(pdf, `ticket-${view.order.reference}`, 'pdf')) : refuse('not_found');
  },
});
