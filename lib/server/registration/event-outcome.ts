import 'server-only';

/** What became of something the provider told us; set-aside waits for a person. */
export type EventOutcome = {
  outcome: 'applied' | 'ignored' | 'set-aside';
  reason: string;
  orderId?: string;
};
