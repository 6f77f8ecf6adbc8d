import { ok } from '@/lib/domain/shared/result';
import { receiptParamsSchema } from '@/lib/schemas/booking';
import { download } from '@/lib/server/download';
import { refuse } from '@/lib/server/errors';
import { loadOrder } from '@/lib/server/orders/load-order';
import { receiptPdf } from '@/lib/server/orders/receipt-pdf';
import { route } from '@/lib/server/route';

export const GET = route({
  schema: receiptParamsSchema,
  permission: 'order.read',
  on: { kind: 'order', param: 'orderId' },
  rate: 'export',
  run: async ({ params }) => {
    const view = loadOrder(params.orderId);
    const pdf = view && (await receiptPdf(view, params.number));
    return pdf ? ok(download(pdf, `receipt-${params.number}`, 'pdf')) : refuse('not_found');
  },
});
