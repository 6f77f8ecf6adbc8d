import { LetterFrame } from './parts/letter-frame';
import { Para, PressLink } from './parts/letter-parts';

export type BookingLinkProps = {
  payerName: string;
  reference: string;
  campName: string;
  organisationName: string;
  bookingUrl: string;
};

export const bookingLinkSubject = ({ campName }: Pick<BookingLinkProps, 'campName'>): string =>
  `Your booking for ${campName}`;

export function BookingLink({
  payerName,
  reference,
  campName,
  organisationName,
  bookingUrl,
}: BookingLinkProps) {
  return (
    <LetterFrame
      preview={`The link to booking ${reference}`}
      title="Your booking"
      foot={`You get this because someone asked for the link with this address and the booking reference. If it was not you, do nothing: only this mail has the link. Questions go to ${organisationName}: answer this mail.`}
    >
      <Para>Hello {payerName},</Para>
      <Para>
        Here is the way to your booking {reference} for {campName}: tickets, timetables, packing lists and
        receipts. Keep the link to yourself.
      </Para>
      <PressLink href={bookingUrl}>Open your booking</PressLink>
    </LetterFrame>
  );
}
