import { ok } from '@/lib/domain/shared/result';
import { orderParamsSchema } from '@/lib/schemas/booking';
import { download } from '@/lib/server/download';
import { refuse } from '@/lib/server/errors';
import { loadOrder } from '@/lib/server/orders/load-order';
import { route } from '@/lib/server/route';
import { ticketPdf } from '@/lib/server/tickets/ticket-pdf';

export const GET = route({
  schema: orderParamsSchema,
  permission: 'order.read',
  on: { kind: 'order', param: 'orderId' },
  rate: 'export',
  run: async ({ params }) => {
    const view = loadOrder(params.orderId);
    const pdf = view && (await ticketPdf(view));
    return pdf ? ok(download(pdf, `tickets-${view.order.reference}`, 'pdf')) : refuse('not_found');
  },
});
