import { badRequest } from './api-error';
import { buildSession } from './build-session';
import { amountProblem, formatMoney, MAX_AMOUNT, minimumCharge } from './currency-rules';
import { type Mock, seconds } from './mock';
import type { FormObject } from './parse-form';
import { parseParams } from './parse-params';
import { type CreateSessionParams, createSessionParams } from './session-params';

// Published API reference, Checkout Session "expires_at": from 30 minutes to 24 hours after creation, 24 hours if unset.
const SOONEST = 30 * 60;
const LATEST = 24 * 60 * 60;

function expiry(params: CreateSessionParams, now: number): number {
  const at = params.expires_at ?? now + LATEST;
  const param = 'expires_at';
  if (at < now + SOONEST)
    throw badRequest(
      'The `expires_at` timestamp must be at least 30 minutes from Checkout Session creation.',
      { param },
    );
  if (at > now + LATEST)
    throw badRequest(
      'The `expires_at` timestamp must be less than 24 hours from Checkout Session creation.',
      { param },
    );
  return at;
}

function checkAmounts(params: CreateSessionParams): void {
  const currency = params.line_items[0]?.price_data.currency ?? '';
  let total = 0;
  params.line_items.forEach(({ price_data: price, quantity }, i) => {
    const at = `line_items[${i}][price_data]`;
    if (price.currency !== currency)
      throw badRequest('You must not mix currencies in `line_items`.', { param: `${at}[currency]` });
    const problem = amountProblem(price.unit_amount, currency);
    if (problem)
      throw badRequest(problem, { code: 'parameter_invalid_integer', param: `${at}[unit_amount]` });
    total += price.unit_amount * quantity;
  });
  if (total > MAX_AMOUNT)
    throw badRequest(`The total amount must be no more than ${formatMoney(MAX_AMOUNT, currency)}.`, {
      code: 'amount_too_large',
      param: 'line_items',
    });
  // A total of nothing is allowed: the session then asks for no payment.
  if (total > 0 && total < minimumCharge(currency))
    throw badRequest(
      `The Checkout Session's total amount due must add up to at least ${formatMoney(minimumCharge(currency), currency)}.`,
      { code: 'amount_too_small', param: 'line_items' },
    );
}

export function createSession(mock: Mock, form: FormObject) {
  const params = parseParams(createSessionParams, form);
  const created = seconds(mock);
  const expiresAt = expiry(params, created);
  checkAmounts(params);
  const record = buildSession(params, { created, expiresAt, baseUrl: mock.baseUrl });
  mock.store.put('session', record.session.id, record);
  return { object: record.session, expand: params.expand };
}
