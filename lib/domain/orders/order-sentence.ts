import type { RegistrationState } from '../registration/states';
import { formatMoney, type Minor, minor } from '../shared/money';
import { sayInstant } from '../shared/say-date';

type OrderFacts = {
  state: RegistrationState;
  heldUntil: number | null;
  timeZone: string;
  currency: string;
  /** Negative is what is owed to the payer. */
  due: Minor;
};

/** Where an order stands and what comes next, for the one who pays. A hold is over the moment its time has run out. */
export function orderSentence(facts: OrderFacts, now: number): string {
  const { state, heldUntil, timeZone, currency, due } = facts;
  const until = heldUntil === null ? '' : ` until ${sayInstant(heldUntil, timeZone)}`;
  switch (state) {
    case 'held':
      return heldUntil !== null && heldUntil <= now
        ? 'The time to pay has run out, and the place goes back. If you paid just now, wait a minute and load this page again.'
        : `The place is kept for you${until}. It is yours once you have paid ${formatMoney(due, currency)}.`;
    case 'confirmed':
      return confirmedSentence(due, currency);
    case 'waitlisted':
      return 'You are on the waitlist. We write when a place comes free; there is nothing to pay before that.';
    case 'offered':
      return `A place came free and is kept for you${until}. Pay ${formatMoney(due, currency)} to take it.`;
    case 'cancelled':
      return 'This booking was cancelled, and its places have gone back.';
    case 'transferred':
      return 'This booking was passed on to another person.';
    case 'expired':
      return 'It was not paid in time, so the place went back. Money that comes in later gets you a place again while one is free; else all of it goes back to you.';
  }
}

function confirmedSentence(due: Minor, currency: string): string {
  if (due > 0) return `Your place is sure. Still to pay: ${formatMoney(due, currency)}.`;
  if (due < 0) return `Your place is sure. ${formatMoney(minor(-due), currency)} is owed back to you.`;
  return 'Your place is sure, and nothing is left to pay.';
}
