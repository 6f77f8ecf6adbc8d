import 'server-only';
import { ok, type Result } from '@/lib/domain/shared/result';
import { type ProviderError, toProviderError } from './provider-error';
import { type ProviderSession, toProviderSession } from './provider-session';
import { stripeClient } from './stripe-client';

/** A session as the provider has it now. */
export async function getSession(id: string): Promise<Result<ProviderSession, ProviderError>> {
  try {
    const session = await stripeClient().checkout.sessions.retrieve(id, { expand: ['payment_intent'] });
    return ok(toProviderSession(session));
  } catch (error) {
    return toProviderError(error, 'session.get');
  }
}
