import { z } from 'zod';
import { settleRefund } from './create-refund';
import { expireDue, expireSession } from './expire-session';
import { commit, type Mock, noCause } from './mock';
import { outcomes, paySession } from './pay-session';
import { faultKinds } from './records';

export class ControlError extends Error {
  constructor(
    readonly status: number,
    message: string,
  ) {
    super(message);
  }
}

type Input = Record<string, unknown>;
type Control = {
  method: 'GET' | 'POST' | 'DELETE';
  path: RegExp;
  run: (mock: Mock, input: Input, id: string) => unknown;
};

const count = (fallback: number) => z.coerce.number().int().min(0).max(1000).default(fallback);
const flag = z.union([z.boolean(), z.enum(['true', 'false']).transform((word) => word === 'true')]);

function read<S extends z.ZodType>(schema: S, input: Input): z.output<S> {
  const parsed = schema.safeParse(input);
  if (parsed.success) return parsed.data;
  const [issue] = parsed.error.issues;
  throw new ControlError(400, `${issue?.path.join('.') || 'body'}: ${issue?.message ?? 'not understood'}`);
}

function requireDelivery(mock: Mock, id: string): void {
  if (!mock.store.get('delivery', id)) throw new ControlError(404, `No webhook for event ${id}.`);
}

function requireSession(mock: Mock, id: string) {
  const record = mock.store.get('session', id);
  if (!record) throw new ControlError(404, `No session ${id}.`);
  return record;
}

export function listDeliveries(mock: Mock) {
  return mock.store
    .all('delivery')
    .sort((a, b) => b.seq - a.seq)
    .map((delivery) => {
      const event = mock.store.get('event', delivery.id);
      const object = event?.data.object as { id?: string } | undefined;
      return {
        ...delivery,
        type: event?.type ?? null,
        object: object?.id ?? null,
        created: event?.created ?? 0,
      };
    });
}

function reset(mock: Mock) {
  mock.store.clear();
  mock.faults.length = 0;
  mock.webhooks.switches = { hold: false, dropNext: 0, times: 1 };
  return { reset: true };
}

/** Switches for tests and for a person on the /_mock page. Each takes JSON or a form and answers JSON. */
export const controls: Control[] = [
  {
    method: 'GET',
    path: /^\/_mock\/health$/,
    run: (mock) => ({ status: 'ok', service: 'stand-in for Stripe', webhook_url: mock.webhooks.url }),
  },
  {
    method: 'GET',
    path: /^\/_mock\/webhooks$/,
    run: (mock) => ({ switches: mock.webhooks.switches, deliveries: listDeliveries(mock) }),
  },
  {
    // on: new webhooks wait here · off: those that wait go out in order
    method: 'POST',
    path: /^\/_mock\/webhooks\/hold$/,
    run: async (mock, input) => {
      const { on } = read(z.object({ on: flag }), input);
      mock.webhooks.switches.hold = on;
      return { hold: on, released: on ? [] : await mock.webhooks.release('forward') };
    },
  },
  {
    method: 'POST',
    path: /^\/_mock\/webhooks\/release$/,
    run: async (mock, input) => {
      const schema = z.object({ order: z.enum(['forward', 'reverse']).default('forward'), times: count(1) });
      const { order, times } = read(schema, input);
      return { released: await mock.webhooks.release(order, times) };
    },
  },
  {
    method: 'POST',
    path: /^\/_mock\/webhooks\/drop$/,
    run: (mock, input) => {
      mock.webhooks.switches.dropNext = read(z.object({ count: count(1) }), input).count;
      return mock.webhooks.switches;
    },
  },
  {
    method: 'POST',
    path: /^\/_mock\/webhooks\/duplicate$/,
    run: (mock, input) => {
      mock.webhooks.switches.times = Math.max(1, read(z.object({ times: count(2) }), input).times);
      return mock.webhooks.switches;
    },
  },
  {
    method: 'POST',
    path: /^\/_mock\/webhooks\/([^/]+)\/deliver$/,
    run: async (mock, input, id) => {
      requireDelivery(mock, id);
      return { attempts: await mock.webhooks.send(id, read(z.object({ times: count(1) }), input).times) };
    },
  },
  {
    method: 'POST',
    path: /^\/_mock\/webhooks\/([^/]+)\/(?:drop)$/,
    run: (mock, _input, id) => {
      requireDelivery(mock, id);
      mock.webhooks.setState(id, 'dropped');
      return mock.store.get('delivery', id);
    },
  },
  {
    method: 'GET',
    path: /^\/_mock\/sessions$/,
    run: (mock) => ({ sessions: mock.store.all('session').map(({ session }) => session) }),
  },
  {
    // what a person would press on the payment page
    method: 'POST',
    path: /^\/_mock\/sessions\/([^/]+)\/outcome$/,
    run: (mock, input, id) => {
      requireSession(mock, id);
      const schema = z.object({ outcome: z.enum(outcomes), email: z.email().optional() });
      const { outcome, email } = read(schema, input);
      const done = paySession(mock, id, outcome, email ?? null);
      commit(mock);
      if (!done) throw new ControlError(409, `“${outcome}” does not fit the state of session ${id}.`);
      return requireSession(mock, id).session;
    },
  },
  {
    // moves the session's end nearer, so that its hour passes now
    method: 'POST',
    path: /^\/_mock\/sessions\/([^/]+)\/advance$/,
    run: (mock, input, id) => {
      const record = requireSession(mock, id);
      const by = read(z.object({ seconds: z.coerce.number().int().min(1).max(86_400) }), input).seconds;
      const session = { ...record.session, expires_at: record.session.expires_at - by };
      mock.store.put('session', id, { ...record, session });
      expireDue(mock);
      return requireSession(mock, id).session;
    },
  },
  {
    method: 'POST',
    path: /^\/_mock\/sessions\/([^/]+)\/expire$/,
    run: (mock, _input, id) => {
      const record = requireSession(mock, id);
      if (record.session.status !== 'open')
        throw new ControlError(409, `Session ${id} is ${record.session.status}, so it cannot expire.`);
      expireSession(mock, record, noCause);
      commit(mock);
      return requireSession(mock, id).session;
    },
  },
  {
    method: 'POST',
    path: /^\/_mock\/refunds\/([^/]+)\/settle$/,
    run: (mock, input, id) => {
      const { status } = read(z.object({ status: z.enum(['succeeded', 'failed']) }), input);
      if (!settleRefund(mock, id, status, noCause))
        throw new ControlError(409, `Refund ${id} is not pending.`);
      commit(mock);
      return mock.store.get('refund', id);
    },
  },
  { method: 'GET', path: /^\/_mock\/faults$/, run: (mock) => ({ faults: mock.faults }) },
  {
    method: 'POST',
    path: /^\/_mock\/faults$/,
    run: (mock, input) => {
      const schema = z.object({
        kind: z.enum(faultKinds),
        count: z.coerce.number().int().min(1).max(1000).default(1),
        method: z.enum(['GET', 'POST']).optional(),
        path: z.string().startsWith('/v1/').optional(),
      });
      const { count: remaining, ...fault } = read(schema, input);
      mock.faults.push({ ...fault, remaining });
      return { faults: mock.faults };
    },
  },
  {
    method: 'DELETE',
    path: /^\/_mock\/faults$/,
    run: (mock) => {
      mock.faults.length = 0;
      return { faults: [] };
    },
  },
  {
    method: 'POST',
    path: /^\/_mock\/faults\/clear$/,
    run: (mock) => {
      mock.faults.length = 0;
      return { faults: [] };
    },
  },
  { method: 'POST', path: /^\/_mock\/reset$/, run: reset },
];
