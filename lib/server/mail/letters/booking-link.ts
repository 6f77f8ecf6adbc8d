import 'server-only';
import { createElement } from 'react';
import { BookingLink, bookingLinkSubject } from '@/emails/booking-link';
import type { LoadLetter } from '../letter';
import { orderLink } from '../links';
import { organiserAddress } from './organiser-address';
import { requireOrder } from './require-order';
import { requirePayload } from './require-payload';

export const loadBookingLink: LoadLetter = ({ payload, toName }) => {
  const { order, camp, organisation } = requireOrder(requirePayload(payload, 'orderId'));
  return {
    subject: bookingLinkSubject({ campName: camp.name }),
    replyTo: organiserAddress(organisation),
    body: createElement(BookingLink, {
      payerName: toName,
      reference: order.reference,
      campName: camp.name,
      organisationName: organisation.name,
      bookingUrl: orderLink(order.id),
    }),
  };
};
