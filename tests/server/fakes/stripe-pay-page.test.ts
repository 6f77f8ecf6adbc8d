import { request } from 'node:http';
import type Stripe from 'stripe';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { type StripeMock, startStripeMock } from '@/tests/fakes/stripe/start-stripe-mock';
import { line, sessionParams, stripeClient } from './stripe-client';

let mock: StripeMock;
let stripe: Stripe;
beforeAll(async () => {
  mock = await startStripeMock({ port: 0, merchant: 'Slate Ridge <Harp> Society' });
  stripe = stripeClient(mock);
});
afterAll(() => mock.close());

async function get(path: string) {
  const answer = await fetch(mock.url + path);
  return { status: answer.status, headers: answer.headers, text: await answer.text() };
}
async function press(id: string, fields: Record<string, string>, headers: Record<string, string> = {}) {
  const answer = await fetch(`${mock.url}/pay/${id}`, {
    method: 'POST',
    redirect: 'manual',
    body: new URLSearchParams(fields),
    headers,
  });
  return { status: answer.status, to: answer.headers.get('location'), text: await answer.text() };
}

describe('the payment page, as forms without script', () => {
  test('pay leads to the success address with the session’s id in it', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    const { text, headers } = await get(`/pay/${id}`);
    expect(text).toContain('No money moves');
    expect(text).toContain('Slate Ridge &lt;Harp&gt; Society');
    expect(text).toContain('USD\u00a0660.00');
    expect(text).toContain('mina.okafor@example.test');
    expect(text).not.toMatch(/<script|card number/i);
    expect(headers.get('content-security-policy')).toContain("form-action 'self' http://127.0.0.1:9");
    const { status, to } = await press(id, { outcome: 'pay' });
    expect([status, to]).toEqual([303, `http://127.0.0.1:9/paid?session=${id}`]);
    expect((await get(`/pay/${id}`)).text).toContain('Already paid');
    // the other tab
    expect((await press(id, { outcome: 'pay' })).to).toBe(`/pay/${id}`);
    expect((await stripe.charges.list()).data).toHaveLength(1);
  });

  test('a further step: approve pays, refuse comes back and says so', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    expect((await press(id, { outcome: 'needs-step' })).to).toBe(`/pay/${id}/confirm`);
    expect((await get(`/pay/${id}/confirm`)).text).toContain('Your bank asks you to confirm');
    expect((await press(id, { outcome: 'refuse' })).to).toBe(`/pay/${id}`);
    expect((await get(`/pay/${id}`)).text).toContain('nothing was paid');
    await press(id, { outcome: 'needs-step' });
    expect((await press(id, { outcome: 'approve' })).to).toContain('/paid?session=');
  });

  test('a decline says why; the way out leads to the cancel address', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await press(id, { outcome: 'decline-funds' });
    const { text } = await get(`/pay/${id}`);
    expect(text).toContain('not enough money');
    expect(text).toContain('href="http://127.0.0.1:9/back"');
  });

  test('expired says so and cannot be paid', async () => {
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    await stripe.checkout.sessions.expire(id);
    expect((await press(id, { outcome: 'pay' })).to).toBe(`/pay/${id}`);
    expect((await get(`/pay/${id}`)).text).toContain('has expired');
    expect((await stripe.checkout.sessions.retrieve(id)).payment_status).toBe('unpaid');
  });

  test('markup in a line is text; a wrong e-mail is named and kept; an unknown choice is refused', async () => {
    const items = { line_items: [line('<img src=x onerror=alert(1)>', 500)], customer_email: undefined };
    const { id } = await stripe.checkout.sessions.create(sessionParams(items));
    expect((await get(`/pay/${id}`)).text).toContain('&lt;img src=x onerror=alert(1)&gt;');
    const wrong = await press(id, { outcome: 'pay', email: '"><b>kim' });
    expect(wrong.status).toBe(422);
    expect(wrong.text).toContain('value="&quot;&gt;&lt;b&gt;kim"');
    expect(wrong.text).toContain('is not an e-mail address');
    expect((await press(id, { outcome: 'rob' })).status).toBe(400);
    await press(id, { outcome: 'pay', email: 'kim@example.test' });
    const { customer_details } = await stripe.checkout.sessions.retrieve(id);
    expect(customer_details?.email).toBe('kim@example.test');
  });

  test('an unknown page, another site’s form and a foreign host name are refused', async () => {
    expect((await get('/pay/cs_test_none')).status).toBe(404);
    const { id } = await stripe.checkout.sessions.create(sessionParams());
    expect((await press(id, { outcome: 'pay' }, { origin: 'http://evil.example' })).status).toBe(403);
    expect((await press(id, { outcome: 'pay' }, { 'sec-fetch-site': 'cross-site' })).status).toBe(403);
    const renamed = await new Promise<number | undefined>((resolve) => {
      const headers = { host: 'rebound.example' };
      request(`${mock.url}/pay/${id}`, { headers }, (res) => resolve(res.resume().statusCode)).end();
    });
    expect(renamed).toBe(403);
    expect((await stripe.checkout.sessions.retrieve(id)).status).toBe('open');
  });
});
