import 'server-only';
import { ok, type Result } from '@/lib/domain/shared/result';
import { type ProviderError, toProviderError } from './provider-error';
import { type ProviderRefund, toProviderRefund } from './provider-refund';
import { stripeClient } from './stripe-client';

/** A refund as the provider has it now. */
export async function getRefund(id: string): Promise<Result<ProviderRefund, ProviderError>> {
  try {
    return ok(toProviderRefund(await stripeClient().refunds.retrieve(id)));
  } catch (error) {
    return toProviderError(error, 'refund.get');
  }
}
