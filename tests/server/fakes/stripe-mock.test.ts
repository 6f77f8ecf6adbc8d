import type Stripe from 'stripe';
import { afterAll, beforeAll, beforeEach, describe, expect, test, vi } from 'vitest';
import { type StripeMock, startStripeMock } from '@/tests/fakes/stripe/start-stripe-mock';
import { publishedProblems, requiredFields } from './published-shape';
import { control, line, sessionParams, stripeClient } from './stripe-client';
import { listenForWebhooks, webhookSecret } from './webhook-listener';

let mock: StripeMock;
let stripe: Stripe;
let listener: Awaited<ReturnType<typeof listenForWebhooks>>;

beforeAll(async () => {
  listener = await listenForWebhooks();
  mock = await startStripeMock({ port: 0, webhookUrl: listener.url, webhookSecret });
  stripe = stripeClient(mock);
});
afterAll(async () => {
  await mock.close();
  await listener.close();
});
beforeEach(async () => {
  await control(mock, 'POST', 'reset');
  listener.got.length = 0;
  listener.status = 200;
});

const pay = (id: string, outcome: string) => control(mock, 'POST', `sessions/${id}/outcome`, { outcome });
const typesGot = () => listener.got.map((event) => event.type).sort();
const caught = (work: Promise<unknown>) =>
  work.then(
    () => null,
    (error: Stripe.errors.StripeError) => error,
  );
const now = () => Math.floor(Date.now() / 1000);

describe('shapes: the SDK’s own published declarations (Stripe’s OpenAPI description)', () => {
  test('the reader reads required fields, so that the checks below can fail', () => {
    expect(requiredFields('Session')).toEqual(
      expect.arrayContaining(['id', 'amount_total', 'status', 'url']),
    );
    expect(requiredFields('Refund')).toEqual(expect.arrayContaining(['id', 'amount', 'status', 'charge']));
    expect(publishedProblems('Refund', { id: 're_1', object: 'refund', amount: '5', invented: 1 })).toEqual(
      expect.arrayContaining([
        'Refund.currency: missing',
        'Refund.invented: not in the published shape',
        'Refund.amount: "5" is not number',
      ]),
    );
    const tax = { automatic_tax: { enabled: 'no', liability: null, provider: null } };
    expect(publishedProblems('Session', tax)).toEqual(
      expect.arrayContaining([
        'Session.automatic_tax.status: missing',
        'Session.automatic_tax.enabled: "no" is not boolean',
      ]),
    );
  });

  test('session, line items, intent, charge, refund, balance and events fit in every state', async () => {
    const open = await stripe.checkout.sessions.create(sessionParams());
    expect(publishedProblems('Session', open)).toEqual([]);
    await pay(open.id, 'decline');
    await pay(open.id, 'needs-step');
    const waiting = await stripe.checkout.sessions.retrieve(open.id, { expand: ['payment_intent'] });
    expect(publishedProblems('PaymentIntent', waiting.payment_intent as Stripe.PaymentIntent)).toEqual([]);
    await pay(open.id, 'approve');
    const done = await stripe.checkout.sessions.retrieve(open.id);
    expect(publishedProblems('Session', done)).toEqual([]);
    const items = await stripe.checkout.sessions.listLineItems(open.id);
    for (const item of items.data) {
      expect(publishedProblems('LineItem', item)).toEqual([]);
      expect(publishedProblems('Price', item.price as Stripe.Price)).toEqual([]);
    }
    const refund = await stripe.refunds.create({ payment_intent: String(done.payment_intent), amount: 1000 });
    expect(publishedProblems('Refund', refund)).toEqual([]);
    const charges = await stripe.charges.list({ payment_intent: String(done.payment_intent) });
    expect(charges.data.map((charge) => charge.status)).toEqual(['succeeded', 'failed']);
    for (const charge of charges.data) expect(publishedProblems('Charge', charge)).toEqual([]);
    const balances = await stripe.balanceTransactions.list();
    expect(balances.data).toHaveLength(2);
    for (const row of balances.data) expect(publishedProblems('BalanceTransaction', row)).toEqual([]);
    const kinds = {
      'checkout.session': 'Session',
      payment_intent: 'PaymentIntent',
      charge: 'Charge',
      refund: 'Refund',
    } as const;
    const events = await stripe.events.list({ limit: 100 });
    expect(events.data.length).toBeGreaterThan(8);
    for (const event of events.data) {
      expect(publishedProblems('EventBase', event)).toEqual([]);
      const object = event.data.object as { object: keyof typeof kinds };
      expect(publishedProblems(kinds[object.object], object)).toEqual([]);
    }
  });
});

