import 'server-only';
import { createHmac, timingSafeEqual } from 'node:crypto';
import { isId, type OrderId, type RegistrationId } from '@/lib/domain/shared/ids';
import { env } from '../env';
import { cookieName } from './session-cookie';

/** The cookie that lets a browser see bookings without an account: `id.proof` pairs parted by spaces. */
export const ordersCookieName = (): string => cookieName('combwood_orders');
const MOST = 12;

/** A payer is granted the order; an attendee who does not pay, their registration only. */
export type Granted = OrderId | RegistrationId;

/** Proof that its holder was sent (or made) this booking. Stored nowhere; the mail's link carries it. */
export const orderProof = (id: Granted): string =>
  createHmac('sha256', env().AUTH_SECRET)
    .update(`${isId('ord', id) ? 'order' : 'registration'}:${id}`)
    .digest('base64url')
    .slice(0, 27);

export function isOrderProof(id: Granted, proof: string): boolean {
  const right = Buffer.from(orderProof(id));
  const given = Buffer.from(proof);
  return right.length === given.length && timingSafeEqual(right, given);
}

/** What a cookie's text proves; forged or broken pairs are left out. */
export function readGrants(cookie: string | undefined): Granted[] {
  return (cookie ?? '')
    .split(' ')
    .slice(0, MOST)
    .flatMap((pair) => {
      const [id = '', proof = ''] = pair.split('.');
      return (isId('ord', id) || isId('reg', id)) && isOrderProof(id, proof) ? [id] : [];
    });
}

export const readOrderGrants = (cookie: string | undefined): OrderId[] =>
  readGrants(cookie).filter((id): id is OrderId => isId('ord', id));

export const readRegistrationGrants = (cookie: string | undefined): RegistrationId[] =>
  readGrants(cookie).filter((id): id is RegistrationId => isId('reg', id));

/** The cookie's text with one grant more, newest first. */
export const withOrderGrant = (cookie: string | undefined, id: Granted): string =>
  [id, ...readGrants(cookie).filter((held) => held !== id)]
    .slice(0, MOST)
    .map((held) => `${held}.${orderProof(held)}`)
    .join(' ');
