import 'server-only';
import { cookies } from 'next/headers';
import { cache } from 'react';
import type { Actor } from '@/lib/domain/access/actor';
import { ordersCookieName } from './order-grants';
import { readActor } from './read-actor';
import { sessionCookieName } from './session-cookie';

/** Who is asking, once a request. Works in pages, actions and route handlers; writes no cookie. */
export const getActor = cache(async (): Promise<Actor> => {
  const jar = await cookies();
  return readActor(
    { session: jar.get(sessionCookieName())?.value, orders: jar.get(ordersCookieName())?.value },
    Date.now(),
  );
});
