import { z } from 'zod';
import { type Control, ControlError, read } from './control';
import { settleRefund } from './create-refund';
import { commit, type Mock, noCause } from './mock';
import { faultKinds } from './records';
import { sessionControls } from './session-controls';
import { webhookControls } from './webhook-controls';

function reset(mock: Mock) {
  mock.store.clear();
  mock.faults.length = 0;
  mock.webhooks.switches = { hold: false, dropNext: 0, times: 1 };
  return { reset: true };
}

/** Switches for tests and for a person on the /_mock page. */
export const controls: Control[] = [
  ...webhookControls,
  ...sessionControls,
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
  {
    method: 'GET',
    path: /^\/_mock\/health$/,
    run: (mock) => ({ status: 'ok', service: 'stand-in for Stripe', webhook_url: mock.webhooks.url }),
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
  { method: 'POST', path: /^\/_mock\/reset$/, run: reset },
];
