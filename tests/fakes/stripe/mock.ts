import type { Fault } from './records';
import type { Store } from './store';
import type { Webhooks } from './webhooks';

/** What every part of the stand-in works on. */
export type Mock = {
  store: Store;
  webhooks: Webhooks;
  faults: Fault[];
  /** Milliseconds since 1970. */
  now: () => number;
  baseUrl: string;
  merchant: string;
};

/** Which API call causes an event; nulls when a person on the page or the clock does. */
export type Cause = { id: string | null; idempotency_key: string | null };
export const noCause: Cause = { id: null, idempotency_key: null };

export const seconds = (mock: Mock): number => Math.floor(mock.now() / 1000);

/** Writes what was put and lets the webhooks that follow from it go out. */
export function commit(mock: Mock): void {
  mock.store.commit();
  mock.webhooks.pump();
}
