import 'server-only';
import { createHmac, timingSafeEqual } from 'node:crypto';
import { isId, type OrderId } from '@/lib/domain/shared/ids';
import { env } from '../env';

/** The cookie that lets a browser see orders without an account: `id.proof` pairs parted by spaces. */
export const ORDERS_COOKIE = 'combwood_orders';
const MOST = 12;

/** Proof that its holder was sent (or made) this order. Stored nowhere; the mail's link carries it. */
export const orderProof = (id: OrderId): string =>
  createHmac('sha256', env().AUTH_SECRET).update(`order:${id}`).digest('base64url').slice(0, 27);

export function isOrderProof(id: OrderId, proof: string): boolean {
  const right = Buffer.from(orderProof(id));
  const given = Buffer.from(proof);
  return right.length === given.length && timingSafeEqual(right, given);
}

/** The orders that a cookie's text proves; forged or broken pairs are left out. */
export function readOrderGrants(cookie: string | undefined): OrderId[] {
  return (cookie ?? '')
    .split(' ')
    .slice(0, MOST)
    .flatMap((pair) => {
      const [id = '', proof = ''] = pair.split('.');
      return isId('ord', id) && isOrderProof(id, proof) ? [id] : [];
    });
}

/** The cookie's text with one order more, newest first. */
export const withOrderGrant = (cookie: string | undefined, id: OrderId): string =>
  [id, ...readOrderGrants(cookie).filter((held) => held !== id)]
    .slice(0, MOST)
    .map((held) => `${held}.${orderProof(held)}`)
    .join(' ');
