import { z } from 'zod';
import { noSuch } from './api-error';
import { createRefund } from './create-refund';
import { createSession } from './create-session';
import { expireSession } from './expire-session';
import { isWithin, listObjects } from './list-objects';
import type { Cause, Mock } from './mock';
import type { FormObject } from './parse-form';
import { expandable, flag, listed, metadata, parseParams, text } from './parse-params';
import type { Tables } from './records';
import { listSessionsParams } from './session-params';

export type Call = { mock: Mock; id: string; form: FormObject; cause: Cause };
export type Answer = { object: object; expand: string[] | undefined };
type Endpoint = { method: 'GET' | 'POST'; path: RegExp; run: (call: Call) => Answer };

const onlyExpand = z.strictObject(expandable);

/** GET of one object by its id. */
function one<T extends keyof Tables>(
  path: RegExp,
  table: T,
  noun: string,
  pick: (row: Tables[T]) => object = (row) => row,
): Endpoint {
  return {
    method: 'GET',
    path,
    run: ({ mock, id, form }) => {
      const row = mock.store.get(table, id);
      if (!row) throw noSuch(noun, id, noun === 'checkout.session' ? 'session' : 'id');
      return { object: pick(row), expand: parseParams(onlyExpand, form).expand };
    },
  };
}

function requireSession(mock: Mock, id: string) {
  const record = mock.store.get('session', id);
  if (!record) throw noSuch('checkout.session', id, 'session');
  return record;
}

const sessions = '/v1/checkout/sessions';

export const endpoints: Endpoint[] = [
  { method: 'POST', path: /^\/v1\/checkout\/sessions$/, run: ({ mock, form }) => createSession(mock, form) },
  {
    method: 'GET',
    path: /^\/v1\/checkout\/sessions$/,
    run: ({ mock, form }) => {
      const params = parseParams(listSessionsParams, form);
      const found = mock.store
        .all('session')
        .map(({ session }) => session)
        .filter(
          (session) =>
            isWithin(session.created, params.created) &&
            (!params.status || session.status === params.status) &&
            (!params.payment_intent || session.payment_intent === params.payment_intent) &&
            (!params.customer_details || session.customer_details?.email === params.customer_details.email),
        );
      return { object: listObjects(found, params, sessions), expand: params.expand };
    },
  },
  one(/^\/v1\/checkout\/sessions\/([^/]+)$/, 'session', 'checkout.session', ({ session }) => session),
  {
    method: 'POST',
    path: /^\/v1\/checkout\/sessions\/([^/]+)\/expire$/,
    run: ({ mock, id, form, cause }) => {
      const { expand } = parseParams(onlyExpand, form);
      return { object: expireSession(mock, requireSession(mock, id), cause).session, expand };
    },
  },
  {
    method: 'GET',
    path: /^\/v1\/checkout\/sessions\/([^/]+)\/line_items$/,
    run: ({ mock, id, form }) => {
      const params = parseParams(z.strictObject(listed), form);
      const items = [...requireSession(mock, id).lineItems].reverse();
      return { object: listObjects(items, params, `${sessions}/${id}/line_items`), expand: params.expand };
    },
  },
  one(/^\/v1\/payment_intents\/([^/]+)$/, 'intent', 'payment_intent'),
  {
    method: 'GET',
    path: /^\/v1\/payment_intents$/,
    run: ({ mock, form }) => {
      const params = parseParams(z.strictObject(listed), form);
      const found = mock.store.all('intent').filter(({ created }) => isWithin(created, params.created));
      return { object: listObjects(found, params, '/v1/payment_intents'), expand: params.expand };
    },
  },
  one(/^\/v1\/charges\/([^/]+)$/, 'charge', 'charge'),
  {
    method: 'GET',
    path: /^\/v1\/charges$/,
    run: ({ mock, form }) => {
      const params = parseParams(z.strictObject({ ...listed, payment_intent: text().optional() }), form);
      const found = mock.store
        .all('charge')
        .filter(
          (charge) =>
            isWithin(charge.created, params.created) &&
            (!params.payment_intent || charge.payment_intent === params.payment_intent),
        );
      return { object: listObjects(found, params, '/v1/charges'), expand: params.expand };
    },
  },
  {
    method: 'POST',
    path: /^\/v1\/refunds$/,
    run: ({ mock, form, cause }) => createRefund(mock, form, cause),
  },
  {
    method: 'GET',
    path: /^\/v1\/refunds$/,
    run: ({ mock, form }) => {
      const by = { payment_intent: text().optional(), charge: text().optional() };
      const params = parseParams(z.strictObject({ ...listed, ...by }), form);
      const found = mock.store
        .all('refund')
        .filter(
          (refund) =>
            isWithin(refund.created, params.created) &&
            (!params.payment_intent || refund.payment_intent === params.payment_intent) &&
            (!params.charge || refund.charge === params.charge),
        );
      return { object: listObjects(found, params, '/v1/refunds'), expand: params.expand };
    },
  },
  one(/^\/v1\/refunds\/([^/]+)$/, 'refund', 'refund'),
  {
    method: 'POST',
    path: /^\/v1\/refunds\/([^/]+)$/,
    run: ({ mock, id, form }) => {
      const params = parseParams(z.strictObject({ ...expandable, metadata: metadata.default({}) }), form);
      const refund = mock.store.get('refund', id);
      if (!refund) throw noSuch('refund', id, 'id');
      const updated = { ...refund, metadata: { ...refund.metadata, ...params.metadata } };
      mock.store.put('refund', id, updated);
      return { object: updated, expand: params.expand };
    },
  },
  one(/^\/v1\/balance_transactions\/([^/]+)$/, 'balance', 'balance_transaction'),
  {
    method: 'GET',
    path: /^\/v1\/balance_transactions$/,
    run: ({ mock, form }) => {
      const by = { type: text().optional(), source: text().optional(), currency: text().optional() };
      const params = parseParams(z.strictObject({ ...listed, ...by }), form);
      const found = mock.store
        .all('balance')
        .filter(
          (row) =>
            isWithin(row.created, params.created) &&
            (!params.type || row.type === params.type) &&
            (!params.source || row.source === params.source) &&
            (!params.currency || row.currency === params.currency),
        );
      return { object: listObjects(found, params, '/v1/balance_transactions'), expand: params.expand };
    },
  },
  one(/^\/v1\/events\/([^/]+)$/, 'event', 'event'),
  {
    method: 'GET',
    path: /^\/v1\/events$/,
    run: ({ mock, form }) => {
      const by = {
        type: text().optional(),
        types: z.array(text()).max(20).optional(),
        delivery_success: flag.optional(),
      };
      const params = parseParams(z.strictObject({ ...listed, ...by }), form);
      const wanted = params.types ?? (params.type ? [params.type] : null);
      const found = mock.store
        .all('event')
        .filter(
          (event) =>
            isWithin(event.created, params.created) &&
            (!wanted || wanted.some((type) => matches(event.type, type))) &&
            (params.delivery_success === undefined ||
              (event.pending_webhooks === 0) === params.delivery_success),
        );
      return { object: listObjects(found, params, '/v1/events'), expand: params.expand };
    },
  },
];

/** `charge.*` stands for the whole group, as the published parameter allows. */
function matches(type: string, wanted: string): boolean {
  return wanted.endsWith('.*') ? type.startsWith(wanted.slice(0, -1)) : type === wanted;
}