describe('checkout sessions', () => {
  test('a session adds up its lines and carries what it was given', async () => {
    const session = await stripe.checkout.sessions.create(sessionParams());
    expect(session).toMatchObject({
      amount_total: 66_000,
      currency: 'usd',
      status: 'open',
      payment_status: 'unpaid',
      payment_intent: null,
      client_reference_id: 'ord_test1',
      metadata: { order: 'ord_test1' },
      url: `${mock.url}/pay/${session.id}`,
    });
    expect(session.id).toMatch(/^cs_test_\w{58}$/);
    const items = await stripe.checkout.sessions.listLineItems(session.id);
    expect(items.data.map((item) => [item.description, item.quantity, item.amount_total])).toEqual([
      ['Kettle Lake Harp Week, Beginner track', 1, 48_000],
      ['Bed in the lodge', 2, 18_000],
    ]);
  });

  // Published API reference, "expires_at": 30 minutes to 24 hours after creation.
  test.each([
    ['29 minutes', 29 * 60],
    ['25 hours', 25 * 3600],
  ])('an end after %s is refused', async (_name, after) => {
    const error = await caught(stripe.checkout.sessions.create(sessionParams({ expires_at: now() + after })));
    expect(error).toMatchObject({ type: 'StripeInvalidRequestError', statusCode: 400, param: 'expires_at' });
  });

  test('an end after 31 minutes stands, and without one it is 24 hours', async () => {
    const at = now() + 31 * 60;
    expect((await stripe.checkout.sessions.create(sessionParams({ expires_at: at }))).expires_at).toBe(at);
    const session = await stripe.checkout.sessions.create(sessionParams());
    expect(session.expires_at - session.created).toBe(86_400);
  });

  test.each([
    ['no line items', { line_items: undefined }, 'line_items', 'parameter_missing'],
    ['no success address', { success_url: undefined }, 'success_url', 'parameter_missing'],
    ['an address that is none', { success_url: 'paid' }, 'success_url', 'url_invalid'],
    ['a script as address', { cancel_url: 'javascript:alert(1)' }, 'cancel_url', 'url_invalid'],
    ['an e-mail that is none', { customer_email: 'mina' }, 'customer_email', 'email_invalid'],
    ['below the minimum charge', { line_items: [line('Reed', 49)] }, 'line_items', 'amount_too_small'],
    [
      'a currency that is none',
      { line_items: [line('Reed', 500, 1, 'xxz')] },
      'line_items[0][price_data][currency]',
      'parameter_invalid',
    ],
    [
      'two currencies',
      { line_items: [line('A', 500), line('B', 500, 1, 'eur')] },
      'line_items[1][price_data][currency]',
      undefined,
    ],
    [
      'a fraction of a cent',
      { line_items: [line('Reed', 99.5)] },
      'line_items[0][price_data][unit_amount]',
      'parameter_invalid_integer',
    ],
    [
      'a negative amount',
      { line_items: [line('Reed', -500)] },
      'line_items[0][price_data][unit_amount]',
      'parameter_invalid_integer',
    ],
    [
      'dinars not ending in 0',
      { line_items: [line('Reed', 5001, 1, 'kwd')] },
      'line_items[0][price_data][unit_amount]',
      'parameter_invalid_integer',
    ],
    ['an unknown parameter', { colour: 'pine' }, 'colour', 'parameter_unknown'],
    ['a subscription', { mode: 'subscription' as const }, 'mode', undefined],
  ])('%s → 400 naming the parameter', async (_name, wrong, param, code) => {
    const error = await caught(stripe.checkout.sessions.create(sessionParams(wrong as never)));
    expect(error).toMatchObject({
      type: 'StripeInvalidRequestError',
      rawType: 'invalid_request_error',
      param,
      code,
    });
    expect((await stripe.checkout.sessions.list()).data).toEqual([]);
  });

  // Stripe documentation, "Supported currencies": yen have no minor unit; a total of 0 asks for no payment.
  test('yen are whole, and nothing to pay needs no payment', async () => {
    const yen = await stripe.checkout.sessions.create(
      sessionParams({ line_items: [line('Reed', 500, 1, 'jpy')] }),
    );
    expect(await (await fetch(String(yen.url))).text()).toContain('JPY\u00a0500');
    const free = await stripe.checkout.sessions.create(sessionParams({ line_items: [line('Bursary', 0)] }));
    await pay(free.id, 'pay');
    expect(await stripe.checkout.sessions.retrieve(free.id)).toMatchObject({
      status: 'complete',
      payment_status: 'no_payment_required',
      payment_intent: null,
    });
  });

  test('paying completes it; intent and charge come by expand', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await pay(id, 'pay');
    const session = await stripe.checkout.sessions.retrieve(id, {
      expand: ['payment_intent.latest_charge', 'line_items'],
    });
    expect(session).toMatchObject({ status: 'complete', payment_status: 'paid', url: null });
    expect(session.line_items?.data).toHaveLength(2);
    const intent = session.payment_intent as Stripe.PaymentIntent;
    expect(intent).toMatchObject({
      status: 'succeeded',
      amount_received: 66_000,
      metadata: { order: 'ord_test1' },
    });
    expect(intent.latest_charge).toMatchObject({ object: 'charge', paid: true, amount: 66_000 });
    await vi.waitFor(() =>
      expect(typesGot()).toEqual(['checkout.session.completed', 'payment_intent.succeeded']),
    );
    expect(listener.refused).toEqual([]);
    const wrong = await caught(stripe.checkout.sessions.retrieve(id, { expand: ['camp'] }));
    expect(wrong?.message).toBe('This property cannot be expanded (camp).');
  });

  test('a decline leaves it open, a refused bank step too, and then it can still be paid', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await pay(id, 'decline-funds');
    const declined = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent'] });
    expect(declined.status).toBe('open');
    expect(declined.payment_intent).toMatchObject({
      status: 'requires_payment_method',
      last_payment_error: { code: 'card_declined', decline_code: 'insufficient_funds' },
    });
    expect((await pay(id, 'approve')).status).toBe(409);
    await pay(id, 'needs-step');
    await pay(id, 'refuse');
    await pay(id, 'pay');
    expect((await pay(id, 'pay')).status).toBe(409);
    const charges = await stripe.charges.list();
    expect(charges.data.filter((charge) => charge.paid)).toHaveLength(1);
    await vi.waitFor(() =>
      expect(typesGot()).toEqual([
        'checkout.session.completed',
        'payment_intent.payment_failed',
        'payment_intent.payment_failed',
        'payment_intent.succeeded',
      ]),
    );
  });

  test('a slow transfer completes it unpaid; the money comes, or does not, later', async () => {
    const settle = (id: string, status: string) => control(mock, 'POST', `sessions/${id}/settle`, { status });
    const [comes, fails] = [
      await stripe.checkout.sessions.create(sessionParams()),
      await stripe.checkout.sessions.create(sessionParams()),
    ];
    for (const { id } of [comes, fails]) {
      await pay(id, 'pay-later');
      const waiting = await stripe.checkout.sessions.retrieve(id, { expand: ['payment_intent'] });
      expect(waiting).toMatchObject({ status: 'complete', payment_status: 'unpaid' });
      expect(publishedProblems('PaymentIntent', waiting.payment_intent as Stripe.PaymentIntent)).toEqual([]);
      expect((await caught(stripe.checkout.sessions.expire(id)))?.statusCode).toBe(400);
    }
    await settle(comes.id, 'succeeded');
    await settle(fails.id, 'failed');
    expect((await settle(comes.id, 'failed')).status).toBe(409);
    expect((await stripe.checkout.sessions.retrieve(comes.id)).payment_status).toBe('paid');
    expect((await stripe.checkout.sessions.retrieve(fails.id)).payment_status).toBe('unpaid');
    expect((await stripe.charges.list()).data.map(({ paid }) => paid)).toEqual([true]);
    await vi.waitFor(() =>
      expect(typesGot()).toEqual([
        'checkout.session.async_payment_failed',
        'checkout.session.async_payment_succeeded',
        'checkout.session.completed',
        'checkout.session.completed',
        'payment_intent.payment_failed',
        'payment_intent.succeeded',
      ]),
    );
  });

  test('expire works on an open session only: it decides between paying and letting go', async () => {
    const paid = await stripe.checkout.sessions.create(sessionParams());
    await pay(paid.id, 'pay');
    const late = await caught(stripe.checkout.sessions.expire(paid.id));
    expect(late).toMatchObject({ type: 'StripeInvalidRequestError', statusCode: 400 });
    expect(late?.message).toContain('status of `complete`');
    const released = await stripe.checkout.sessions.create(sessionParams());
    await pay(released.id, 'needs-step');
    expect(await stripe.checkout.sessions.expire(released.id)).toMatchObject({
      status: 'expired',
      url: null,
    });
    expect((await pay(released.id, 'approve')).status).toBe(409);
    expect((await caught(stripe.checkout.sessions.expire(released.id)))?.message).toContain(
      'status of `expired`',
    );
    await vi.waitFor(() => expect(typesGot()).toContain('checkout.session.expired'));
  });

  test('it ends on its own when its time comes, and tells', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await control(mock, 'POST', `sessions/${id}/advance`, { seconds: 86_399 });
    await vi.waitFor(() => expect(typesGot()).toEqual(['checkout.session.expired']), { timeout: 4000 });
    expect((await stripe.checkout.sessions.retrieve(id)).status).toBe('expired');
  });

  test('lists page by cursor and filter', async () => {
    const ids: string[] = [];
    for (let i = 0; i < 5; i += 1) ids.unshift((await stripe.checkout.sessions.create(sessionParams())).id);
    await stripe.checkout.sessions.expire(String(ids[0]));
    const first = await stripe.checkout.sessions.list({ limit: 2 });
    expect([first.has_more, first.data.map(({ id }) => id)]).toEqual([true, ids.slice(0, 2)]);
    const all = await stripe.checkout.sessions.list({ limit: 2 }).autoPagingToArray({ limit: 50 });
    expect(all.map(({ id }) => id)).toEqual(ids);
    expect((await stripe.checkout.sessions.list({ status: 'expired' })).data).toHaveLength(1);
    expect((await stripe.events.list({ created: { gt: now() + 60 } })).data).toEqual([]);
    expect(
      (await stripe.events.list({ created: { gte: now() - 60 }, type: 'checkout.session.expired' })).data,
    ).toHaveLength(1);
  });
});

