import { z } from 'zod';
import { type Control, ControlError, count, flag, read } from './control';
import type { Mock } from './mock';

function requireDelivery(mock: Mock, id: string): void {
  if (!mock.store.get('delivery', id)) throw new ControlError(404, `No webhook for event ${id}.`);
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

/** Holding, ordering, repeating, losing and sending webhooks again. */
export const webhookControls: Control[] = [
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
];
