import 'server-only';
import { cookies } from 'next/headers';
import { type Granted, ordersCookieName, withOrderGrant } from './order-grants';
import { cookieFlags } from './session-cookie';

/** A year: from booking until after the camp. The mail's link renews it on any device. */
const LASTS = 365 * 24 * 60 * 60;

/** Lets this browser see a booking that it has made or was sent. Only in an action or a handler. */
export async function grantOrder(id: Granted): Promise<void> {
  const jar = await cookies();
  const held = jar.get(ordersCookieName())?.value;
  jar.set(ordersCookieName(), withOrderGrant(held, id), { ...cookieFlags(), maxAge: LASTS });
}