describe('refunds', () => {
  async function paidIntent() {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await pay(id, 'pay');
    return String((await stripe.checkout.sessions.retrieve(id)).payment_intent);
  }

  test('part, then the rest, never more', async () => {
    const payment_intent = await paidIntent();
    await stripe.refunds.create({ payment_intent, amount: 26_000, reason: 'requested_by_customer' });
    const tooMuch = await caught(stripe.refunds.create({ payment_intent, amount: 40_001 }));
    expect(tooMuch).toMatchObject({ type: 'StripeInvalidRequestError', param: 'amount' });
    expect(await stripe.refunds.create({ payment_intent })).toMatchObject({
      amount: 40_000,
      status: 'succeeded',
    });
    const again = await caught(stripe.refunds.create({ payment_intent }));
    expect(again).toMatchObject({ code: 'charge_already_refunded' });
    const intent = await stripe.paymentIntents.retrieve(payment_intent, {
      expand: ['latest_charge.refunds'],
    });
    const charge = intent.latest_charge as Stripe.Charge;
    expect(charge).toMatchObject({ amount_refunded: 66_000, refunded: true });
    expect(charge.refunds?.data.map(({ amount }) => amount)).toEqual([40_000, 26_000]);
    await vi.waitFor(() => expect(typesGot().filter((type) => type === 'charge.refunded')).toHaveLength(2));
    expect(typesGot()).toEqual(expect.arrayContaining(['refund.created', 'refund.updated']));
  });

  test('a pending one may fail later and is then owed again', async () => {
    const payment_intent = await paidIntent();
    await control(mock, 'POST', 'faults', { kind: 'refund-pending' });
    const refund = await stripe.refunds.create({ payment_intent });
    expect(refund.status).toBe('pending');
    expect(await caught(stripe.refunds.create({ payment_intent, amount: 1 }))).toMatchObject({
      code: 'charge_already_refunded',
    });
    await control(mock, 'POST', `refunds/${refund.id}/settle`, { status: 'failed' });
    expect(await stripe.refunds.retrieve(refund.id)).toMatchObject({
      status: 'failed',
      failure_reason: 'unknown',
    });
    expect((await stripe.refunds.create({ payment_intent })).amount).toBe(66_000);
    await vi.waitFor(() => expect(typesGot()).toContain('refund.failed'));
  });

  test('an unpaid intent and an unknown one cannot be refunded', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await pay(id, 'decline');
    const { payment_intent } = await stripe.checkout.sessions.retrieve(id);
    expect(await caught(stripe.refunds.create({ payment_intent: String(payment_intent) }))).toMatchObject({
      statusCode: 400,
    });
    expect(await caught(stripe.refunds.create({ payment_intent: 'pi_none' }))).toMatchObject({
      statusCode: 404,
      code: 'resource_missing',
    });
  });
});

