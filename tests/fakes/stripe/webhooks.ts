import type { Delivery, EventRecord, WebhookSwitches } from './records';
import { signWebhook } from './sign-webhook';
import type { Store } from './store';

/** What the endpoint is subscribed to; other events are recorded and listed but not sent, as with a real endpoint. */
export const enabledEvents = new Set([
  'checkout.session.completed',
  'checkout.session.expired',
  'checkout.session.async_payment_succeeded',
  'checkout.session.async_payment_failed',
  'payment_intent.succeeded',
  'payment_intent.payment_failed',
  'payment_intent.canceled',
  'charge.refunded',
  'refund.created',
  'refund.updated',
  'refund.failed',
]);

const IN_FLIGHT = 8;
const ANSWER_MS = 10_000;
const FIRST_RETRY_MS = 500;
const LAST_RETRY_MS = 60_000;

export type WebhookTarget = { url: string; secret: string };
export type Attempt = Delivery['attempts'][number];

export class Webhooks {
  switches: WebhookSwitches = { hold: false, dropNext: 0, times: 1 };
  private readonly sending = new Set<string>();
  private readonly abort = new AbortController();
  private timer: NodeJS.Timeout | undefined;
  private seq: number;

  constructor(
    private readonly store: Store,
    private readonly target: WebhookTarget | null,
    private readonly now: () => number,
  ) {
    this.seq = Math.max(0, ...store.all('delivery').map((delivery) => delivery.seq));
  }

  get url(): string | null {
    return this.target?.url ?? null;
  }

  /** Notes that an event is to be sent. False when no endpoint wants it. */
  queue(event: EventRecord): boolean {
    if (!this.target || !enabledEvents.has(event.type)) return false;
    const drop = this.switches.dropNext > 0;
    if (drop) this.switches.dropNext -= 1;
    this.seq += 1;
    this.store.put('delivery', event.id, {
      id: event.id,
      seq: this.seq,
      state: drop ? 'dropped' : this.switches.hold ? 'held' : 'pending',
      times: this.switches.times,
      nextAt: this.now(),
      attempts: [],
    });
    return true;
  }

  /** Starts what is due and sleeps until the next. */
  pump(): void {
    clearTimeout(this.timer);
    if (this.abort.signal.aborted) return;
    const waiting = this.store
      .all('delivery')
      .filter((delivery) => delivery.state === 'pending' && !this.sending.has(delivery.id))
      .sort((a, b) => a.nextAt - b.nextAt || a.seq - b.seq);
    const due = waiting.filter((delivery) => delivery.nextAt <= this.now());
    for (const delivery of due.slice(0, IN_FLIGHT - this.sending.size)) {
      this.sending.add(delivery.id);
      void this.send(delivery.id).finally(() => {
        this.sending.delete(delivery.id);
        this.pump();
      });
    }
    const next = waiting.find((delivery) => delivery.nextAt > this.now());
    if (next) this.timer = setTimeout(() => this.pump(), next.nextAt - this.now());
  }

  /** Sends one event now, whatever its state; a failure leaves it pending with a longer wait. */
  async send(id: string, times?: number): Promise<Attempt[]> {
    const made: Attempt[] = [];
    const repeat = times ?? this.store.get('delivery', id)?.times ?? 1;
    for (let i = 0; i < repeat; i += 1) made.push(await this.attempt(id));
    return made;
  }

  /** Sends what is held, one after the other, so that the order asked for is the order that arrives. */
  async release(
    order: 'forward' | 'reverse',
    times?: number,
  ): Promise<{ id: string; attempts: Attempt[] }[]> {
    const held = this.store
      .all('delivery')
      .filter((delivery) => delivery.state === 'held')
      .sort((a, b) => (order === 'forward' ? a.seq - b.seq : b.seq - a.seq));
    const results: { id: string; attempts: Attempt[] }[] = [];
    for (const { id } of held) results.push({ id, attempts: await this.send(id, times) });
    return results;
  }

  setState(id: string, state: Delivery['state']): void {
    const delivery = this.store.get('delivery', id);
    if (!delivery) return;
    this.store.put('delivery', id, { ...delivery, state, nextAt: this.now() });
    this.store.commit();
    this.pump();
  }

  close(): void {
    clearTimeout(this.timer);
    this.abort.abort();
  }

  private async attempt(id: string): Promise<Attempt> {
    const event = this.store.get('event', id);
    if (!event || !this.target)
      return { at: this.now(), status: null, error: 'nothing to send or nowhere to' };
    const result = await this.post(event, this.target);
    const before = this.store.get('delivery', id);
    if (!before || this.abort.signal.aborted) return result;
    const ok = result.status !== null && result.status >= 200 && result.status < 300;
    const failures = before.attempts.length;
    this.store.put('delivery', id, {
      ...before,
      attempts: [...before.attempts, result].slice(-50),
      state:
        ok || before.state === 'delivered' ? 'delivered' : before.state === 'dropped' ? 'dropped' : 'pending',
      nextAt: this.now() + Math.min(LAST_RETRY_MS, FIRST_RETRY_MS * 2 ** Math.min(failures, 16)),
    });
    if (ok) this.store.put('event', id, { ...event, pending_webhooks: 0 });
    this.store.commit();
    return result;
  }

  private async post(event: EventRecord, target: WebhookTarget): Promise<Attempt> {
    const body = JSON.stringify(event, null, 2);
    const at = this.now();
    try {
      const answer = await fetch(target.url, {
        method: 'POST',
        body,
        redirect: 'manual',
        headers: {
          'content-type': 'application/json; charset=utf-8',
          'stripe-signature': signWebhook(body, target.secret, Math.floor(at / 1000)),
          'user-agent': 'Combwood-Stripe-Stand-In/1',
        },
        signal: AbortSignal.any([this.abort.signal, AbortSignal.timeout(ANSWER_MS)]),
      });
      await answer.arrayBuffer();
      return { at, status: answer.status, error: null };
    } catch (error) {
      const cause =
        error instanceof Error && error.cause instanceof Error ? error.cause.message : String(error);
      return { at, status: null, error: cause };
    }
  }
}
