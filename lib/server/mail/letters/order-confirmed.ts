import 'server-only';
import { createElement } from 'react';
import { OrderConfirmed, type OrderConfirmedProps, orderConfirmedSubject } from '@/emails/order-confirmed';
import { orderCalendars } from '../../orders/order-calendars';
import { ticketPdf } from '../../tickets/ticket-pdf';
import { ticketPng } from '../../tickets/ticket-qr';
import { ticketText } from '../../tickets/ticket-text';
import type { LetterPart, LoadLetter } from '../letter';
import { orderLink } from '../links';
import { organiserAddress } from './organiser-address';
import { requireOrder } from './require-order';
import { requirePayload } from './require-payload';

/** Tickets as pictures in the letter and as a PDF beside it, each attendee's timetable as a calendar file. */
export const loadOrderConfirmed: LoadLetter = async ({ payload, toName }) => {
  const view = requireOrder(requirePayload(payload, 'orderId'));
  const { order, camp, organisation } = view;
  const attendees: OrderConfirmedProps['attendees'] = [];
  const parts: LetterPart[] = [];
  for (const { id, attendeeName, trackName, ticket } of view.registrations) {
    if (!ticket) continue;
    const cid = `${ticket.id}@combwood`;
    attendees.push({ id, name: attendeeName, trackName, cid });
    parts.push({
      filename: `ticket-code-${attendees.length}.png`,
      contentType: 'image/png',
      content: await ticketPng(ticketText(ticket)),
      cid,
    });
  }
  const pdf = await ticketPdf(view);
  if (pdf)
    parts.push({ filename: `tickets-${order.reference}.pdf`, contentType: 'application/pdf', content: pdf });
  for (const { filename, text } of orderCalendars(view))
    parts.push({ filename, contentType: 'text/calendar; charset=utf-8', content: text });
  const { total, currency, refundTerms, reference } = order;
  return {
    subject: orderConfirmedSubject({ camp, attendees }),
    replyTo: organiserAddress(organisation),
    parts,
    body: createElement(OrderConfirmed, {
      ...{ payerName: toName, organisationName: organisation.name, bookingUrl: orderLink(order.id) },
      ...{ camp, attendees, total, currency, refundTerms, reference },
      ...{ lines: view.lines, receipts: view.receipts, due: view.due },
    }),
  };
};