describe('keys and idempotency', () => {
  test.each([
    ['none', undefined],
    ['a live one', 'sk_live_never'],
    ['nonsense', 'hello'],
  ])('key: %s → 401', async (_name, key) => {
    const headers: Record<string, string> = key ? { authorization: `Bearer ${key}` } : {};
    const answer = await fetch(`${mock.url}/v1/events`, { headers });
    expect(answer.status).toBe(401);
    if (key)
      expect(await caught(stripeClient(mock, key).events.list())).toMatchObject({
        type: 'StripeAuthenticationError',
      });
  });

  test('an address that it does not speak → 404 in Stripe’s form', async () => {
    expect(await caught(stripe.customers.list())).toMatchObject({
      type: 'StripeInvalidRequestError',
      statusCode: 404,
    });
    expect(await caught(stripe.checkout.sessions.retrieve('cs_test_none'))).toMatchObject({
      code: 'resource_missing',
    });
  });

  // Published API reference, "Idempotent requests".
  test('the same key and parameters give the same answer; other parameters are refused', async () => {
    const options = { idempotencyKey: 'order-1' };
    const first = await stripe.checkout.sessions.create(sessionParams(), options);
    const second = await stripe.checkout.sessions.create(sessionParams(), options);
    expect(second.id).toBe(first.id);
    expect(second.lastResponse.headers['idempotent-replayed']).toBe('true');
    expect(first.lastResponse.headers['idempotent-replayed']).toBeUndefined();
    const other = await caught(
      stripe.checkout.sessions.create(sessionParams({ client_reference_id: 'x' }), options),
    );
    expect(other).toMatchObject({
      type: 'StripeIdempotencyError',
      statusCode: 400,
      rawType: 'idempotency_error',
    });
    expect((await stripe.checkout.sessions.list()).data).toHaveLength(1);
  });

  test('what failed before the work began does not use up the key; what the work refused does', async () => {
    const options = { idempotencyKey: 'order-2' };
    await caught(stripe.checkout.sessions.create(sessionParams({ success_url: 'paid' }), options));
    const { id } = await stripe.checkout.sessions.create(sessionParams(), options);
    await pay(id, 'pay');
    const expire = { idempotencyKey: 'expire-2' };
    const first = await caught(stripe.checkout.sessions.expire(id, {}, expire));
    const again = await caught(stripe.checkout.sessions.expire(id, {}, expire));
    expect(again?.requestId).toBe(first?.requestId);
  });

  test('a refund asked for ten times with one key is made once', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await pay(id, 'pay');
    const payment_intent = String((await stripe.checkout.sessions.retrieve(id)).payment_intent);
    const made = await Promise.all(
      Array.from({ length: 10 }, () =>
        stripe.refunds.create({ payment_intent, amount: 100 }, { idempotencyKey: 'refund-1' }),
      ),
    );
    expect(new Set(made.map((refund) => refund.id)).size).toBe(1);
    expect((await stripe.refunds.list({ payment_intent })).data).toHaveLength(1);
  });
});

