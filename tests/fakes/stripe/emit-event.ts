import { type Cause, type Mock, seconds } from './mock';
import { newId } from './new-id';
import type { EventRecord } from './records';

export const API_VERSION = '2026-10-28.endive';

/** Records an event with a copy of the object as it is now, and queues its webhook. */
export function emitEvent(mock: Mock, cause: Cause, type: string, object: object, previous?: object): void {
  const event: EventRecord = {
    id: newId('evt_'),
    object: 'event',
    api_version: API_VERSION,
    created: seconds(mock),
    data: { object, ...(previous ? { previous_attributes: previous } : {}) },
    livemode: false,
    pending_webhooks: 0,
    request: cause,
    type,
  };
  const queued = mock.webhooks.queue(event);
  mock.store.put('event', event.id, { ...event, pending_webhooks: queued ? 1 : 0 });
}
