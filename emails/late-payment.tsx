import { formatMoney, type Minor } from '@/lib/domain/shared/money';
import { LetterFrame } from './parts/letter-frame';
import { Para, PressLink } from './parts/letter-parts';

export type LatePaymentProps = {
  payerName: string;
  reference: string;
  organisationName: string;
  campName: string;
  amount: Minor;
  currency: string;
  /** The order was confirmed already; else its place had gone when the money came. */
  paidTwice: boolean;
  bookingUrl: string;
};

export const latePaymentSubject = ({ campName }: Pick<LatePaymentProps, 'campName'>): string =>
  `Your payment for ${campName} goes back to you`;

export function LatePayment(props: LatePaymentProps) {
  const sum = formatMoney(props.amount, props.currency);
  return (
    <LetterFrame
      preview={`${sum} goes back to where it came from.`}
      title={`${sum} goes back to you`}
      foot={`You get this because you paid for a booking at ${props.organisationName}. Questions? Answer this mail and say your booking reference, ${props.reference}.`}
    >
      <Para>Hello {props.payerName},</Para>
      {props.paidTwice ? (
        <Para>
          Your booking {props.reference} for {props.campName} was paid for already, and then {sum} came a
          second time. Your place is safe. The second payment goes back in full.
        </Para>
      ) : (
        <Para>
          Your payment of {sum} for {props.campName} arrived after the time for which the place was kept, and
          by then no place was left. So you have no place, and all of the money goes back.
        </Para>
      )}
      <Para>
        You need do nothing. It returns to the card or account that you paid with; banks take five to ten
        working days.
      </Para>
      <PressLink href={props.bookingUrl}>See your booking</PressLink>
    </LetterFrame>
  );
}