describe('faults', () => {
  test('429 and 500 reach the SDK as its own errors', async () => {
    await control(mock, 'POST', 'faults', { kind: 'rate-limit' });
    expect(await caught(stripe.events.list())).toMatchObject({
      type: 'StripeRateLimitError',
      statusCode: 429,
    });
    await control(mock, 'POST', 'faults', { kind: 'server-error' });
    expect(await caught(stripe.events.list({}, { maxNetworkRetries: 0 }))).toMatchObject({
      type: 'StripeAPIError',
      statusCode: 500,
    });
    // one 500 and the SDK's own single retry
    await control(mock, 'POST', 'faults', { kind: 'server-error' });
    expect((await stripe.events.list()).data).toEqual([]);
  });

  test.each(['cut-after-success', 'timeout-after-success'])(
    '%s: the work is done, and the same key finds it',
    async (kind) => {
      await control(mock, 'POST', 'faults', {
        kind,
        method: 'POST',
        path: '/v1/checkout/sessions',
        count: 2,
      });
      const options = { idempotencyKey: `lost-${kind}`, maxNetworkRetries: 0, timeout: 400 };
      const lost = await caught(stripe.checkout.sessions.create(sessionParams(), options));
      expect(lost?.type).toBe('StripeConnectionError');
      await control(mock, 'DELETE', 'faults');
      const found = await stripe.checkout.sessions.create(sessionParams(), options);
      expect(found.lastResponse.headers['idempotent-replayed']).toBe('true');
      expect((await stripe.checkout.sessions.list()).data).toHaveLength(1);
    },
  );
});

test('a page of another site is kept out', async () => {
  const foreign = await fetch(`${mock.url}/_mock/reset`, {
    method: 'POST',
    headers: { origin: 'http://evil.example' },
  });
  expect(foreign.status).toBe(403);
});
