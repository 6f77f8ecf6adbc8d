import { createHmac } from 'node:crypto';

/** Stripe-Signature, scheme v1: HMAC-SHA256 of `<seconds>.<body>` with the endpoint's secret, in hex. */
export function signWebhook(body: string, secret: string, atSeconds: number): string {
  const signature = createHmac('sha256', secret).update(`${atSeconds}.${body}`, 'utf8').digest('hex');
  return `t=${atSeconds},v1=${signature}`;
}
