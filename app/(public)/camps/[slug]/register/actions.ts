'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { paidPath, payPath, stepPath } from '@/lib/domain/registration/step-path';
import { type AnswerStep, nextStep } from '@/lib/domain/registration/steps';
import type { OrderId } from '@/lib/domain/shared/ids';
import {
  harpsFormSchema,
  needsFormSchema,
  orderFormSchema,
  submitFormSchema,
  trackFormSchema,
  whoFormSchema,
} from '@/lib/schemas/registration';
import { action } from '@/lib/server/action';
import { answerHarps } from '@/lib/server/registration/answer-harps';
import { answerNeeds } from '@/lib/server/registration/answer-needs';
import { answerTrack } from '@/lib/server/registration/answer-track';
import { answerWho } from '@/lib/server/registration/answer-who';
import { changeOrder } from '@/lib/server/registration/change-order';
import { payOrder } from '@/lib/server/registration/pay-order';
import { submitRegistration } from '@/lib/server/registration/submit-registration';

/** On to the next step, or back to the answers when one came from there. */
function goOn({ slug, from }: { slug: string; from?: 'check' }, step: AnswerStep): never {
  const next = nextStep(step);
  redirect(stepPath(slug, from ?? (next === 'pay' ? 'check' : next)) as Route);
}

export const saveWhoAction = action({
  schema: whoFormSchema,
  permission: 'registration.draft',
  rate: 'draft',
  run: ({ slug, from: _from, ...who }, { now }) => answerWho(slug, who, now),
  onOk: (_done, input) => goOn(input, 'who'),
});

export const saveTrackAction = action({
  schema: trackFormSchema,
  permission: 'registration.draft',
  rate: 'draft',
  run: ({ slug, from: _from, ...track }, { now }) => answerTrack(slug, track, now),
  onOk: (_done, input) => goOn(input, 'track'),
});

export const saveHarpsAction = action({
  schema: harpsFormSchema,
  permission: 'registration.draft',
  rate: 'draft',
  run: (input, { now }) => answerHarps(input, now),
  onOk: (_done, { intent, ...input }) => {
    if (intent === 'add') redirect(stepPath(input.slug, 'harps', input.from) as Route);
    goOn(input, 'harps');
  },
});

export const saveNeedsAction = action({
  schema: needsFormSchema,
  permission: 'registration.draft',
  rate: 'draft',
  run: ({ slug, from: _from, ...needs }, { now }) => answerNeeds(slug, needs, now),
  onOk: (_done, input) => goOn(input, 'needs'),
});

export const submitRegistrationAction = action({
  schema: submitFormSchema,
  permission: 'registration.submit',
  rate: 'order',
  run: ({ slug }, context) => submitRegistration(slug, context),
  onOk: (orderId, { slug }) => redirect(payPath(slug, orderId) as Route),
});

export const payAction = action({
  schema: orderFormSchema,
  permission: 'order.pay',
  on: { kind: 'order', field: 'orderId' },
  rate: 'order',
  run: ({ orderId }, { now }) => payOrder(orderId as OrderId, now),
  onOk: (start, { orderId }) =>
    redirect((start.go === 'provider' ? start.url : paidPath(orderId as OrderId)) as Route),
});

export const changeOrderAction = action({
  schema: orderFormSchema,
  permission: 'order.pay',
  on: { kind: 'order', field: 'orderId' },
  rate: 'order',
  run: ({ orderId }, { now }) => changeOrder(orderId as OrderId, now),
  onOk: (slug) => redirect(stepPath(slug, 'check') as Route),
});
