import 'server-only';
import { eq } from 'drizzle-orm';
import { createElement } from 'react';
import { refund } from '@/db/schema/money';
import { LatePayment, latePaymentSubject } from '@/emails/late-payment';
import { isId } from '@/lib/domain/shared/ids';
import { getDb } from '../../db';
import type { LoadLetter } from '../letter';
import { orderLink } from '../links';
import { organiserAddress } from './organiser-address';
import { requireOrder } from './require-order';
import { requirePayload } from './require-payload';

export const loadLatePayment: LoadLetter = ({ payload, toName }) => {
  const view = requireOrder(requirePayload(payload, 'orderId'));
  const refundId = requirePayload(payload, 'refundId');
  const row = isId('rfd', refundId)
    ? getDb().select().from(refund).where(eq(refund.id, refundId)).get()
    : null;
  if (!row || row.orderId !== view.order.id) throw new Error('The refund is not of this order');
  return {
    subject: latePaymentSubject({ campName: view.camp.name }),
    replyTo: organiserAddress(view.organisation),
    body: createElement(LatePayment, {
      payerName: toName,
      reference: view.order.reference,
      organisationName: view.organisation.name,
      campName: view.camp.name,
      amount: row.amount,
      currency: row.currency,
      paidTwice: view.order.state === 'confirmed',
      bookingUrl: orderLink(view.order.id),
    }),
  };
};
