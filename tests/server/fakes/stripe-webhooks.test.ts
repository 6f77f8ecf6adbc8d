import { createHmac } from 'node:crypto';
import { appendFileSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import Stripe from 'stripe';
import { afterEach, beforeEach, describe, expect, test, vi } from 'vitest';
import { signWebhook } from '@/tests/fakes/stripe/sign-webhook';
import { type StripeMock, startStripeMock } from '@/tests/fakes/stripe/start-stripe-mock';
import { control, sessionParams, stripeClient } from './stripe-client';
import { listenForWebhooks, webhookSecret } from './webhook-listener';

const folder = mkdtempSync(join(tmpdir(), 'stripe-mock-test-'));
const stateFile = join(folder, 'state.json');
let listener: Awaited<ReturnType<typeof listenForWebhooks>>;
let mock: StripeMock;
let stripe: Stripe;

async function start() {
  mock = await startStripeMock({ port: 0, webhookUrl: listener.url, webhookSecret, stateFile });
  stripe = stripeClient(mock);
}
beforeEach(async () => {
  listener = await listenForWebhooks();
  await start();
});
afterEach(async () => {
  await mock.close();
  await listener.close();
  rmSync(folder, { recursive: true, force: true });
});

const types = () => listener.got.map(({ type }) => type);
const pay = (id: string, outcome = 'pay') => control(mock, 'POST', `sessions/${id}/outcome`, { outcome });
async function paidSession() {
  const { id } = await stripe.checkout.sessions.create(sessionParams());
  await pay(id);
  return id;
}
type Row = { id: string; type: string; state: string; attempts: { at: number; status: number | null }[] };
const deliveries = async () => (await control(mock, 'GET', 'webhooks')).body.deliveries as Row[];
const arrived = (count: number) => vi.waitFor(() => expect(types()).toHaveLength(count), { timeout: 5000 });

describe('signature', () => {
  test('it is what the SDK’s own signer writes, and what its verifier takes within 300 s only', () => {
    const body = '{"id":"evt_1","object":"event"}';
    const now = Math.floor(Date.now() / 1000);
    const ours = signWebhook(body, webhookSecret, now);
    expect(ours).toBe(
      Stripe.webhooks.generateTestHeaderString({ payload: body, secret: webhookSecret, timestamp: now }),
    );
    // RFC 2104 HMAC over "<t>.<body>", worked out here by hand as the published "Verify manually" steps say.
    const hand = createHmac('sha256', webhookSecret).update(`${now}.${body}`).digest('hex');
    expect(ours).toBe(`t=${now},v1=${hand}`);
    const verify = (header: string, secret = webhookSecret, text = body) =>
      Stripe.webhooks.constructEvent(text, header, secret);
    expect(verify(ours)).toMatchObject({ id: 'evt_1' });
    expect(() => verify(ours, 'whsec_other')).toThrow(/signature/i);
    expect(() => verify(ours, webhookSecret, `${body} `)).toThrow(/signature/i);
    expect(() => verify(signWebhook(body, webhookSecret, now - 301))).toThrow(/tolerance/i);
  });
});

describe('sending', () => {
  test('what was answered with an error is sent again, later and later, until a 2xx', async () => {
    listener.status = 500;
    await paidSession();
    await vi.waitFor(async () => expect((await deliveries())[0]?.attempts.length).toBeGreaterThan(1), {
      timeout: 5000,
    });
    const pending = await stripe.events.list({ delivery_success: false });
    expect(pending.data.map(({ pending_webhooks }) => pending_webhooks)).toEqual([1, 1]);
    listener.status = 200;
    await arrived(2);
    await vi.waitFor(async () =>
      expect((await deliveries()).map(({ state }) => state)).toEqual(['delivered', 'delivered']),
    );
    expect((await stripe.events.list({ delivery_success: false })).data).toEqual([]);
    const [row] = await deliveries();
    const times = row?.attempts.map(({ at }) => at) ?? [];
    expect(times.length).toBeGreaterThan(2);
    const waits = times.slice(1).map((at, i) => at - Number(times[i]));
    for (const [i, wait] of waits.entries()) expect(wait).toBeGreaterThanOrEqual(500 * 2 ** i - 5);
  });

  test('held ones wait; released in reverse they arrive in reverse', async () => {
    await control(mock, 'POST', 'webhooks/hold', { on: true });
    await paidSession();
    expect((await deliveries()).map(({ state }) => state)).toEqual(['held', 'held']);
    expect(types()).toEqual([]);
    await control(mock, 'POST', 'webhooks/release', { order: 'reverse' });
    expect(types()).toEqual(['checkout.session.completed', 'payment_intent.succeeded']);
    await paidSession();
    await control(mock, 'POST', 'webhooks/hold', { on: false });
    expect(types().slice(2)).toEqual(['payment_intent.succeeded', 'checkout.session.completed']);
  });

  test('each is sent several times when asked, and any one again by hand', async () => {
    await control(mock, 'POST', 'webhooks/duplicate', { times: 10 });
    await paidSession();
    await arrived(20);
    const [row] = await deliveries();
    await control(mock, 'POST', `webhooks/${row?.id}/deliver`, { times: 2 });
    expect(listener.got.filter(({ id }) => id === row?.id)).toHaveLength(12);
    expect((await control(mock, 'POST', 'webhooks/evt_none/deliver')).status).toBe(404);
  });

  test('dropped ones never come, but the list of events has them for a reconciliation', async () => {
    await control(mock, 'POST', 'webhooks/drop', { count: 2 });
    const id = await paidSession();
    expect((await deliveries()).map(({ state }) => state)).toEqual(['dropped', 'dropped']);
    const events = await stripe.events.list({ type: 'checkout.session.completed' });
    expect(events.data.map((event) => (event.data.object as Stripe.Checkout.Session).id)).toEqual([id]);
    await paidSession();
    await arrived(2);
  });

  test('an event is what it was when it happened, whatever became of the object', async () => {
    await control(mock, 'POST', 'webhooks/hold', { on: true });
    const id = await paidSession();
    const { payment_intent } = await stripe.checkout.sessions.retrieve(id);
    await stripe.refunds.create({ payment_intent: String(payment_intent), amount: 100 });
    await stripe.refunds.create({ payment_intent: String(payment_intent), amount: 200 });
    const refunded = await stripe.events.list({ type: 'charge.refunded' });
    expect(refunded.data.map(({ data }) => (data.object as Stripe.Charge).amount_refunded)).toEqual([
      300, 100,
    ]);
    const [event] = refunded.data;
    expect(await stripe.events.retrieve(String(event?.id))).toEqual(event);
    expect(event?.request).toMatchObject({ id: expect.stringMatching(/^req_/) });
  });
});

describe('across a restart', () => {
  test('objects, answers by key and webhooks not yet delivered are still there', async () => {
    listener.status = 500;
    const first = await stripe.checkout.sessions.create(sessionParams(), { idempotencyKey: 'once' });
    await pay(first.id);
    await vi.waitFor(async () => expect((await deliveries())[0]?.attempts.length).toBeGreaterThan(0));
    await mock.close();
    listener.status = 200;
    await start();
    await arrived(2);
    expect((await stripe.checkout.sessions.create(sessionParams(), { idempotencyKey: 'once' })).id).toBe(
      first.id,
    );
    expect((await stripe.checkout.sessions.retrieve(first.id)).status).toBe('complete');
  });

  test('a session whose time passed meanwhile is expired at once', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await mock.close();
    const later = Date.now() + 25 * 3600 * 1000;
    mock = await startStripeMock({
      port: 0,
      webhookUrl: listener.url,
      webhookSecret,
      stateFile,
      now: () => later,
    });
    expect((await stripeClient(mock).checkout.sessions.retrieve(id)).status).toBe('expired');
  });

  test('a line that was being written when the process died is left out; the rest stands', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await mock.close();
    const before = readFileSync(stateFile, 'utf8').split('\n').filter(Boolean).length;
    appendFileSync(stateFile, '[["session","cs_test_half",{"sess');
    await start();
    expect((await stripe.checkout.sessions.list()).data.map((session) => session.id)).toEqual([id]);
    expect(before).toBeGreaterThan(0);
  });
});

test('it sends webhooks to this machine only', async () => {
  const away = { port: 0, webhookUrl: 'https://hooks.example.org/stripe', webhookSecret };
  await expect(startStripeMock(away)).rejects.toThrow(/this machine only/);
});
