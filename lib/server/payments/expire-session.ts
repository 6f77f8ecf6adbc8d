import 'server-only';
import { ok, type Result } from '@/lib/domain/shared/result';
import { getSession } from './get-session';
import { type ProviderError, toProviderError } from './provider-error';
import { type ProviderSession, toProviderSession } from './provider-session';
import { stripeClient } from './stripe-client';

/**
 * Ends a session, or finds that it has been paid: the provider lets only an open session expire, which makes it the
 * one arbiter between somebody paying and us letting the place go.
 */
export async function expireSession(id: string): Promise<Result<ProviderSession, ProviderError>> {
  try {
    return ok(toProviderSession(await stripeClient().checkout.sessions.expire(id)));
  } catch (error) {
    const said = toProviderError(error, 'session.expire');
    return said.error === 'refused' ? getSession(id) : said;
  }
}
