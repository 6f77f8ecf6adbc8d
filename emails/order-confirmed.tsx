import { Img, Section } from '@react-email/components';
import { formatMoney, type Minor } from '@/lib/domain/shared/money';
import { sayDay, sayDays, sayInstant } from '@/lib/domain/shared/say-date';
import { LetterFrame } from './parts/letter-frame';
import { Lines, Para, Part, PressLink, Small } from './parts/letter-parts';

export type OrderConfirmedProps = {
  payerName: string;
  reference: string;
  organisationName: string;
  camp: {
    name: string;
    startsOn: string;
    endsOn: string;
    timeZone: string;
    venueName: string;
    venueAddress: string;
    arrivalFrom: string;
  };
  /** `cid` names the attached picture of the code. */
  attendees: { id: string; name: string; trackName: string; cid: string }[];
  currency: string;
  lines: { id: string; label: string; amount: Minor }[];
  total: Minor;
  receipts: { number: number; amount: Minor; issuedAt: number }[];
  due: Minor;
  refundTerms: string;
  bookingUrl: string;
};

export const orderConfirmedSubject = (props: Pick<OrderConfirmedProps, 'attendees' | 'camp'>): string =>
  `Your ${props.attendees.length === 1 ? 'ticket' : 'tickets'} for ${props.camp.name}`;

export function OrderConfirmed(props: OrderConfirmedProps) {
  const { camp, attendees, currency } = props;
  const money = (amount: Minor) => formatMoney(amount, currency);
  return (
    <LetterFrame
      preview={`${sayDays(camp.startsOn, camp.endsOn)}, booking ${props.reference}`}
      title={`Booked: ${camp.name}`}
      foot={`You get this because you booked at ${props.organisationName}. Questions? Answer this mail and say your booking reference, ${props.reference}.`}
    >
      <Para>Hello {props.payerName},</Para>
      <Para>
        Your booking is confirmed. {camp.name} is on {sayDays(camp.startsOn, camp.endsOn)}
        {camp.venueName && ` at ${[camp.venueName, camp.venueAddress].filter(Boolean).join(', ')}`}. The door
        opens on {sayDay(camp.startsOn)} at {camp.arrivalFrom} ({camp.timeZone}).
      </Para>
      <Para>
        Booking reference: <strong>{props.reference}</strong>
      </Para>
      <PressLink href={props.bookingUrl}>Open your booking</PressLink>
      <Para>There you find the tickets, each timetable, and which harps to pack. It is private to you.</Para>

      <Part title={attendees.length === 1 ? 'The ticket' : 'The tickets'}>
        <Para>
          Show the code at the door, on a phone or on paper. The attached file prints well. A name is enough
          if you lose it.
        </Para>
        {attendees.map(({ id, name, trackName, cid }) => (
          <Section key={id} style={{ marginBottom: 24 }}>
            <Para>
              <strong>{name}</strong>, track {trackName}
            </Para>
            <Img
              className="white"
              src={`cid:${cid}`}
              alt={`Ticket code of ${name}`}
              width={265}
              height={265}
              style={{ background: '#ffffff', display: 'block' }}
            />
          </Section>
        ))}
      </Part>

      <Part title="What it cost">
        {props.lines.map(({ id, label, amount }) => (
          <Para key={id}>
            {label}: {money(amount)}
          </Para>
        ))}
        <Para>
          <strong>Total: {money(props.total)}</strong>
        </Para>
        {props.receipts.map(({ number, amount, issuedAt }) => (
          <Para key={number}>
            Paid: {money(amount)}, receipt {number}, {sayInstant(issuedAt, camp.timeZone)}
          </Para>
        ))}
        <Para>{props.due > 0 ? `Still to pay: ${money(props.due)}` : 'Nothing is left to pay.'}</Para>
      </Part>

      {props.refundTerms && (
        <Part title="Refund terms">
          <Lines text={props.refundTerms} />
          <Small>These are the terms as they stood when you booked; they stay with your booking.</Small>
        </Part>
      )}
    </LetterFrame>
  );
}
