import { eq } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { payment } from '@/db/schema/money';
import { order, registration } from '@/db/schema/order';
import type { CompleteAnswers } from '@/lib/domain/registration/answers';
import { quoteRegistration } from '@/lib/domain/registration/quote-registration';
import type { RegistrationState } from '@/lib/domain/registration/states';
import { foldSearch } from '@/lib/domain/shared/fold-search';
import type { OrderId, RegistrationId, UserId } from '@/lib/domain/shared/ids';
import { minor } from '@/lib/domain/shared/money';
import type { Programme } from '@/lib/domain/timetable/programme';
import { newId } from '@/lib/server/new-id';
import { postLedger } from '@/lib/server/orders/post-ledger';
import { applyRefund } from '@/lib/server/registration/apply-refund';
import { capturePayment } from '@/lib/server/registration/capture-payment';
import { insertOrder } from '@/lib/server/registration/insert-order';
import { lapseOrder } from '@/lib/server/registration/lapse-order';
import { oweRefund } from '@/lib/server/registration/owe-refund';
import { issueTicket } from '@/lib/server/tickets/issue-ticket';
import { revokeTicket } from '@/lib/server/tickets/revoke-ticket';

const MINUTE = 60_000;

export type PersonPlan = {
  programme: Programme;
  answers: CompleteAnswers;
  userId: UserId | null;
  fate: RegistrationState;
  /** Epoch ms at which they registered. */
  at: number;
  now: number;
  /** Who gets the place of one that is passed on. */
  heir: string;
  /** Tail of the made-up provider ids. */
  code: string;
};

/** Lets one person of the demo register, pay and have their fate, by the same use-cases as everyone. */
export function seedPerson(tx: Tx, plan: PersonPlan): { orderId: OrderId; registrationId: RegistrationId } {
  const { programme, answers, fate, at } = plan;
  const quote = quoteRegistration(programme, [answers.track.trackId]);
  if (!quote) throw new Error('The camp has no price');
  const payer = { userId: plan.userId, name: answers.who.attendeeName, email: answers.who.attendeeEmail };
  const orderId = insertOrder(tx, {
    organisationId: programme.camp.organisationId,
    campId: programme.camp.id,
    payer,
    attendees: [{ userId: plan.userId, answers }],
    quote,
    refundTerms: programme.camp.refundTerms,
    heldUntil: (fate === 'held' ? plan.now : at) + 20 * MINUTE,
    now: at,
  });
  const person = tx.select().from(registration).where(eq(registration.orderId, orderId)).get();
  if (!person) throw new Error(`Order ${orderId} has nobody`);
  if (fate === 'expired') lapseOrder(tx, orderId, at + 21 * MINUTE);
  // Waitlists come later in the product; the demo shows what they will look like in the tables.
  if (fate === 'waitlisted' || fate === 'offered') setState(tx, orderId, person.id, fate, at);
  if (fate === 'confirmed' || fate === 'cancelled' || fate === 'transferred') pay(tx, orderId, plan);
  if (fate === 'cancelled') cancel(tx, orderId, person.id, plan);
  if (fate === 'transferred') return { orderId, registrationId: passOn(tx, person, plan) };
  return { orderId, registrationId: person.id };
}

function setState(tx: Tx, orderId: OrderId, id: RegistrationId, state: RegistrationState, now: number): void {
  tx.update(order).set({ state, heldUntil: null, updatedAt: now }).where(eq(order.id, orderId)).run();
  tx.update(registration).set({ state, updatedAt: now }).where(eq(registration.id, id)).run();
}

function pay(tx: Tx, orderId: OrderId, plan: PersonPlan): void {
  const due = tx.select().from(order).where(eq(order.id, orderId)).get();
  if (!due) throw new Error(`No order ${orderId}`);
  const by = { sessionId: `cs_demo_${plan.code}`, intentId: `pi_demo_${plan.code}` };
  const paid = {
    id: newId('pay', plan.at),
    orderId,
    state: 'open' as const,
    amount: due.total,
    currency: due.currency,
    ...by,
    url: null,
    createdAt: plan.at,
    updatedAt: plan.at,
  };
  tx.insert(payment).values(paid).run();
  capturePayment(tx, paid, by, plan.at + 4 * MINUTE);
}

/** Half of the price comes back, as the terms say between 60 and 14 days before. */
function cancel(tx: Tx, orderId: OrderId, id: RegistrationId, plan: PersonPlan): void {
  const paid = tx.select().from(payment).where(eq(payment.orderId, orderId)).get();
  if (!paid) throw new Error(`Order ${orderId} was not paid`);
  const now = plan.at + 3 * 24 * 60 * MINUTE;
  const back = minor(Math.floor(paid.amount / 2));
  setState(tx, orderId, id, 'cancelled', now);
  revokeTicket(tx, { registrationId: id, now });
  postLedger(tx, {
    organisationId: plan.programme.camp.organisationId,
    orderId,
    currency: paid.currency,
    memo: 'Place given up',
    cause: orderId,
    entries: [
      { account: 'income', amount: back },
      { account: 'payers', amount: minor(-back) },
    ],
    now,
  });
  const refundId = oweRefund(tx, {
    orderId,
    paymentId: paid.id,
    amount: back,
    currency: paid.currency,
    reason: 'Place given up',
    from: now,
    now,
  });
  const told = {
    id: `re_demo_${plan.code}`,
    refundId,
    amount: back,
    currency: paid.currency,
    state: 'succeeded' as const,
  };
  applyRefund(tx, told, now + MINUTE);
}

/** The place goes to another player; the first one's ticket ends. */
function passOn(tx: Tx, from: typeof registration.$inferSelect, plan: PersonPlan): RegistrationId {
  const now = plan.at + 2 * 24 * 60 * MINUTE;
  const id = newId('reg', now);
  tx.update(registration)
    .set({ state: 'transferred', updatedAt: now })
    .where(eq(registration.id, from.id))
    .run();
  revokeTicket(tx, { registrationId: from.id, now });
  const name = plan.heir;
  tx.insert(registration)
    .values({
      ...from,
      id,
      attendeeName: name,
      attendeeSearch: foldSearch(name),
      attendeeEmail: `heir-${plan.code}@players.example`,
      attendeeUserId: null,
      state: 'confirmed',
      createdAt: now,
      updatedAt: now,
    })
    .run();
  issueTicket(tx, { registrationId: id, campId: from.campId, now });
  return id;
}
